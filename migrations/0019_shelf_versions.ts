import type { Knex } from 'knex'

/**
 * Every version of a company's saved profile stays: the table beside it is written by the database
 * itself whenever one is put on the shelf or changed. A company has a name only once on its shelf;
 * of profiles that bore the same one, all but the first are told apart by the beginning of their id.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    update shelf_profiles s
      set name = left(s.name, 68) || ' (' || left(s.id::text, 8) || ')'
      from (
        select id, row_number() over (
          partition by company_id, lower(name) order by updated_at, id) as place
          from shelf_profiles where company_id is not null
      ) named
      where named.id = s.id and named.place > 1;
    create unique index shelf_profiles_name_unique on shelf_profiles (company_id, lower(name))
      where company_id is not null;

    alter table shelf_profiles add column saved_by uuid references people;

    create table shelf_versions (
      profile_id uuid not null references shelf_profiles,
      version integer not null,
      name text not null,
      profile jsonb not null,
      -- Null for what was saved before this was noted.
      saved_by uuid references people,
      saved_at timestamptz not null,
      primary key (profile_id, version)
    );
    insert into shelf_versions (profile_id, version, name, profile, saved_at)
      select id, version, name, profile, updated_at from shelf_profiles
      where company_id is not null;

    create function keep_shelf_version() returns trigger language plpgsql as $$
    begin
      insert into shelf_versions (profile_id, version, name, profile, saved_by, saved_at)
        values (new.id, new.version, new.name, new.profile, new.saved_by, new.updated_at);
      return null;
    end $$;
    create trigger shelf_profiles_versions after insert or update on shelf_profiles
      for each row when (new.company_id is not null) execute function keep_shelf_version();

    create trigger shelf_versions_append_only before update or delete on shelf_versions
      for each row execute function refuse_change();
    create trigger shelf_versions_no_truncate before truncate on shelf_versions
      for each statement execute function refuse_change();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop trigger shelf_profiles_versions on shelf_profiles;
    drop function keep_shelf_version();
    drop table shelf_versions;
    alter table shelf_profiles drop column saved_by;
    drop index shelf_profiles_name_unique;
  `)
}
