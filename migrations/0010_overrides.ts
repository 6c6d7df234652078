import type { Knex } from 'knex'

/**
 * Who released the pieces of a run on a brake that bends them under no order known, when and why:
 * by, at, reason. The same stands in the frozen lines. Null where the brake bends them.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`alter table runs add column override jsonb`)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table runs drop column override')
}
