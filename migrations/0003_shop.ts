import type { Knex } from 'knex'

/** What the shop has: stocks and brakes. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table stocks (
      id uuid primary key default gen_random_uuid(),
      position integer not null,
      metal text not null check (metal in ('steel', 'stainless', 'aluminum', 'copper', 'zinc')),
      thickness_name text not null,
      color_name text not null,
      color_hex text not null check (color_hex ~* '^#[0-9a-f]{6}$'),
      painted boolean not null,
      thickness double precision not null check (thickness > 0),
      inside_radius double precision not null check (inside_radius >= 0),
      k_factor double precision not null check (k_factor > 0),
      density double precision not null check (density > 0),
      springback_per_90 double precision not null check (springback_per_90 >= 0),
      widest_strip double precision not null check (widest_strip > 0),
      longest_piece double precision not null check (longest_piece > 0),
      constraint stocks_unique unique (metal, thickness_name, color_name)
    );

    create table brakes (
      id uuid primary key default gen_random_uuid(),
      position integer not null,
      name text not null constraint brakes_name_unique unique,
      definition jsonb not null
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table brakes; drop table stocks;')
}
