import type { Knex } from 'knex'

/** Who was invited has no password yet; links by mail let people set one. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table people alter column password_hash drop not null;

    create table password_links (
      -- SHA-256 of the token in the link; the token itself is kept nowhere.
      token_hash bytea primary key,
      kind text not null check (kind in ('invitation', 'reset')),
      person_id uuid not null references people,
      created_at timestamptz not null,
      expires_at timestamptz not null check (expires_at > created_at),
      -- One open link of a kind for each person: a new one ends the one before.
      constraint password_links_one_of_a_kind unique (person_id, kind)
    );
  `)
}

/** Without a password nobody can sign in; an account made by invitation stays closed by one that fits nothing. */
export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table password_links;
    update people set password_hash = '!', active = false where password_hash is null;
    alter table people alter column password_hash set not null;
  `)
}
