import type {
  DemoData,
  DemoDosingPoint,
  DemoFeedSetting,
  DemoPlant,
  DemoPoint,
  DemoPointQuantity,
  DemoResult,
  DemoSample,
  DemoShiftNote,
  DemoSolution,
  DemoTarget,
  DemoTrainStep,
} from '@/lib/demo/schema';
import type { Column } from './insert-rows';

type Of<Thing> = readonly Column<Thing>[];
type Solved = DemoSolution &
  Pick<DemoData, 'engineVersion' | 'constantsHash'> & { sampleId: string; solvedAt: Date };

const column = <Thing>(
  name: string,
  type: Column<Thing>['type'],
  of: Column<Thing>['of'],
): Column<Thing> => ({ name, type, of });

/** Where every field of the demo's things goes. */
export function demoColumns(organisationId: string) {
  const organisation = column<unknown>('organisation_id', 'text', () => organisationId);
  const plants: Of<DemoPlant> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('slug', 'text', ({ slug }) => slug),
    column('name', 'text', ({ name }) => name),
    column('source_summary', 'text', ({ sourceSummary }) => sourceSummary),
    column('time_zone', 'text', ({ timeZone }) => timeZone),
    column('design_flow_ml_per_d', 'double precision', ({ designFlowMlPerD }) => designFlowMlPerD),
    column('position', 'integer', ({ position }) => position),
  ];
  const points: Of<DemoPoint> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('plant_id', 'text', ({ plantId }) => plantId),
    column('slug', 'text', ({ slug }) => slug),
    column('name', 'text', ({ name }) => name),
    column('kind', 'text', ({ kind }) => kind),
    column('position', 'integer', ({ position }) => position),
    column('sample_every_h', 'integer', ({ sampleEveryH }) => sampleEveryH),
  ];
  const pointQuantities: Of<DemoPointQuantity> = [
    organisation,
    column('point_id', 'text', ({ pointId }) => pointId),
    column('quantity', 'text', ({ quantity }) => quantity),
    column('unit', 'text', ({ unit }) => unit),
    column('decimals', 'integer', ({ decimals }) => decimals),
    column('position', 'integer', ({ position }) => position),
    column('usual_low', 'double precision', ({ usualLow }) => usualLow),
    column('usual_high', 'double precision', ({ usualHigh }) => usualHigh),
  ];
  const targets: Of<DemoTarget> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('point_id', 'text', ({ pointId }) => pointId),
    column('quantity', 'text', ({ quantity }) => quantity),
    column('lowest', 'double precision', ({ lowest }) => lowest),
    column('highest', 'double precision', ({ highest }) => highest),
    column('preferred', 'double precision', ({ preferred }) => preferred),
    column('basis', 'text', ({ basis }) => basis),
  ];
  const trainSteps: Of<DemoTrainStep> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('plant_id', 'text', ({ plantId }) => plantId),
    column('position', 'integer', ({ position }) => position),
    column('kind', 'text', ({ kind }) => kind),
    column('name', 'text', ({ name }) => name),
  ];
  const dosingPoints: Of<DemoDosingPoint> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('plant_id', 'text', ({ plantId }) => plantId),
    column('train_step_id', 'text', ({ trainStepId }) => trainStepId),
    column('position', 'integer', ({ position }) => position),
    column('reagent', 'text', ({ reagent }) => reagent),
    column('product_name', 'text', ({ productName }) => productName),
    column('dose_basis', 'text', ({ doseBasis }) => doseBasis),
  ];
  const feedSettings: Of<DemoFeedSetting> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('dosing_point_id', 'text', ({ dosingPointId }) => dosingPointId),
    column('dose_mg_per_l', 'double precision', ({ doseMgPerL }) => doseMgPerL),
    column('set_by', 'text', ({ setBy }) => setBy),
    column('set_at', 'timestamptz', ({ setAt }) => setAt),
  ];
  const shiftNotes: Of<DemoShiftNote> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('plant_id', 'text', ({ plantId }) => plantId),
    column('written_by', 'text', ({ writtenBy }) => writtenBy),
    column('written_at', 'timestamptz', ({ writtenAt }) => writtenAt),
    column('body', 'text', ({ body }) => body),
  ];
  const samples: Of<DemoSample> = [
    organisation,
    column('id', 'text', ({ id }) => id),
    column('plant_id', 'text', ({ plantId }) => plantId),
    column('point_id', 'text', ({ pointId }) => pointId),
    column('client_key', 'uuid', ({ clientKey }) => clientKey),
    column('taken_at', 'timestamptz', ({ takenAt }) => takenAt),
    column('entered_at', 'timestamptz', ({ enteredAt }) => enteredAt),
    column('entered_by', 'text', ({ enteredBy }) => enteredBy),
    column('comment', 'text', ({ comment }) => comment),
  ];
  const results: Of<DemoResult & { sampleId: string }> = [
    organisation,
    column('sample_id', 'text', ({ sampleId }) => sampleId),
    column('quantity', 'text', ({ quantity }) => quantity),
    column('entered_text', 'text', ({ text }) => text),
    column('entered_unit', 'text', ({ unit }) => unit),
    column('qualifier', 'text', ({ qualifier }) => qualifier),
    column('value', 'double precision', ({ value }) => value),
  ];
  const solutions: Of<Solved> = [
    organisation,
    column('sample_id', 'text', ({ sampleId }) => sampleId),
    column('engine_version', 'text', ({ engineVersion }) => engineVersion),
    column('constants_hash', 'text', ({ constantsHash }) => constantsHash),
    column('analysis', 'jsonb', ({ analysis }) => JSON.stringify(analysis)),
    column('assumptions', 'jsonb', ({ assumptions }) => JSON.stringify(assumptions)),
    column('refusal', 'text', ({ refusal }) => refusal),
    column('solved_at', 'timestamptz', ({ solvedAt }) => solvedAt),
  ];
  const sampleIndices: Of<{ sampleId: string; quantity: string; value: number }> = [
    organisation,
    column('sample_id', 'text', ({ sampleId }) => sampleId),
    column('quantity', 'text', ({ quantity }) => quantity),
    column('value', 'double precision', ({ value }) => value),
  ];
  return {
    plants,
    points,
    pointQuantities,
    targets,
    trainSteps,
    dosingPoints,
    feedSettings,
    shiftNotes,
    samples,
    results,
    solutions,
    sampleIndices,
  };
}
