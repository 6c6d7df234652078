import type { Knex } from 'knex'

/**
 * Where a stock's K comes from, what its paint bears, and what the shop measured of it: test bends,
 * and which of their fits was in use on which brake and when. K of stocks known before is called
 * the shop's own, since nobody wrote down where it came from.
 *
 * A test bend is never changed or removed, only withdrawn once; a calibration is replaced by the
 * next one of its stock and brake, one without K goes back to the stock's own.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table stocks
      add column k_source text not null default 'shop'
        constraint stocks_k_source_known check (
          k_source in ('handbookHard', 'handbookSoft', 'din6935', 'shop')),
      add column paint_t_bend double precision check (paint_t_bend between 0 and 20),
      add column alloy text check (length(alloy) between 1 and 40);
    alter table stocks alter column k_source drop default;

    create table test_bends (
      id uuid primary key default gen_random_uuid(),
      stock_id uuid not null references stocks,
      brake_id uuid not null references brakes,
      strip_width double precision not null check (strip_width > 0),
      leg_a double precision not null check (leg_a > 0),
      leg_b double precision not null check (leg_b > 0),
      turn double precision not null check (turn > 0 and turn < 180),
      thickness double precision not null check (thickness > 0),
      -- Null where it was not measured.
      inside_radius double precision check (inside_radius >= 0),
      note text not null default '',
      person_id uuid not null references people,
      at timestamptz not null default clock_timestamp(),
      withdrawn_by uuid references people,
      withdrawn_at timestamptz,
      withdrawn_reason text,
      constraint test_bends_withdrawal_whole check (
        num_nulls(withdrawn_by, withdrawn_at, withdrawn_reason) in (0, 3))
    );
    create index test_bends_of_stock on test_bends (stock_id, at desc);

    create function check_test_bend_change() returns trigger language plpgsql as $$
    begin
      if old.withdrawn_at is not null or to_jsonb(new) - array['withdrawn_by', 'withdrawn_at', 'withdrawn_reason']
        is distinct from to_jsonb(old) - array['withdrawn_by', 'withdrawn_at', 'withdrawn_reason'] then
        raise exception 'a test bend can only be withdrawn, and once' using errcode = 'FY004';
      end if;
      return new;
    end $$;
    create trigger test_bends_only_withdrawn before update on test_bends
      for each row execute function check_test_bend_change();
    create trigger test_bends_kept before delete on test_bends
      for each row execute function refuse_change();
    create trigger test_bends_no_truncate before truncate on test_bends
      for each statement execute function refuse_change();

    create table calibrations (
      id bigint generated always as identity primary key,
      stock_id uuid not null references stocks,
      brake_id uuid not null references brakes,
      k_factor double precision check (k_factor > 0 and k_factor <= 1),
      inside_radius double precision check (inside_radius >= 0),
      -- How many test bends it rests on.
      bends integer check (bends > 0),
      person_id uuid not null references people,
      at timestamptz not null default clock_timestamp(),
      constraint calibrations_whole check (num_nulls(k_factor, inside_radius, bends) in (0, 3))
    );
    create index calibrations_of_stock on calibrations (stock_id, brake_id, id desc);
    create trigger calibrations_append_only before update or delete on calibrations
      for each row execute function refuse_change();
    create trigger calibrations_no_truncate before truncate on calibrations
      for each statement execute function refuse_change();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table calibrations;
    drop table test_bends;
    drop function check_test_bend_change;
    alter table stocks drop column k_source, drop column paint_t_bend, drop column alloy;
  `)
}
