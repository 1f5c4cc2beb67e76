import { describe, expect, it } from 'vitest';
import { buildDemo } from '@/lib/demo/build-demo';
import { MIS_FED_WEEK } from '@/lib/demo/mis-fed';
import type { DemoData, DemoSample } from '@/lib/demo/schema';
import type { QuantityKey } from '@/lib/samples/quantities';
import { checkResult } from '@/lib/samples/check-result';

const NOW = new Date('2026-12-01T10:30:00Z');
const DAY_MS = 86_400_000;
const demo = buildDemo({ now: NOW });

const pointId = (data: DemoData, worksSlug: string, pointSlug: string): string => {
  const plant = data.plants.find(({ slug }) => slug === worksSlug);
  const point = data.points.find(
    ({ plantId, slug }) => plantId === plant?.id && slug === pointSlug,
  );
  if (point === undefined) throw new Error(`${worksSlug} has no ${pointSlug}`);
  return point.id;
};
const samplesAt = (worksSlug: string, pointSlug: string): DemoSample[] => {
  const id = pointId(demo, worksSlug, pointSlug);
  return demo.samples.filter((sample) => sample.pointId === id);
};
const valuesOf = (samples: readonly DemoSample[], quantity: QuantityKey): number[] =>
  samples.flatMap(({ results }) =>
    results.filter((result) => result.quantity === quantity).map(({ value }) => value),
  );
const indexOf = (samples: readonly DemoSample[], index: string): number[] =>
  samples.flatMap(({ solution }) => solution?.indices[index] ?? []);
const quantile = (values: readonly number[], share: number): number =>
  values.toSorted((a, b) => a - b)[Math.floor(share * (values.length - 1))] ?? NaN;
const daysBefore = ({ takenAt }: DemoSample): number =>
  Math.floor((NOW.getTime() - takenAt.getTime()) / DAY_MS);

describe('the same seed and moment', () => {
  const few = { now: NOW, days: 20 };

  it('give identical rows', () => {
    expect(buildDemo(few)).toEqual(buildDemo(few));
  });

  it('and another seed gives other ids and other values', () => {
    const [one, other] = [buildDemo(few), buildDemo({ ...few, seed: 'another' })];
    const ids = new Set(one.samples.map(({ id }) => id));
    expect(other.samples.some(({ id }) => ids.has(id))).toBe(false);
    expect(other.samples.map(({ results }) => results)).not.toEqual(
      one.samples.map(({ results }) => results),
    );
  });

  it('but the organisation and its people stay who they are', () => {
    expect(buildDemo({ ...few, seed: 'another' }).organisation).toEqual(
      buildDemo(few).organisation,
    );
    expect(buildDemo({ ...few, seed: 'another' }).people).toEqual(demo.people);
  });
});

describe('two years of samples', () => {
  it('are there: each works daily at its taps, weekly in the network', () => {
    for (const { slug } of demo.plants) {
      expect(samplesAt(slug, 'finished')).toHaveLength(731);
      expect(samplesAt(slug, 'network')).toHaveLength(104);
    }
    expect(samplesAt('otterbank', 'raw').length).toBeGreaterThan(731 + 2 * 58);
  });

  it('have ids and client keys of their own', () => {
    expect(new Set(demo.samples.map(({ id }) => id)).size).toBe(demo.samples.length);
    expect(new Set(demo.samples.map(({ clientKey }) => clientKey)).size).toBe(demo.samples.length);
    expect(demo.samples[0]?.clientKey).toMatch(
      /^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/,
    );
  });

  it('were taken and then entered, never in the future', () => {
    const odd = demo.samples.filter(
      ({ takenAt, enteredAt }) => takenAt > enteredAt || enteredAt > NOW,
    );
    expect(odd).toEqual([]);
  });

  it('pass the checks of the entry form, and say in text what their value is', () => {
    const results = demo.samples.flatMap((sample) => sample.results);
    const odd = results.filter(({ quantity, text, unit, qualifier, value }) => {
      const checked = checkResult({ quantity, text, unit, qualifier });
      return checked.kind !== 'value' || checked.value !== value || checked.qualifier !== qualifier;
    });
    expect(results.length).toBeGreaterThan(90_000);
    expect(odd).toEqual([]);
  });

  // The source ranges of the invented works, from the product description.
  it.each([
    ['quarrel-hill', 'alkalinity', 8, 20],
    ['quarrel-hill', 'pH', 6.3, 7],
    ['quarrel-hill', 'calcium', 2, 5],
    ['quarrel-hill', 'colour', 20, 90],
    ['quarrel-hill', 'temperature', 3, 18],
    ['sallow-wells', 'alkalinity', 265, 295],
    ['sallow-wells', 'calcium', 90, 100],
    ['sallow-wells', 'magnesium', 16, 20],
    ['sallow-wells', 'iron', 0.55, 1.1],
    ['sallow-wells', 'manganese', 0.1, 0.2],
    ['sallow-wells', 'temperature', 9.5, 12.5],
    ['otterbank', 'turbidity', 3, 400],
    ['otterbank', 'alkalinity', 120, 180],
    ['otterbank', 'calcium', 60, 75],
  ] as const)('%s: raw %s lies in %d to %d in 98 of 100 samples', (slug, quantity, low, high) => {
    const values = valuesOf(samplesAt(slug, 'raw'), quantity);
    const inside = values.filter((value) => value >= low && value <= high);
    expect(values.length).toBeGreaterThan(700);
    expect(inside.length / values.length).toBeGreaterThanOrEqual(0.98);
  });

  it('follow season and rain: colour peaks in autumn, the river rises above 150 NTU and falls back', () => {
    const raw = samplesAt('quarrel-hill', 'raw');
    const inMonths = (...months: number[]) =>
      valuesOf(
        raw.filter(({ takenAt }) => months.includes(takenAt.getUTCMonth() + 1)),
        'colour',
      );
    expect(quantile(inMonths(10, 11), 0.5)).toBeGreaterThan(1.3 * quantile(inMonths(4, 5), 0.5));
    const turbidity = valuesOf(samplesAt('otterbank', 'raw'), 'turbidity');
    expect(Math.max(...turbidity)).toBeGreaterThan(150);
    expect(quantile(turbidity, 0.5)).toBeLessThan(15);
  });

  it('lie within the usual ranges of their own sheets in 97 of 100 results', () => {
    const usual = new Map(
      demo.pointQuantities.map((line) => [`${line.pointId} ${line.quantity}`, line]),
    );
    const outside = new Map<string, number>();
    for (const sample of demo.samples) {
      for (const { quantity, text } of sample.results) {
        const key = `${sample.pointId} ${quantity}`;
        const { usualLow = NaN, usualHigh = NaN } = usual.get(key) ?? {};
        const isOutside = !(Number(text) >= usualLow && Number(text) <= usualHigh);
        outside.set(key, (outside.get(key) ?? 0) + Number(isOutside));
      }
    }
    const often = [...outside]
      .filter(([key, count]) => {
        const id = key.split(' ')[0];
        return count / demo.samples.filter((sample) => sample.pointId === id).length > 0.03;
      })
      .map(([key]) => usual.get(key));
    expect(often).toEqual([]);
    expect(outside.size).toBe(demo.pointQuantities.length);
  });

  it.each([
    ['quarrel-hill', 'finished', 'iron'],
    ['quarrel-hill', 'filtered', 'turbidity'],
    ['quarrel-hill', 'finished', 'aluminum'],
    ['otterbank', 'raw', 'ammonia'],
    ['sallow-wells', 'finished', 'manganese'],
  ] as const)('say < where the test ends: %s %s %s', (slug, point, quantity) => {
    const below = samplesAt(slug, point).flatMap(({ results }) =>
      results.filter((result) => result.quantity === quantity && result.qualifier === '<'),
    );
    expect(below.length).toBeGreaterThan(3);
  });
});

describe('what the engine makes of them', () => {
  const asked = demo.samples.filter(({ solution }) => solution !== null);

  it('is asked for every sheet with temperature, pH and alkalinity, and answers 99 of 100', () => {
    const complete = demo.samples.filter(({ results }) =>
      ['temperature', 'pH', 'alkalinity'].every((key) =>
        results.some(({ quantity }) => quantity === key),
      ),
    );
    expect(asked).toHaveLength(complete.length);
    expect(asked.length).toBeGreaterThan(4500);
    const solved = asked.filter(({ solution }) => solution?.refusal === null);
    expect(solved.length / asked.length).toBeGreaterThanOrEqual(0.99);
  });

  it.each([
    ['quarrel-hill', 'raw', -4, -2.5],
    ['quarrel-hill', 'finished', -1, 0],
    ['sallow-wells', 'raw', -0.1, 0.3],
    ['sallow-wells', 'finished', 0, 0.4],
    ['otterbank', 'finished', -0.2, 0.4],
  ] as const)(
    '%s %s: the calcite index lies in %d to %d nineteen times in twenty',
    (slug, point, low, high) => {
      const found = indexOf(samplesAt(slug, point), 'calciteIndex');
      expect(found.length).toBe(samplesAt(slug, point).length);
      const inside = found.filter((value) => value >= low && value <= high);
      expect(inside.length / found.length).toBeGreaterThan(0.95);
    },
  );

  it.each([
    ['quarrel-hill', 'raw'],
    ['quarrel-hill', 'finished'],
    ['sallow-wells', 'raw'],
    ['sallow-wells', 'finished'],
    ['otterbank', 'raw'],
    ['otterbank', 'finished'],
  ] as const)('%s %s: charge balances within 5 percent in 98 of 100 samples', (slug, point) => {
    const balances = indexOf(samplesAt(slug, point), 'chargeBalance').map(Math.abs);
    expect(balances.length).toBeGreaterThan(700);
    expect(quantile(balances, 0.98)).toBeLessThan(5);
    expect(quantile(balances, 0.5)).toBeLessThan(2.5);
  });
});

describe('what went wrong on purpose', () => {
  it('the mis-fed week stands out in finished pH and calcite index', () => {
    const { firstDaysBeforeEnd, lastDaysBeforeEnd } = MIS_FED_WEEK;
    const finished = samplesAt('quarrel-hill', 'finished');
    const during = finished.filter(
      (sample) =>
        daysBefore(sample) <= firstDaysBeforeEnd && daysBefore(sample) >= lastDaysBeforeEnd,
    );
    const rest = finished.filter((sample) => !during.includes(sample) && daysBefore(sample) > 1);
    expect(during).toHaveLength(7);
    expect(Math.max(...valuesOf(during, 'pH'))).toBeLessThan(7.6);
    expect(Math.min(...valuesOf(rest, 'pH'))).toBeGreaterThan(7.6);
    expect(quantile(indexOf(during, 'calciteIndex'), 0.5)).toBeLessThan(
      quantile(indexOf(rest, 'calciteIndex'), 0.5) - 0.7,
    );
    expect(demo.shiftNotes.some(({ body }) => body.includes('air-locked'))).toBe(true);
  });

  it('and a blocking strainer leaves the pH of the day below target, with a note that says so', () => {
    const today = samplesAt('quarrel-hill', 'finished').filter((sample) => daysBefore(sample) < 1);
    const id = pointId(demo, 'quarrel-hill', 'finished');
    const aim = demo.targets.find((each) => each.pointId === id && each.quantity === 'pH');
    expect(valuesOf(today, 'pH')[0]).toBeLessThan(aim?.lowest ?? NaN);
    expect(demo.shiftNotes.some(({ body }) => body.includes('strainer suspected'))).toBe(true);
  });

  it.each([
    ['quarrel-hill', 'raw', 'calcium', (value: number) => value > 6],
    ['sallow-wells', 'raw', 'calcium', (value: number) => value < 60],
    ['otterbank', 'raw', 'temperature', (value: number) => value > 32],
    ['otterbank', 'finished', 'turbidity', (value: number) => value > 0.4],
    ['quarrel-hill', 'network', 'freeChlorine', (value: number) => value > 1.5],
  ] as const)('%s %s %s was written wrongly once', (slug, point, quantity, isWrong) => {
    expect(valuesOf(samplesAt(slug, point), quantity).filter(isWrong)).toHaveLength(1);
  });

  it('one alkalinity of Sallow Wells has its last digits swapped: its charge is far off', () => {
    const balances = indexOf(samplesAt('sallow-wells', 'finished'), 'chargeBalance');
    expect(balances.filter((value) => Math.abs(value) > 8)).toHaveLength(1);
  });

  it('nobody went into the network for a fortnight, where a week is the rule', () => {
    for (const { slug } of demo.plants) {
      const times = samplesAt(slug, 'network').map(({ takenAt }) => takenAt.getTime());
      const gaps = times.slice(1).map((time, index) => ((times[index] ?? NaN) - time) / DAY_MS);
      expect(gaps.filter((days) => days > 8).map(Math.round)).toEqual([14]);
    }
  });
});

describe('feeding and the log', () => {
  it('every dosing point has a setting in force, set by someone of the organisation', () => {
    const people = new Set(demo.people.map(({ id }) => id));
    const set = new Set(demo.feedSettings.map(({ dosingPointId }) => dosingPointId));
    expect(demo.dosingPoints.map(({ id }) => set.has(id))).toEqual(
      demo.dosingPoints.map(() => true),
    );
    const odd = demo.feedSettings.filter(
      ({ doseMgPerL, setBy, setAt }) => !(doseMgPerL >= 0) || !people.has(setBy) || setAt > NOW,
    );
    expect(odd).toEqual([]);
  });

  it('no dosing point is set twice at one moment', () => {
    const moments = demo.feedSettings.map(
      ({ dosingPointId, setAt }) => `${dosingPointId} ${setAt.toISOString()}`,
    );
    expect(new Set(moments).size).toBe(moments.length);
  });

  it('coagulant follows the water: more ferric in a spate than on a clear day', () => {
    const ferric = demo.dosingPoints.find(({ reagent }) => reagent === 'ferric-chloride')?.id;
    const doses = demo.feedSettings
      .filter(({ dosingPointId }) => dosingPointId === ferric)
      .map(({ doseMgPerL }) => doseMgPerL);
    expect(Math.max(...doses)).toBeGreaterThan(1.6 * quantile(doses, 0.5));
  });

  it('every works has notes of the last three days', () => {
    for (const { id } of demo.plants) {
      const recent = demo.shiftNotes.filter(
        ({ plantId, writtenAt }) =>
          plantId === id && NOW.getTime() - writtenAt.getTime() < 3 * DAY_MS,
      );
      expect(recent.length).toBeGreaterThanOrEqual(3);
      expect(recent.every(({ writtenAt }) => writtenAt <= NOW)).toBe(true);
    }
  });
});

describe.each([
  '2026-12-01T00:20:00Z',
  '2026-12-01T05:00:00Z',
  '2026-12-01T10:30:00Z',
  '2026-07-01T22:59:00Z',
  '2026-03-29T01:05:00Z',
])('seeded at %s', (iso) => {
  const now = new Date(iso);
  const data = buildDemo({ now, days: 16 });

  it('every tap has a sample of the last four hours, none of the future', () => {
    for (const { id } of data.points) {
      const times = data.samples
        .filter((sample) => sample.pointId === id)
        .map(({ takenAt }) => takenAt.getTime());
      const ageH = (now.getTime() - Math.max(...times)) / 3_600_000;
      expect(ageH).toBeGreaterThanOrEqual(0);
      expect(ageH).toBeLessThanOrEqual(4.1);
    }
  });

  it('no tap was visited twice within the hour', () => {
    for (const { id } of data.points) {
      const times = data.samples
        .filter((sample) => sample.pointId === id)
        .map(({ takenAt }) => takenAt.getTime());
      const gaps = times.slice(1).map((time, index) => (times[index] ?? NaN) - time);
      expect(Math.min(...gaps)).toBeGreaterThan(3_600_000);
    }
  });
});
