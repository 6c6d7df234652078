import type { Knex } from 'knex'

/**
 * What the shop charges: every version is kept, the newest counts. Money is whole cents, so the
 * definition holds no fractions of them.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table price_books (
      id bigint generated always as identity primary key,
      definition jsonb not null check (jsonb_typeof(definition) = 'object'),
      person_id uuid not null references people,
      at timestamptz not null default clock_timestamp()
    );
    create trigger price_books_append_only before update or delete on price_books
      for each row execute function refuse_change();
    create trigger price_books_no_truncate before truncate on price_books
      for each statement execute function refuse_change();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table price_books')
}
