import type { Knex } from 'knex'

/** Bend plans by the hash of what settles them; only time is lost when a row is. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table plan_cache (
      hash text primary key,
      plan jsonb not null,
      made_at timestamptz not null,
      -- Written at most once a day, for tidying up alone.
      used_at timestamptz not null
    );
    create index plan_cache_used_at on plan_cache (used_at);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table plan_cache')
}
