import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table organisations (
      id text primary key,
      slug text not null unique check (slug ~ '^[a-z0-9-]{2,60}$'),
      name text not null check (name <> ''),
      is_demo boolean not null default false,
      created_at timestamptz not null default now()
    );

    create table people (
      id text primary key,
      email text not null unique check (email = lower(email)),
      name text not null check (name <> ''),
      password_hash text not null,
      created_at timestamptz not null default now()
    );

    create table memberships (
      organisation_id text not null references organisations on delete cascade,
      person_id text not null references people on delete cascade,
      role text not null check (role in ('operator', 'consultant', 'manager', 'owner')),
      created_at timestamptz not null default now(),
      primary key (organisation_id, person_id)
    );
    create index memberships_person on memberships (person_id);

    create table plants (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      slug text not null check (slug ~ '^[a-z0-9-]{2,60}$'),
      name text not null check (name <> ''),
      source_summary text not null,
      time_zone text not null,
      design_flow_ml_per_d double precision not null check (design_flow_ml_per_d > 0),
      position integer not null,
      unique (organisation_id, slug)
    );

    create table sampling_points (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      slug text not null check (slug ~ '^[a-z0-9-]{2,60}$'),
      name text not null check (name <> ''),
      kind text not null check (kind in ('raw', 'clarified', 'filtered', 'finished', 'network')),
      -- Place along the train, shared with train steps: a point lies after the step of the same position.
      position integer not null,
      sample_every_h integer check (sample_every_h > 0),
      unique (plant_id, slug)
    );

    create table point_quantities (
      organisation_id text not null references organisations on delete cascade,
      point_id text not null references sampling_points on delete cascade,
      quantity text not null,
      unit text not null,
      decimals smallint not null check (decimals between 0 and 6),
      position integer not null,
      -- Usual range in the unit above; outside it the form asks, it does not refuse.
      usual_low double precision,
      usual_high double precision,
      primary key (point_id, quantity)
    );

    create table targets (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      point_id text not null references sampling_points on delete cascade,
      quantity text not null,
      -- In the quantity's canonical unit.
      lowest double precision,
      highest double precision,
      preferred double precision,
      basis text not null,
      unique (point_id, quantity),
      check (lowest is null or highest is null or lowest <= highest)
    );

    create table train_steps (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      position integer not null,
      kind text not null check (kind in ('intake', 'aeration', 'rapid-mix', 'clarifier', 'softening', 'recarbonation',
        'filter', 'contact-tank', 'clearwell', 'network')),
      name text not null check (name <> ''),
      unique (plant_id, position)
    );

    create table dosing_points (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      train_step_id text not null references train_steps on delete cascade,
      position integer not null,
      -- A reagent of the engine, or null for a product without equilibrium chemistry (polymer).
      reagent text,
      product_name text not null check (product_name <> ''),
      dose_basis text not null,
      unique (train_step_id, position)
    );

    create table feed_settings (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      dosing_point_id text not null references dosing_points on delete cascade,
      dose_mg_per_l double precision not null check (dose_mg_per_l >= 0),
      set_by text not null references people,
      set_at timestamptz not null,
      unique (dosing_point_id, set_at)
    );

    create table shift_notes (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      written_by text not null references people,
      written_at timestamptz not null,
      body text not null check (body <> '' and length(body) <= 2000)
    );
    create index shift_notes_plant on shift_notes (plant_id, written_at desc);
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table shift_notes, feed_settings, dosing_points, train_steps, targets, point_quantities, sampling_points,
      plants, memberships, people, organisations;
  `);
}
