import type { Knex } from 'knex'

/** Where pieces are gathered: runs at the brake, bundles on the rack, hand-offs at the counter. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create sequence run_numbers as integer start 101;

    create table runs (
      id uuid primary key default gen_random_uuid(),
      number integer not null default nextval('run_numbers') constraint runs_number_unique unique,
      code text not null constraint runs_code_unique unique,
      order_id uuid not null references orders,
      brake_id uuid not null references brakes,
      name text not null,
      -- Frozen at release: what the bend card shows never changes under the bender's hands.
      profile jsonb not null,
      stock jsonb not null,
      strip jsonb not null,
      brake jsonb not null,
      plan jsonb not null,
      claimed_by uuid references people,
      claimed_at timestamptz,
      created_at timestamptz not null default now(),
      constraint runs_claim_whole check ((claimed_by is null) = (claimed_at is null)),
      constraint runs_of_order unique (id, order_id)
    );
    alter sequence run_numbers owned by runs.number;
    create index runs_of_brake on runs (brake_id);

    create table hand_offs (
      id uuid primary key default gen_random_uuid(),
      order_id uuid not null references orders,
      received_by text not null,
      handed_by uuid not null references people,
      signature jsonb not null,
      at timestamptz not null default clock_timestamp(),
      constraint hand_offs_of_order unique (id, order_id)
    );
    create index hand_offs_order on hand_offs (order_id, at);

    create table bundles (
      id uuid primary key default gen_random_uuid(),
      code text not null constraint bundles_code_unique unique,
      order_id uuid not null references orders,
      number integer not null,
      rack_place text not null check (rack_place ~ '^[A-Z]{1,2}[0-9]{1,2}$'),
      hand_off_id uuid,
      created_by uuid not null references people,
      created_at timestamptz not null default clock_timestamp(),
      constraint bundles_number_unique unique (order_id, number),
      constraint bundles_of_order unique (id, order_id),
      constraint bundles_hand_off foreign key (hand_off_id, order_id) references hand_offs (id, order_id)
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table bundles; drop table hand_offs; drop table runs;')
}
