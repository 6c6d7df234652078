import type { Knex } from 'knex'

/** Who changed people, companies and prices, and how. Never changed itself. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table audit_log (
      id bigint generated always as identity primary key,
      at timestamptz not null,
      person_id uuid not null references people,
      subject_kind text not null constraint audit_log_subject_known check (
        subject_kind in ('person', 'company', 'price')),
      subject_id uuid not null,
      -- What it was called then.
      subject_name text not null,
      action text not null,
      before jsonb,
      after jsonb
    );
    create index audit_log_person on audit_log (person_id, id);
    create index audit_log_subject on audit_log (subject_kind, subject_id, id);

    create trigger audit_log_append_only before update or delete on audit_log
      for each row execute function refuse_change();
    create trigger audit_log_no_truncate before truncate on audit_log
      for each statement execute function refuse_change();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table audit_log')
}
