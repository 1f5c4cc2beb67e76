import type { Knex } from 'knex';

const setting = (name: string): string =>
  `(select nullif(current_setting('marlwick.${name}', true), ''))`;
const ORGANISATION = setting('organisation_id');
const PERSON = setting('person_id');
const TOKEN = setting('token_hash');
const PLANTS = setting('plant_ids');

/** Tables that say to which plant a row belongs, and where. */
const PLANT_COLUMNS: Readonly<Record<string, string>> = {
  plants: 'id',
  sampling_points: 'plant_id',
  train_steps: 'plant_id',
  dosing_points: 'plant_id',
  shift_notes: 'plant_id',
  samples: 'plant_id',
  plans: 'plant_id',
  feed_log: 'plant_id',
};
const TENANT_TABLES = [
  'invitations',
  'api_tokens',
  'idempotency_keys',
  'membership_plants',
  'feed_log',
];
const PERSON_TABLES = ['one_time_tokens', 'recovery_codes', 'external_identities', 'sessions'];

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table people
      add column email_verified_at timestamptz,
      -- Encrypted; in force once confirmed with a first code.
      add column totp_secret text,
      add column totp_confirmed_at timestamptz,
      -- The last time step whose code was taken: none is taken twice.
      add column totp_last_step bigint not null default 0;
    -- Someone who only signs in through the organisation's own provider has no password.
    alter table people alter column password_hash drop not null;
    -- Whoever is here already was let in by hand. Row policies hold the owner too: lifted for this one statement.
    alter table people no force row level security;
    update people set email_verified_at = created_at;
    alter table people force row level security;

    alter table memberships
      add column all_plants boolean not null default true,
      -- Someone who left stays known by name: what they wrote down stays theirs.
      add column left_at timestamptz;
    drop policy own on organisations;
    create policy own on organisations for select using (
      exists (select from memberships m
        where m.organisation_id = organisations.id and m.person_id = ${PERSON} and m.left_at is null));
    create table membership_plants (
      organisation_id text not null,
      person_id text not null,
      plant_id text not null references plants on delete cascade,
      primary key (organisation_id, person_id, plant_id),
      foreign key (organisation_id, person_id) references memberships on delete cascade
    );

    -- A browser's session: its cookie holds the secret, this table the hash. Ended, it opens nothing any more.
    create table sessions (
      session_hash text primary key check (length(session_hash) = 64),
      person_id text not null references people on delete cascade,
      started_at timestamptz not null,
      last_seen_at timestamptz not null,
      ended_at timestamptz,
      -- As the browser names itself, to tell one's sessions apart.
      browser text not null default ''
    );
    create index sessions_person on sessions (person_id) where ended_at is null;

    create table one_time_tokens (
      token_hash text primary key check (length(token_hash) = 64),
      person_id text not null references people on delete cascade,
      purpose text not null check (purpose in ('verify-email', 'reset-password')),
      expires_at timestamptz not null,
      used_at timestamptz,
      created_at timestamptz not null default now()
    );
    create index one_time_tokens_person on one_time_tokens (person_id, purpose);

    create table recovery_codes (
      person_id text not null references people on delete cascade,
      code_hash text not null check (length(code_hash) = 64),
      used_at timestamptz,
      primary key (person_id, code_hash)
    );

    create table external_identities (
      -- SHA-256 of issuer and subject.
      identity_hash text primary key check (length(identity_hash) = 64),
      person_id text not null references people on delete cascade,
      provider text not null,
      linked_at timestamptz not null default now()
    );

    create table invitations (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      email text not null check (email = lower(email)),
      role text not null check (role in ('operator', 'consultant', 'manager', 'owner')),
      -- Null: all plants, those added later too.
      plant_ids text[],
      token_hash text not null unique check (length(token_hash) = 64),
      invited_by text not null references people,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      accepted_at timestamptz,
      revoked_at timestamptz
    );
    create index invitations_organisation on invitations (organisation_id, created_at desc);

    create table api_tokens (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      name text not null check (name <> ''),
      prefix text not null,
      token_hash text not null unique check (length(token_hash) = 64),
      scopes text[] not null,
      plant_ids text[],
      -- The token may never do more than this person may now.
      made_by text not null references people,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      last_used_at timestamptz,
      revoked_at timestamptz
    );
    create index api_tokens_organisation on api_tokens (organisation_id, created_at desc);

    create table idempotency_keys (
      organisation_id text not null references organisations on delete cascade,
      actor_id text not null,
      key text not null check (length(key) between 1 and 255),
      request_hash text not null check (length(request_hash) = 64),
      status integer,
      body jsonb,
      created_at timestamptz not null default now(),
      primary key (organisation_id, actor_id, key)
    );

    alter table targets
      add column version integer not null default 1,
      add column changed_at timestamptz not null default now();

    create table feed_log (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      dosing_point_id text not null references dosing_points on delete cascade,
      client_key text not null,
      fed_from timestamptz not null,
      fed_to timestamptz not null,
      -- Product as delivered.
      product_kg double precision not null check (product_kg >= 0),
      water_treated_ml double precision check (water_treated_ml > 0),
      note text not null default '' check (length(note) <= 2000),
      logged_by text not null references people,
      logged_at timestamptz not null default now(),
      check (fed_from < fed_to),
      unique (organisation_id, client_key)
    );
    create index feed_log_plant on feed_log (plant_id, fed_from desc, id);
  `);
  for (const table of [...TENANT_TABLES, ...PERSON_TABLES]) {
    await knex.raw('alter table ?? enable row level security', [table]);
    await knex.raw('alter table ?? force row level security', [table]);
  }
  for (const table of TENANT_TABLES) {
    await knex.raw(
      `create policy tenant on ?? using (organisation_id = ${ORGANISATION})
         with check (organisation_id = ${ORGANISATION})`,
      [table],
    );
  }
  for (const table of PERSON_TABLES) {
    await knex.raw(
      `create policy own on ?? using (person_id = ${PERSON}) with check (person_id = ${PERSON})`,
      [table],
    );
  }
  await knex.raw(`
    create policy own on membership_plants for select using (person_id = ${PERSON});
    -- Whoever brings the secret may read the one row it opens.
    create policy by_token on one_time_tokens for select using (token_hash = ${TOKEN});
    create policy by_token on sessions for select using (session_hash = ${TOKEN});
    create policy by_token on invitations for select using (token_hash = ${TOKEN});
    create policy by_token on api_tokens for select using (token_hash = ${TOKEN});
    create policy by_token on external_identities for select using (identity_hash = ${TOKEN});
  `);
  for (const [table, column] of Object.entries(PLANT_COLUMNS)) {
    // Restrictive: on top of the tenant's policy, for people and tokens that see named plants only.
    await knex.raw(
      `create policy named_plants on ?? as restrictive
         using (${PLANTS} is null or ?? = any(string_to_array(${PLANTS}, ',')))`,
      [table, column],
    );
  }
}

export async function down(knex: Knex): Promise<void> {
  for (const table of Object.keys(PLANT_COLUMNS)) {
    await knex.raw('drop policy named_plants on ??', [table]);
  }
  await knex.raw(`
    drop table sessions, feed_log, idempotency_keys, api_tokens, invitations, external_identities, recovery_codes,
      one_time_tokens, membership_plants;
    alter table targets drop column version, drop column changed_at;
    drop policy own on organisations;
    alter table memberships no force row level security;
    delete from memberships where left_at is not null;
    alter table memberships force row level security;
    alter table memberships drop column all_plants, drop column left_at;
    create policy own on organisations for select using (
      exists (select from memberships m where m.organisation_id = organisations.id and m.person_id = ${PERSON}));
    alter table people no force row level security;
    delete from people where password_hash is null;
    alter table people force row level security;
    alter table people alter column password_hash set not null;
    alter table people drop column email_verified_at, drop column totp_secret,
      drop column totp_confirmed_at, drop column totp_last_step;
  `);
}
