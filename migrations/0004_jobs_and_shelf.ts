import type { Knex } from 'knex'

/** Jobs of a company, and saved profiles: a company's own or, without a company, the starters. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table jobs (
      id uuid primary key default gen_random_uuid(),
      company_id uuid not null references companies,
      name text not null,
      address text not null default '',
      pitch_rise double precision not null check (pitch_rise between 0 and 24),
      version integer not null default 1,
      created_by uuid not null references people,
      created_at timestamptz not null default now(),
      constraint jobs_of_company unique (id, company_id)
    );
    create index jobs_newest on jobs (company_id, created_at desc, id desc);

    create table shelf_profiles (
      id uuid primary key default gen_random_uuid(),
      company_id uuid references companies,
      starter_key text constraint shelf_profiles_starter_unique unique,
      name text not null,
      profile jsonb not null,
      version integer not null default 1,
      updated_at timestamptz not null default now(),
      constraint shelf_profiles_owner check ((company_id is null) = (starter_key is not null))
    );
    create index shelf_profiles_company on shelf_profiles (company_id, name);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table shelf_profiles; drop table jobs;')
}
