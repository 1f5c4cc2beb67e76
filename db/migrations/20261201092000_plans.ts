import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table plans (
      id text primary key,
      organisation_id text not null references organisations on delete cascade,
      plant_id text not null references plants on delete cascade,
      sample_id text not null references samples,
      client_key uuid not null,
      status text not null default 'draft' check (status in ('draft')),
      target_quantity text not null,
      target_value double precision not null,
      engine_version text not null,
      constants_hash text not null,
      analysis jsonb not null,
      -- Quantities and indices before and at equilibrium, as the server computed them when the plan was saved.
      predicted jsonb not null,
      reason text not null default '' check (length(reason) <= 2000),
      created_by text not null references people,
      created_at timestamptz not null default now(),
      unique (organisation_id, client_key)
    );
    create index plans_plant_time on plans (plant_id, created_at desc);

    create table plan_doses (
      organisation_id text not null references organisations on delete cascade,
      plan_id text not null references plans on delete cascade,
      position integer not null,
      reagent text not null,
      dose_mg_per_l double precision not null check (dose_mg_per_l >= 0),
      primary key (plan_id, position)
    );
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table plan_doses, plans;');
}
