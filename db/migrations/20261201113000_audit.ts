import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table audit_entries (
      organisation_id text not null references organisations on delete cascade,
      -- 1, 2, 3 … within the organisation, without a gap.
      position bigint not null check (position > 0),
      at timestamptz not null,
      -- Kept as words too: an entry must stay readable when a person has left.
      actor_id text not null,
      actor_name text not null,
      action text not null,
      subject_id text not null,
      detail jsonb not null,
      previous_hash text not null check (length(previous_hash) = 64),
      hash text not null check (length(hash) = 64),
      primary key (organisation_id, position)
    );
    alter table audit_entries enable row level security;
    alter table audit_entries force row level security;
    create policy tenant on audit_entries
      using (organisation_id = (select nullif(current_setting('marlwick.organisation_id', true), '')))
      with check (organisation_id = (select nullif(current_setting('marlwick.organisation_id', true), '')));

    -- The schema's owner may list the organisations, so that upkeep (the audit's check) can visit each in turn.
    create policy upkeep on organisations for select using (
      current_user = (select pg_get_userbyid(relowner) from pg_class where oid = 'organisations'::regclass));

    -- Nobody rewrites the past: not the app's role (it has no such right, see grants), and not the owner by accident.
    create function refuse_audit_change() returns trigger language plpgsql as $$
    begin
      raise exception 'the audit trail is append-only';
    end $$;
    create trigger audit_is_append_only before update or delete on audit_entries
      for each row execute function refuse_audit_change();
    create trigger audit_is_never_emptied before truncate on audit_entries
      for each statement execute function refuse_audit_change();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    'drop policy upkeep on organisations; drop table audit_entries; drop function refuse_audit_change;',
  );
}
