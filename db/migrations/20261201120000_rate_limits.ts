import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    -- Shared by all web processes. Keys are hashes: no address or name stands here.
    create table rate_limits (
      key varchar(255) primary key,
      points integer not null default 0,
      expire bigint
    );
    alter table rate_limits enable row level security;
    alter table rate_limits force row level security;
    -- No tenant's data: counted before anyone is known.
    create policy everyone on rate_limits using (true) with check (true);
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table rate_limits;');
}
