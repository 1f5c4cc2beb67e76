import type { Knex } from 'knex';

/** Every table that carries its tenant. A table added later needs its own policy: tests/db/row-policies.test.ts asks. */
const TENANT_TABLES = [
  'plants',
  'sampling_points',
  'point_quantities',
  'targets',
  'train_steps',
  'dosing_points',
  'feed_settings',
  'shift_notes',
  'samples',
  'results',
  'solutions',
  'sample_indices',
  'plans',
  'plan_doses',
];

// Asked once a statement, not once a row; an unset or empty setting matches nothing.
const ORGANISATION = `(select nullif(current_setting('marlwick.organisation_id', true), ''))`;
const PERSON = `(select nullif(current_setting('marlwick.person_id', true), ''))`;
const SIGN_IN_EMAIL = `(select nullif(current_setting('marlwick.sign_in_email', true), ''))`;

export async function up(knex: Knex): Promise<void> {
  for (const table of [...TENANT_TABLES, 'organisations', 'people', 'memberships']) {
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
  await knex.raw(`
    create policy tenant on memberships
      using (organisation_id = ${ORGANISATION})
      with check (organisation_id = ${ORGANISATION});
    create policy own on memberships for select using (person_id = ${PERSON});

    create policy tenant on organisations
      using (id = ${ORGANISATION}) with check (id = ${ORGANISATION});
    create policy own on organisations for select using (
      exists (select from memberships m where m.organisation_id = organisations.id and m.person_id = ${PERSON}));

    create policy known on people for select using (
      id = ${PERSON} or email = ${SIGN_IN_EMAIL}
      or exists (select from memberships m where m.person_id = people.id and m.organisation_id = ${ORGANISATION}));
    create policy joins on people for insert with check (true);
    create policy own on people for update using (id = ${PERSON}) with check (id = ${PERSON});
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop policy tenant on memberships; drop policy own on memberships;
    drop policy tenant on organisations; drop policy own on organisations;
    drop policy known on people; drop policy joins on people; drop policy own on people;
  `);
  for (const table of TENANT_TABLES) await knex.raw('drop policy tenant on ??', [table]);
  for (const table of [...TENANT_TABLES, 'organisations', 'people', 'memberships']) {
    await knex.raw('alter table ?? no force row level security', [table]);
    await knex.raw('alter table ?? disable row level security', [table]);
  }
}
