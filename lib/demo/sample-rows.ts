import { measuredValues } from '@/lib/samples/measured-values';
import { solveSample } from '@/lib/samples/solve-sample';
import { MINUTE_MS } from './calendar';
import { demoId, demoUuid } from './ids';
import { withMistakes } from './mistakes';
import type { Random } from './random';
import type { Visit } from './rounds';
import { fillSheet } from './sampling';
import type { DemoResult, DemoSample, DemoSolution } from './schema';

/** Where a works' samples belong, and who wrote them. */
export interface SampleBook {
  readonly worksSlug: string;
  readonly plantId: string;
  readonly pointIds: ReadonlyMap<string, string>;
  readonly now: Date;
  readonly onDuty: (momentMs: number) => string;
}

/** Fills in a sheet for every visit, makes the mistakes, and solves what can be solved. Newest first. */
export function sampleRows(
  visits: readonly Visit[],
  book: SampleBook,
  random: Random,
): DemoSample[] {
  const newestFirst = visits.toSorted((a, b) => b.takenMs - a.takenMs);
  const sheets = newestFirst.map(({ point, worksDay, takenMs, water }) => {
    const daysBeforeEnd = worksDay.day.daysBeforeEnd;
    const name = `${book.worksSlug} ${point.slug} ${new Date(takenMs).toISOString()}`;
    const own = random.fork(name);
    const results = fillSheet(point.quantities, water, own);
    return { pointSlug: point.slug, daysBeforeEnd, takenMs, name, own, results };
  });
  return withMistakes(book.worksSlug, sheets).map(({ pointSlug, takenMs, name, own, results }) => {
    const enteredMs = takenMs + own.between(12, 55) * MINUTE_MS;
    return {
      id: demoId(random, 'sample', name),
      plantId: book.plantId,
      pointId: book.pointIds.get(pointSlug) ?? '',
      clientKey: demoUuid(own),
      takenAt: new Date(Math.floor(takenMs / MINUTE_MS) * MINUTE_MS),
      enteredAt: new Date(Math.min(enteredMs, book.now.getTime())),
      enteredBy: book.onDuty(takenMs),
      comment: '',
      results,
      solution: solutionOf(results),
    };
  });
}

function solutionOf(results: readonly DemoResult[]): DemoSolution | null {
  const solved = solveSample(measuredValues(results));
  if (solved.analysis === null) return null;
  const { analysis } = solved;
  return solved.ok
    ? { analysis, assumptions: solved.assumptions, refusal: null, indices: solved.indices }
    : { analysis, assumptions: [], refusal: solved.refusal, indices: {} };
}
