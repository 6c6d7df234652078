import type { Knex } from 'knex'

/** What changed, for screens that follow along; kept a day so that a client can catch up. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table live_events (
      id bigint generated always as identity primary key,
      topic text not null,
      entity_id text,
      company_id uuid references companies,
      -- shop: the shop's people; company: they and the company's crew; all: everyone.
      audience text not null check (audience in ('shop', 'company', 'all')),
      at timestamptz not null default clock_timestamp(),
      check ((audience = 'company') = (company_id is not null))
    );
    create index live_events_at on live_events (at);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table live_events')
}
