import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table samples (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      point_id text not null references sampling_points on delete cascade,
      -- Made by the form before it sends: a repeated send finds the first one.
      client_key uuid not null,
      taken_at timestamptz not null,
      entered_at timestamptz not null default now(),
      entered_by text not null references people,
      comment text not null default '' check (length(comment) <= 2000),
      unique (organisation_id, client_key)
    );
    create index samples_point_time on samples (point_id, taken_at desc);
    create index samples_plant_time on samples (plant_id, taken_at desc);

    create table results (
      organisation_id text not null references organisations on delete cascade,
      sample_id text not null references samples on delete cascade,
      quantity text not null,
      -- Exactly as written by the person ("7.10"), with its unit and qualifier ('' for a plain value).
      entered_text text not null check (entered_text <> ''),
      entered_unit text not null,
      qualifier text not null default '' check (qualifier in ('', '<', '>', 'nd', 'e')),
      -- The same in the quantity's canonical unit.
      value double precision not null check (value = value),
      primary key (sample_id, quantity)
    );

    create table solutions (
      sample_id text primary key references samples on delete cascade,
      organisation_id text not null references organisations on delete cascade,
      engine_version text not null,
      constants_hash text not null,
      -- Exactly what the engine was asked, to be asked again.
      analysis jsonb not null,
      assumptions jsonb not null,
      -- Why there is no solution, in words; null when solved.
      refusal text,
      solved_at timestamptz not null default now()
    );

    create table sample_indices (
      organisation_id text not null references organisations on delete cascade,
      sample_id text not null references samples on delete cascade,
      quantity text not null,
      value double precision not null check (value = value),
      primary key (sample_id, quantity)
    );
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table sample_indices, solutions, results, samples;');
}
