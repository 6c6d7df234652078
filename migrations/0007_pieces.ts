import type { Knex } from 'knex'

/**
 * Pieces and everything that happens to them. The database itself holds the rules:
 * - a state changes only along piece_moves (FY001);
 * - every state has an event that made it, checked when the transaction ends (FY002);
 * - a move that needs a reason has one (FY003);
 * - an event is never changed or removed (FY004);
 * - an event starts where the last one of its piece ended (FY006).
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table piece_moves (
      from_state text not null,
      to_state text not null,
      needs_reason boolean not null,
      primary key (from_state, to_state)
    );
    insert into piece_moves values
      ('queued', 'bent', false),
      ('bent', 'bundled', false),
      ('bundled', 'pickedUp', false),
      ('bent', 'queued', true),
      ('bundled', 'bent', true),
      ('pickedUp', 'bundled', true),
      ('queued', 'scrapped', true),
      ('bent', 'scrapped', true),
      ('bundled', 'scrapped', true),
      ('queued', 'withdrawn', true),
      ('bent', 'withdrawn', true);

    create table pieces (
      id uuid primary key default gen_random_uuid(),
      code text not null constraint pieces_code_unique unique,
      order_id uuid not null,
      line_id uuid not null,
      run_id uuid not null,
      sequence integer not null check (sequence > 0),
      state text not null default 'queued',
      bundle_id uuid,
      remake_of uuid constraint pieces_remade_once unique references pieces,
      constraint pieces_state_known check (
        state in ('queued', 'bent', 'bundled', 'pickedUp', 'scrapped', 'withdrawn')),
      constraint pieces_bundle_fits_state check ((bundle_id is not null) = (state in ('bundled', 'pickedUp'))),
      constraint pieces_line foreign key (line_id, order_id) references order_lines (id, order_id),
      constraint pieces_run foreign key (run_id, order_id) references runs (id, order_id),
      -- A bundle holds pieces of one order only.
      constraint pieces_bundle foreign key (bundle_id, order_id) references bundles (id, order_id)
    );
    create index pieces_of_order on pieces (order_id, state);
    create index pieces_of_run on pieces (run_id, state);
    create index pieces_of_bundle on pieces (bundle_id) where bundle_id is not null;
    create unique index pieces_one_live_per_place on pieces (line_id, sequence)
      where state not in ('scrapped', 'withdrawn');

    create table piece_events (
      id bigint generated always as identity primary key,
      piece_id uuid not null references pieces,
      from_state text,
      to_state text not null,
      person_id uuid not null references people,
      station text not null check (station in ('counter', 'brake', 'rack', 'office', 'roof')),
      reason text,
      undoes bigint constraint piece_events_undone_once unique references piece_events,
      bundle_id uuid references bundles,
      at timestamptz not null default clock_timestamp()
    );
    create index piece_events_of_piece on piece_events (piece_id, id);

    create function check_piece_move() returns trigger language plpgsql as $$
    begin
      if tg_op = 'INSERT' then
        if new.state <> 'queued' then
          raise exception 'a piece begins queued, not %', new.state using errcode = 'FY001';
        end if;
      elsif new.state <> old.state then
        perform 1 from piece_moves where from_state = old.state and to_state = new.state;
        if not found then
          raise exception 'piece % cannot go from % to %', old.code, old.state, new.state using errcode = 'FY001';
        end if;
      end if;
      return new;
    end $$;
    create trigger pieces_move before insert or update on pieces
      for each row execute function check_piece_move();

    create function check_piece_event() returns trigger language plpgsql as $$
    declare
      last_state text;
      reason_needed boolean;
    begin
      select to_state into last_state from piece_events where piece_id = new.piece_id order by id desc limit 1;
      if last_state is distinct from new.from_state then
        raise exception 'event starts at % but the piece was last %', new.from_state, last_state using errcode = 'FY006';
      end if;
      if new.from_state is null then
        if new.to_state <> 'queued' then
          raise exception 'a piece begins queued, not %', new.to_state using errcode = 'FY001';
        end if;
      else
        select needs_reason into reason_needed from piece_moves
          where from_state = new.from_state and to_state = new.to_state;
        if not found then
          raise exception 'no move from % to %', new.from_state, new.to_state using errcode = 'FY001';
        end if;
        if reason_needed and coalesce(btrim(new.reason), '') = '' then
          raise exception 'a move from % to % needs a reason', new.from_state, new.to_state using errcode = 'FY003';
        end if;
      end if;
      return new;
    end $$;
    create trigger piece_events_chain before insert on piece_events
      for each row execute function check_piece_event();
    create trigger piece_events_append_only before update or delete on piece_events
      for each row execute function refuse_change();
    create trigger piece_events_no_truncate before truncate on piece_events
      for each statement execute function refuse_change();

    create function check_state_has_event() returns trigger language plpgsql as $$
    declare
      concerned uuid := case when tg_table_name = 'pieces' then new.id else null end;
      piece_state text;
      event_state text;
    begin
      if concerned is null then
        concerned := (to_jsonb(new) ->> 'piece_id')::uuid;
      end if;
      select state into piece_state from pieces where id = concerned;
      select to_state into event_state from piece_events where piece_id = concerned order by id desc limit 1;
      if piece_state is distinct from event_state then
        raise exception 'piece % is % but its last event says %', concerned, piece_state, event_state using errcode = 'FY002';
      end if;
      return null;
    end $$;
    create constraint trigger pieces_state_has_event after insert or update of state on pieces
      deferrable initially deferred for each row execute function check_state_has_event();
    create constraint trigger piece_events_make_state after insert on piece_events
      deferrable initially deferred for each row execute function check_state_has_event();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table piece_events;
    drop table pieces;
    drop table piece_moves;
    drop function check_state_has_event;
    drop function check_piece_event;
    drop function check_piece_move;
  `)
}
