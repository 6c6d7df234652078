import type { Knex } from 'knex'

/** Companies, people, their sessions, and what guards every request. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table companies (
      id uuid primary key default gen_random_uuid(),
      name text not null constraint companies_name_unique unique,
      created_at timestamptz not null default now()
    );

    create table people (
      id uuid primary key default gen_random_uuid(),
      company_id uuid references companies,
      role text not null,
      name text not null,
      email text not null constraint people_email_unique unique,
      password_hash text not null,
      language text not null default 'en' check (language in ('en', 'es')),
      units text not null default 'fraction' check (units in ('fraction', 'decimal', 'mm')),
      theme text not null default 'system' check (theme in ('light', 'dark', 'system')),
      active boolean not null default true,
      last_sign_in_at timestamptz,
      created_at timestamptz not null default now(),
      constraint people_role_known check (role in ('crewLead', 'bender', 'counter', 'manager')),
      constraint people_company_of_crew check ((role = 'crewLead') = (company_id is not null)),
      constraint people_email_lower check (email = lower(email))
    );
    create index people_company on people (company_id);

    -- The shape connect-pg-simple reads and writes.
    create table sessions (
      sid varchar primary key,
      sess json not null,
      expire timestamp(6) not null
    );
    create index sessions_expire on sessions (expire);
    create index sessions_person on sessions ((sess -> 'passport' ->> 'user'));

    create table rate_limits (
      key text primary key,
      hits integer not null,
      resets_at timestamptz not null
    );

    -- One row for every change that was acknowledged under a key; a retry reads its answer here.
    create table idempotency_keys (
      person_id uuid not null references people,
      key text not null,
      method text not null,
      path text not null,
      request_hash text not null,
      status integer,
      answer jsonb,
      created_at timestamptz not null default now(),
      primary key (person_id, key)
    );
    create index idempotency_keys_created on idempotency_keys (created_at);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table idempotency_keys;
    drop table rate_limits;
    drop table sessions;
    drop table people;
    drop table companies;
  `)
}
