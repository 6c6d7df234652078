import type { Knex } from 'knex'

/**
 * Orders, their lines and their events. Two rules are the database's own: an event is never
 * changed, and a line of a released order is never changed.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception '% is append-only', tg_table_name using errcode = 'FY004';
    end $$;

    create sequence order_numbers as integer start 2001;

    create table orders (
      id uuid primary key default gen_random_uuid(),
      number integer not null default nextval('order_numbers') constraint orders_number_unique unique,
      company_id uuid not null references companies,
      job_id uuid not null,
      ordered_by uuid not null references people,
      po_number text not null default '',
      needed_by date not null,
      notes text not null default '',
      -- The job's pitch as it was when the order was last submitted.
      pitch_rise double precision not null,
      submitted_at timestamptz not null default now(),
      released_at timestamptz,
      withdrawn_at timestamptz,
      version integer not null default 1,
      constraint orders_job_of_company foreign key (job_id, company_id) references jobs (id, company_id),
      constraint orders_one_end check (released_at is null or withdrawn_at is null)
    );
    alter sequence order_numbers owned by orders.number;
    create index orders_of_company on orders (company_id, number desc);
    create index orders_of_job on orders (job_id);

    create table order_lines (
      id uuid primary key default gen_random_uuid(),
      order_id uuid not null references orders,
      position integer not null,
      mark text not null,
      name text not null,
      profile jsonb not null,
      stock_id uuid not null references stocks,
      quantity integer not null check (quantity between 1 and 500),
      length double precision not null check (length > 0),
      -- Stock, strip and plan as they were at release; null before.
      frozen jsonb,
      constraint order_lines_position_unique unique (order_id, position) deferrable initially immediate,
      constraint order_lines_of_order unique (id, order_id)
    );

    create function refuse_change_of_released_line() returns trigger language plpgsql as $$
    declare
      concerned uuid := case when tg_op = 'INSERT' then new.order_id else old.order_id end;
    begin
      perform 1 from orders where id = concerned and released_at is not null;
      if found then
        raise exception 'a released order is frozen' using errcode = 'FY005';
      end if;
      return case when tg_op = 'DELETE' then old else new end;
    end $$;
    create trigger order_lines_frozen before insert or update or delete on order_lines
      for each row execute function refuse_change_of_released_line();

    create table order_events (
      id bigint generated always as identity primary key,
      order_id uuid not null references orders,
      kind text not null check (
        kind in ('submitted', 'amended', 'question', 'answered', 'released', 'withdrawn', 'handedOff')),
      person_id uuid not null references people,
      text text not null default '',
      at timestamptz not null default clock_timestamp()
    );
    create index order_events_of_order on order_events (order_id, id);
    create trigger order_events_append_only before update or delete on order_events
      for each row execute function refuse_change();
    create trigger order_events_no_truncate before truncate on order_events
      for each statement execute function refuse_change();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table order_events;
    drop table order_lines;
    drop function refuse_change_of_released_line;
    drop table orders;
    drop function refuse_change;
  `)
}
