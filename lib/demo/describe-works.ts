import { demoId } from './ids';
import type { Random } from './random';
import type { DemoData } from './schema';
import type { WorksDefinition } from './works/definition';

type Description = Pick<
  DemoData,
  'plants' | 'points' | 'pointQuantities' | 'targets' | 'trainSteps' | 'dosingPoints'
>;

/** What a works is, as rows: its train, taps, sheets and targets. `position` is its place among the works. */
export function describeWorks(works: WorksDefinition, position: number, random: Random) {
  const id = (kind: Parameters<typeof demoId>[1], name: string) =>
    demoId(random, kind, `${works.slug} ${name}`);
  const plantId = id('plant', '');
  const stepPosition = new Map(works.steps.map(({ kind }, index) => [kind, index + 1]));
  const placeOf = (kind: string): number => {
    const found = [...stepPosition].find(([step]) => step === kind);
    if (found === undefined) throw new Error(`${works.name} has no step ${kind}.`);
    return found[1];
  };
  const pointIds = new Map(works.points.map(({ slug }) => [slug, id('samplingPoint', slug)]));
  const dosingIds = new Map(works.dosing.map(({ key }) => [key, id('dosingPoint', key)]));
  const pointId = (slug: string): string => pointIds.get(slug) ?? '';
  const rows: Description = {
    plants: [
      {
        id: plantId,
        slug: works.slug,
        name: works.name,
        sourceSummary: works.sourceSummary,
        timeZone: works.timeZone,
        designFlowMlPerD: works.designFlowMlPerD,
        position,
      },
    ],
    points: works.points.map(({ slug, name, kind, after, everyH }) => ({
      id: pointId(slug),
      plantId,
      slug,
      name,
      kind,
      position: placeOf(after),
      sampleEveryH: everyH,
    })),
    pointQuantities: works.points.flatMap(({ slug, quantities }) =>
      quantities.map(({ quantity, unit, decimals, usual }, index) => ({
        pointId: pointId(slug),
        quantity,
        unit,
        decimals,
        position: index + 1,
        usualLow: usual[0],
        usualHigh: usual[1],
      })),
    ),
    targets: works.points.flatMap(({ slug, targets }) =>
      targets.map(({ quantity, lowest, highest, preferred, why }) => ({
        id: id('target', `${slug} ${quantity}`),
        pointId: pointId(slug),
        quantity,
        lowest,
        highest,
        preferred,
        basis: `Invented demo target: ${why}.`,
      })),
    ),
    trainSteps: works.steps.map(({ kind, name }, index) => ({
      id: id('trainStep', kind),
      plantId,
      position: index + 1,
      kind,
      name,
    })),
    dosingPoints: works.dosing.map(({ key, into, reagent, productName, doseBasis }, index) => ({
      id: dosingIds.get(key) ?? '',
      plantId,
      trainStepId: id('trainStep', works.steps[placeOf(into) - 1]?.kind ?? ''),
      position: index + 1,
      reagent,
      productName,
      doseBasis,
    })),
  };
  return { plantId, pointIds, dosingIds, rows };
}
