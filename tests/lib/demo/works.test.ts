import { describe, expect, it } from 'vitest';
import { DEMO_WORKS } from '@/lib/demo/works/all';
import { REAGENTS } from '@/lib/engine';
import { isSeriesKey } from '@/lib/samples/describe';
import { isIndexKey } from '@/lib/samples/indices';
import { QUANTITIES, toCanonical } from '@/lib/samples/quantities';

const works = DEMO_WORKS.map(({ definition }) => definition);
const taps = works.flatMap((each) =>
  each.points.map((point) => ({ name: `${each.name}, ${point.name}`, works: each, point })),
);

describe.each(works)('$name', ({ steps, points, dosing }) => {
  const kinds = steps.map(({ kind }) => kind);

  it('has no step twice, and places every tap and feeder at one of them', () => {
    expect(new Set(kinds).size).toBe(kinds.length);
    expect(points.filter(({ after }) => !kinds.includes(after))).toEqual([]);
    expect(dosing.filter(({ into }) => !kinds.includes(into))).toEqual([]);
  });

  it('is sampled raw, clarified, filtered, finished and in the network', () => {
    const slugs = points.map(({ slug }) => slug);
    expect(slugs).toEqual(
      expect.arrayContaining(['raw', 'clarified', 'filtered', 'finished', 'network']),
    );
    expect(new Set(slugs).size).toBe(slugs.length);
  });

  it('never puts two taps at one step', () => {
    expect(new Set(points.map(({ after }) => after)).size).toBe(points.length);
  });

  it('names each dose as the engine counts it', () => {
    for (const { reagent, doseBasis } of dosing) {
      if (reagent !== null) expect(doseBasis).toBe(REAGENTS[reagent].doseBasis);
    }
    expect(dosing.some(({ reagent }) => reagent !== null)).toBe(true);
  });

  it('lists what the engine needs wherever an index has a target', () => {
    const aimed = points.filter(({ targets }) =>
      targets.some(({ quantity }) => isIndexKey(quantity)),
    );
    expect(aimed.map(({ slug }) => slug)).toContain('finished');
    for (const { quantities } of aimed) {
      const keys = quantities.map(({ quantity }) => quantity);
      expect(keys).toEqual(expect.arrayContaining(['temperature', 'pH', 'alkalinity', 'calcium']));
    }
  });
});

describe.each(taps)('the sheet of $name', ({ point }) => {
  it('lists each quantity once, in a unit it can be written in, within what is possible', () => {
    const keys = point.quantities.map(({ quantity }) => quantity);
    expect(new Set(keys).size).toBe(keys.length);
    for (const { quantity, unit, usual, reportingLimit = usual[0] } of point.quantities) {
      const [low, high] = QUANTITIES[quantity].possible;
      for (const written of [...usual, reportingLimit]) {
        const value = toCanonical(quantity, written, unit);
        expect(value).toBeGreaterThanOrEqual(low);
        expect(value).toBeLessThanOrEqual(high);
      }
      expect(usual[0]).toBeLessThan(usual[1]);
    }
  });

  it('can write its reporting limits with its decimals', () => {
    for (const { reportingLimit, decimals } of point.quantities) {
      if (reportingLimit !== undefined) {
        expect(Number(reportingLimit.toFixed(decimals))).toBe(reportingLimit);
      }
    }
    expect(point.quantities.length).toBeGreaterThan(0);
  });

  it('aims at known quantities that it lists or the engine finds, preferred between the ends', () => {
    const keys = point.quantities.map(({ quantity }) => quantity as string);
    for (const { quantity, lowest, highest, preferred, why } of point.targets) {
      expect(isSeriesKey(quantity)).toBe(true);
      expect(isIndexKey(quantity) || keys.includes(quantity)).toBe(true);
      expect(lowest ?? highest).not.toBeNull();
      if (preferred !== null) {
        expect(preferred).toBeGreaterThanOrEqual(lowest ?? -Infinity);
        expect(preferred).toBeLessThanOrEqual(highest ?? Infinity);
      }
      expect(why).not.toBe('');
    }
    expect(new Set(point.targets.map(({ quantity }) => quantity)).size).toBe(point.targets.length);
  });
});

it('the works do not all write their values alike', () => {
  const unitsOf = (quantity: string) =>
    new Set(
      taps.flatMap(({ point }) =>
        point.quantities.filter((line) => line.quantity === quantity).map(({ unit }) => unit),
      ),
    );
  for (const quantity of ['calcium', 'iron', 'nitrate', 'uvAbsorbance']) {
    expect(unitsOf(quantity).size).toBeGreaterThan(1);
  }
});
