import type { Knex } from 'knex';
import type { DemoData, DemoPerson } from '@/lib/demo/schema';
import type { MembershipRow, OrganisationRow, PersonRow } from '../tables/rows';
import { demoColumns } from './demo-columns';
import { insertRows } from './insert-rows';

export interface DemoToInsert {
  readonly data: DemoData;
  /** Of those who may sign in; anyone else gets a hash that no password makes. */
  readonly passwordHashByEmail: ReadonlyMap<string, string>;
}

const NO_PASSWORD = 'nobody signs in with this';

/** Inserts every row of the demo, parents first. Call inside a transaction. */
export async function insertDemo(
  db: Knex,
  { data, passwordHashByEmail }: DemoToInsert,
): Promise<void> {
  const { organisation } = data;
  await db<OrganisationRow>('organisations').insert({ ...organisation, is_demo: true });
  await insertPeople(db, data.people, passwordHashByEmail);
  await db<MembershipRow>('memberships').insert(
    data.people.map(({ id, role }) => ({
      organisation_id: organisation.id,
      person_id: id,
      role,
    })),
  );
  const columns = demoColumns(organisation.id);
  await insertRows(db, 'plants', columns.plants, data.plants);
  await insertRows(db, 'sampling_points', columns.points, data.points);
  await insertRows(db, 'point_quantities', columns.pointQuantities, data.pointQuantities);
  await insertRows(db, 'targets', columns.targets, data.targets);
  await insertRows(db, 'train_steps', columns.trainSteps, data.trainSteps);
  await insertRows(db, 'dosing_points', columns.dosingPoints, data.dosingPoints);
  await insertRows(db, 'feed_settings', columns.feedSettings, data.feedSettings);
  await insertRows(db, 'shift_notes', columns.shiftNotes, data.shiftNotes);
  await insertSamples(db, data, columns);
}

/** People outlive an organisation: those already known stay as they are. */
async function insertPeople(
  db: Knex,
  people: readonly DemoPerson[],
  passwordHashByEmail: ReadonlyMap<string, string>,
): Promise<void> {
  await db<PersonRow>('people')
    .insert(
      people.map(({ id, email, name }) => ({
        email_verified_at: db.fn.now(),
        id,
        email,
        name,
        password_hash: passwordHashByEmail.get(email) ?? NO_PASSWORD,
      })),
    )
    .onConflict()
    .ignore();
}

async function insertSamples(
  db: Knex,
  { samples, engineVersion, constantsHash }: DemoData,
  columns: ReturnType<typeof demoColumns>,
): Promise<void> {
  await insertRows(db, 'samples', columns.samples, samples);
  const results = samples.flatMap((sample) =>
    sample.results.map((result) => ({ sampleId: sample.id, ...result })),
  );
  await insertRows(db, 'results', columns.results, results);
  const solutions = samples.flatMap(({ id, enteredAt, solution }) =>
    solution === null
      ? []
      : [{ sampleId: id, solvedAt: enteredAt, engineVersion, constantsHash, ...solution }],
  );
  await insertRows(db, 'solutions', columns.solutions, solutions);
  const indices = solutions.flatMap(({ sampleId, indices: found }) =>
    Object.entries(found).map(([quantity, value]) => ({ sampleId, quantity, value })),
  );
  await insertRows(db, 'sample_indices', columns.sampleIndices, indices);
}
