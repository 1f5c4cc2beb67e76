import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accepted, hardWater, riverWater, softWater, waterOf } from './support';
import { anyWater } from './waters';
import {
  applyDose,
  blend,
  equilibrateWith,
  heat,
  indicesOf,
  oxidise,
  precipitate,
  precipitationPotentialAt,
  stripCarbonDioxide,
  type Water,
} from '@/lib/engine';
import { COMPONENT_KEYS } from '@/lib/engine/constants/components';
import { molarMassGMol } from '@/lib/engine/constants/notation';
import { SOLIDS, SOLIDS_BY_KEY } from '@/lib/engine/constants/table';
import { descendByTurns } from '@/lib/engine/solids/descend-by-turns';
import { findRest } from '@/lib/engine/solids/equilibrate-with';
import { totalsOf } from '@/lib/engine/speciation/state';

const CACO3_MG_PER_MOL = 100_086;
const solidKeys = SOLIDS.map((solid) => solid.key);

function expectConserved(before: Water, after: Water, formed: Readonly<Record<string, number>>) {
  const was = totalsOf(before);
  const is = totalsOf(after);
  COMPONENT_KEYS.forEach((key, component) => {
    const inSolids = Object.entries(formed).reduce(
      (sum, [solid, n]) => sum + n * (SOLIDS_BY_KEY.get(solid)?.composition[component] ?? 0),
      0,
    );
    const gap = (is[component] ?? 0) + inSolids - (was[component] ?? 0);
    const size = Math.abs(was[component] ?? 0) + Math.abs(inSolids);
    expect(Math.abs(gap), key).toBeLessThanOrEqual(1e-9 * size + 1e-25);
  });
}

describe('equilibrium with any set of solids', () => {
  it('leaves no solid negative, none absent that is oversaturated, and conserves all', () => {
    fc.assert(
      fc.property(anyWater, fc.subarray(solidKeys, { maxLength: 12 }), (analysis, solids) => {
        const before = waterOf(analysis);
        const { water: after } = accepted(equilibrateWith(before, solids));
        const formed = after.precipitatedMolKg ?? {};
        for (const key of solids) {
          const amount = formed[key] ?? 0;
          expect(amount, key).toBeGreaterThanOrEqual(0);
          const index = after.saturationIndex[key];
          if (index === undefined) continue;
          expect(index, key).toBeLessThan(1e-8);
          if (amount > 0) expect(Math.abs(index), key).toBeLessThan(1e-8);
        }
        expectConserved(before, after, formed);
      }),
      { numRuns: 150, seed: 8 },
    );
  });

  it('is found alike by the active set and by turns', () => {
    const solids = ['calcite', 'brucite', 'fluorite', 'amorphous-silica', 'strontianite'];
    const limed = accepted(
      applyDose(waterOf(hardWater), { reagent: 'calcium-hydroxide', doseMgL: 480 }),
    ).water;
    const one = findRest(limed, limed.temperatureC, solids);
    const other = descendByTurns(limed, limed.temperatureC, totalsOf(limed), solids);
    for (const key of solids) {
      const moles = one?.moles.get(key) ?? 0;
      expect(Math.abs(moles - (other?.moles.get(key) ?? 0))).toBeLessThan(1e-12);
    }
    expect(one?.moles.get('calcite')).toBeGreaterThan(1e-3);
    expect(one?.moles.get('brucite')).toBeGreaterThan(1e-4);
  });

  it('dissolves a bed that is there, no further than saturation or its end', () => {
    const water = waterOf(softWater);
    const plenty = accepted(equilibrateWith(water, ['calcite'], { calcite: 1 })).water;
    expect(plenty.saturationIndex['calcite']).toBeCloseTo(0, 8);
    const potential = accepted(precipitationPotentialAt(water, water.temperatureC)).mgLCaCO3;
    expect((plenty.precipitatedMolKg?.['calcite'] ?? 0) * CACO3_MG_PER_MOL).toBeCloseTo(
      potential,
      6,
    );
    const little = accepted(equilibrateWith(water, ['calcite'], { calcite: 1e-5 })).water;
    expect(little.precipitatedMolKg?.['calcite']).toBeCloseTo(-1e-5, 12);
    expect(little.saturationIndex['calcite']).toBeLessThan(0);
  });

  it('forms the stable of two like solids', () => {
    const { water } = accepted(
      equilibrateWith(waterOf({ ...hardWater, pH: 8.4 }), ['aragonite', 'calcite', 'vaterite']),
    );
    expect(Object.keys(water.precipitatedMolKg ?? {})).toEqual(['calcite']);
  });

  it.each([
    [['marble'], 'solids.0'],
    [['calcite', 'toString'], 'solids.1'],
    [['calcite', 5], 'solids.1'],
  ])('refuses %j', (solids, path) => {
    expect(equilibrateWith(waterOf(riverWater), solids as string[])).toMatchObject({ path });
  });

  it('refuses an amount present of something else, or no amount', () => {
    const water = waterOf(riverWater);
    expect(equilibrateWith(water, ['calcite'], { brucite: 1 })).toMatchObject({ ok: false });
    expect(equilibrateWith(water, ['calcite'], { calcite: -1 })).toMatchObject({ ok: false });
  });
});

describe('precipitation potential', () => {
  it.each([riverWater, softWater, hardWater])('is what calcite takes out or gives', (analysis) => {
    const water = waterOf(analysis);
    const potential = indicesOf(water).precipitationPotentialMgLCaCO3 ?? NaN;
    const { water: rest } = accepted(equilibrateWith(water, ['calcite'], { calcite: 1 }));
    // Standard Methods 2330: twice the calcite in alkalinity.
    expect(water.alkalinityMgLCaCO3 - rest.alkalinityMgLCaCO3).toBeCloseTo(potential, 6);
  });

  it('rises with temperature for a water given as it is', () => {
    const water = waterOf(riverWater);
    const cold = accepted(precipitationPotentialAt(water, 12)).mgLCaCO3;
    const hot = accepted(precipitationPotentialAt(water, 60)).mgLCaCO3;
    expect(hot).toBeGreaterThan(cold);
    const heated = accepted(heat(water, 60)).water;
    expect(accepted(precipitationPotentialAt(heated, 60)).mgLCaCO3).toBeCloseTo(hot, 7);
  });
});

describe('heating', () => {
  it('comes back to the same water', () => {
    fc.assert(
      fc.property(anyWater, fc.double({ min: 0, max: 90, noNaN: true }), (analysis, celsius) => {
        const water = waterOf(analysis);
        const there = accepted(heat(water, celsius)).water;
        expectConserved(water, there, {});
        const back = accepted(heat(there, water.temperatureC)).water;
        expect(Math.abs(back.pH - water.pH)).toBeLessThan(1e-7);
      }),
      { numRuns: 60, seed: 6 },
    );
  });

  it('refuses a temperature outside the model', () => {
    expect(heat(waterOf(softWater), 91)).toMatchObject({ ok: false, path: 'temperatureC' });
  });
});

describe('blending', () => {
  it('of a water with itself changes nothing', () => {
    const water = waterOf(riverWater);
    const { water: same } = accepted(
      blend([
        { water, part: 1 },
        { water, part: 3 },
      ]),
    );
    expect(same.pH).toBeCloseTo(water.pH, 9);
  });

  it('takes every total by its part and temperature by its share', () => {
    const a = waterOf(softWater);
    const b = waterOf(hardWater);
    const { water } = accepted(
      blend([
        { water: a, part: 30 },
        { water: b, part: 10 },
      ]),
    );
    expect(water.temperatureC).toBeCloseTo(0.75 * 6 + 0.25 * 11, 12);
    expect(water.alkalinityMgLCaCO3).toBeCloseTo(0.75 * 11 + 0.25 * 310, 9);
    expect(water.totalsMolKg['Ca']).toBeCloseTo(
      0.75 * (a.totalsMolKg['Ca'] ?? 0) + 0.25 * (b.totalsMolKg['Ca'] ?? 0),
      15,
    );
  });

  it('refuses no stream and a negative part', () => {
    expect(blend([])).toMatchObject({ ok: false });
    expect(blend([{ water: waterOf(softWater), part: -1 }])).toMatchObject({ path: '0.part' });
  });
});

describe('stripping', () => {
  it('reaches the pressure asked for and keeps alkalinity', () => {
    const water = waterOf(hardWater);
    const { water: aired } = accepted(stripCarbonDioxide(water, { toAtm: 4.2e-4 }));
    expect(aired.carbonDioxideAtm / 4.2e-4).toBeCloseTo(1, 9);
    expect(aired.alkalinityMgLCaCO3).toBeCloseTo(water.alkalinityMgLCaCO3, 9);
    expect(aired.pH).toBeGreaterThan(water.pH);
  });

  it('goes its share of the way, and absorbs where air holds more', () => {
    const water = waterOf(hardWater);
    const { water: half } = accepted(stripCarbonDioxide(water, { efficiency: 0.5 }));
    expect(half.carbonDioxideAtm).toBeCloseTo((water.carbonDioxideAtm + 4.2e-4) / 2, 9);
    const high = waterOf({ ...softWater, pH: 9 });
    const { water: absorbed } = accepted(stripCarbonDioxide(high, { efficiency: 1 }));
    expect(absorbed.inorganicCarbonMgLC).toBeGreaterThan(high.inorganicCarbonMgLC);
  });

  it.each([[{ efficiency: 1.2 }], [{ efficiency: NaN }], [{ toAtm: 0 }]])('refuses %j', (how) => {
    expect(stripCarbonDioxide(waterOf(softWater), how)).toMatchObject({ ok: false });
  });
});

describe('precipitating', () => {
  it('goes its share of the way and parts what settles from what is carried on', () => {
    const limed = accepted(
      applyDose(waterOf(hardWater), { reagent: 'calcium-hydroxide', doseMgL: 200 }),
    ).water;
    const how = { solids: ['calcite', 'brucite'], approach: 0.8, carryOver: 0.1 };
    const step = accepted(precipitate(limed, how));
    const whole = accepted(precipitate(limed, { solids: how.solids }));
    const formed = step.water.precipitatedMolKg?.['calcite'] ?? NaN;
    expect(formed).toBeCloseTo(0.8 * (whole.water.precipitatedMolKg?.['calcite'] ?? NaN), 12);
    expect(step.carriedOverMolKg['calcite']).toBeCloseTo(0.1 * formed, 14);
    expect(step.settledMolKg['calcite']).toBeCloseTo(0.9 * formed, 14);
    expectConserved(limed, step.water, step.water.precipitatedMolKg ?? {});
  });

  it('forms nothing in a water that dissolves', () => {
    const { water } = accepted(precipitate(waterOf(softWater), { solids: ['calcite'] }));
    expect(water.precipitatedMolKg).toBeUndefined();
  });

  it.each([
    [{ solids: ['calcite'], approach: 2 }, 'approach'],
    [{ solids: ['calcite'], carryOver: -1 }, 'carryOver'],
    [{ solids: ['chalk'] }, 'solids.0'],
  ])('refuses %j', (how, path) => {
    expect(precipitate(waterOf(softWater), how)).toMatchObject({ ok: false, path });
  });
});

describe('oxidising', () => {
  const chlorinated = (chlorineMgL: number, analytesMgL: object): Water =>
    accepted(
      applyDose(waterOf({ ...riverWater, analytesMgL }), {
        reagent: 'sodium-hypochlorite',
        doseMgL: chlorineMgL,
      }),
    ).water;
  const freeChlorine = (water: Water) => (water.totalsMolKg['HOCl'] ?? 0) * 70_900;

  // Stoichiometric factors as in the project's conversion file (computed from atomic weights).
  it.each([
    ['iron', { iron: 1 }, 0.635],
    ['manganese', { manganese: 1 }, 1.291],
    ['sulfide', { sulfide: 1 }, (8.323 * 34.076) / 32.06],
    ['ammonia', { ammonia: 1 }, 7.593],
  ] as const)('%s takes its published share of chlorine', (what, analytes, factor) => {
    const step = accepted(
      oxidise(chlorinated(10, analytes), { oxidant: 'chlorine', what: [what] }),
    );
    expect(10 - freeChlorine(step.water)).toBeCloseTo(factor, 2);
    expect(step.remarks).toEqual([]);
  });

  it('turns ammonia to monochloramine, and then away, as chlorine passes break-point', () => {
    const at = (chlorineMgL: number) =>
      accepted(oxidise(chlorinated(chlorineMgL, { ammonia: 1 }), { oxidant: 'chlorine' })).water;
    const nitrogen = 1 / 14_007;
    expect(at(3).totalsMolKg['NH2Cl']).toBeCloseTo(3 / 70_900, 10);
    expect(at(5.062).totalsMolKg['NH2Cl']).toBeCloseTo(nitrogen, 7);
    expect(at(6.3).totalsMolKg['NH2Cl']).toBeLessThan(0.6 * nitrogen);
    expect(at(7.594).totalsMolKg['NH2Cl'] ?? 0).toBeLessThan(1e-8);
    expect(freeChlorine(at(9))).toBeCloseTo(9 - 7.593, 2);
  });

  it('says when chlorine runs out', () => {
    const step = accepted(oxidise(chlorinated(0.3, { iron: 1 }), { oxidant: 'chlorine' }));
    expect(step.remarks.join(' ')).toContain('ran out');
    expect(step.water.totalsMolKg['Fe2']).toBeGreaterThan(0);
  });

  it('takes iron out with air, two equivalents of alkalinity per mole', () => {
    const water = waterOf({ ...hardWater });
    const step = accepted(oxidise(water, { oxidant: 'oxygen', what: ['iron'] }));
    const iron = 0.3 / 55_845;
    expect(step.oxygenUsedMolKg).toBeCloseTo(iron / 4, 12);
    expect(water.alkalinityMgLCaCO3 - step.water.alkalinityMgLCaCO3).toBeCloseTo(
      2 * iron * 50_043,
      6,
    );
    expect(step.water.precipitatedMolKg?.['ferrihydrite']).toBeCloseTo(iron, 12);
  });

  it('refuses another oxidant and a share above one', () => {
    const water = waterOf(riverWater);
    expect(oxidise(water, { oxidant: 'fire' as never })).toMatchObject({ path: 'oxidant' });
    expect(oxidise(water, { oxidant: 'oxygen', extent: 2 })).toMatchObject({ path: 'extent' });
  });
});

it('weighs calcite as the trade does', () => {
  expect(1000 * molarMassGMol('CaCO3')).toBeCloseTo(CACO3_MG_PER_MOL, 6);
});
