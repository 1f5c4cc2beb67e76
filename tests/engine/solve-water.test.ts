import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accepted, hardWater, riverWater, softWater, waterOf } from './support';
import { anyWater, CARBONATE_PAIRS } from './waters';
import { solveWater, type Water, type WaterAnalysis } from '@/lib/engine';
import { COMPONENT_KEYS, COMPONENTS } from '@/lib/engine/constants/components';
import { SPECIES, SPECIES_BY_KEY } from '@/lib/engine/constants/table';
import { constantsAt } from '@/lib/engine/speciation/equilibrium-constants';
import { solveConditions, CLOSED } from '@/lib/engine/speciation/solve';
import { totalsOf } from '@/lib/engine/speciation/state';

const byPair = (water: Water, analysis: WaterAnalysis, [a, b]: (typeof CARBONATE_PAIRS)[number]) =>
  waterOf({
    temperatureC: analysis.temperatureC,
    analytesMgL: analysis.analytesMgL,
    [a]: water[a],
    [b]: water[b],
  });

describe('any two of pH, alkalinity, inorganic carbon and CO2 pressure', () => {
  const cases = [riverWater, softWater, hardWater].flatMap((analysis) =>
    CARBONATE_PAIRS.map((pair) => ({ analysis, pair, name: `${pair[0]} and ${pair[1]}` })),
  );
  it.each(cases)('$name give back the same water', ({ analysis, pair }) => {
    const water = waterOf(analysis);
    const again = byPair(water, analysis, pair);
    expect(again.pH).toBeCloseTo(water.pH, 9);
    expect(again.alkalinityMgLCaCO3).toBeCloseTo(water.alkalinityMgLCaCO3, 7);
    expect(again.inorganicCarbonMgLC).toBeCloseTo(water.inorganicCarbonMgLC, 8);
    expect(again.carbonDioxideAtm / water.carbonDioxideAtm).toBeCloseTo(1, 8);
  });

  it('hold for waters of every kind', () => {
    fc.assert(
      fc.property(anyWater, fc.constantFrom(...CARBONATE_PAIRS), (analysis, pair) => {
        const water = waterOf(analysis);
        // CO2 pressure and total carbon fix pH only where some of the carbon is ionised.
        fc.pre(!(pair[0] === 'inorganicCarbonMgLC') || water.pH > 5);
        const again = byPair(water, analysis, pair);
        expect(Math.abs(again.pH - water.pH)).toBeLessThan(1e-6);
      }),
      { numRuns: 300, seed: 11 },
    );
  });
});

describe('a solved water', () => {
  it('meets every mass balance, charge and mass-action law', () => {
    fc.assert(
      fc.property(anyWater, (analysis) => {
        const water = waterOf(analysis);
        const constants = constantsAt(water.temperatureC);
        COMPONENT_KEYS.forEach((key, component) => {
          const total = water.totalsMolKg[key];
          if (total === undefined) return;
          const sum = Object.entries(water.speciesMolKg).reduce(
            (s, [species, m]) => s + m * (SPECIES_BY_KEY.get(species)?.composition[component] ?? 0),
            0,
          );
          expect(Math.abs(sum / total - 1)).toBeLessThan(1e-10);
        });
        const net = SPECIES.reduce((s, e) => s + e.charge * (water.speciesMolKg[e.key] ?? 0), 0);
        const size = SPECIES.reduce(
          (s, e) => s + Math.abs(e.charge) * (water.speciesMolKg[e.key] ?? 0),
          0,
        );
        expect(Math.abs(net - (water.totalsMolKg['charge'] ?? NaN))).toBeLessThan(1e-10 * size);
        for (const entry of SPECIES) {
          const activity = water.activities[entry.key];
          if (activity === undefined || !(activity > 1e-250)) continue;
          let expected = constants.species.get(entry.key) ?? NaN;
          entry.composition.forEach((n, component) => {
            const key = COMPONENT_KEYS[component] ?? 'H';
            if (n !== 0) expected += n * Math.log10(water.activities[COMPONENTS[key]] ?? NaN);
          });
          expect(Math.abs(Math.log10(activity) - expected)).toBeLessThan(1e-9);
        }
      }),
      { numRuns: 150, seed: 5 },
    );
  });

  it('is the same from five starting points', () => {
    fc.assert(
      fc.property(anyWater, (analysis) => {
        const water = waterOf(analysis);
        const totals = totalsOf(water);
        for (const pH of [5, 6.5, 8, 9.5, 11]) {
          const held = solveConditions({
            temperatureC: water.temperatureC,
            totals,
            problem: { hydrogenRow: 'held', carbonRow: 'carbon' },
            lnHydrogen: -pH * Math.LN10,
          });
          expect(held.ending.converged).toBe(true);
          const start = {
            lnActivity: new Float64Array(COMPONENT_KEYS.length).fill(NaN),
            ionicStrengthMolKg: held.workspace.unknowns[held.workspace.totals.length] ?? NaN,
          };
          held.workspace.system.components.forEach((component, column) => {
            start.lnActivity[component] = held.workspace.unknowns[column] ?? NaN;
          });
          const { temperatureC } = water;
          const again = solveConditions({ temperatureC, totals, problem: CLOSED, start });
          if (!again.ending.converged) continue;
          const found = -(again.workspace.unknowns[0] ?? NaN) / Math.LN10;
          expect(Math.abs(found - water.pH)).toBeLessThan(1e-6);
        }
      }),
      { numRuns: 60, seed: 3 },
    );
  });

  it('names what was not analysed', () => {
    const [first] = waterOf(softWater).assumptions;
    expect(first).toContain('silica');
    expect(first).not.toContain('calcium');
  });

  it('says when ionic strength leaves the range of the activity model', () => {
    const brine = waterOf({ ...softWater, analytesMgL: { sodium: 15_000, chloride: 23_000 } });
    expect(brine.assumptions.join(' ')).toContain('activity model');
  });

  it('states its steps and its residual', () => {
    const { evidence } = waterOf(riverWater);
    expect(evidence.iterations).toBeLessThanOrEqual(10);
    expect(evidence.residual).toBeLessThanOrEqual(1e-10);
  });

  it('gives pure water the pH of its ion product', () => {
    const pure = accepted(
      solveWater({
        temperatureC: 25,
        alkalinityMgLCaCO3: 0,
        inorganicCarbonMgLC: 0,
        analytesMgL: {},
      }),
    ).water;
    expect(pure.pH).toBeCloseTo(7.0, 2);
  });
});
