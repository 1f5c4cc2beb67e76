import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { riverWater, softWater, waterOf } from './support';
import { anyWater } from './waters';
import {
  accountForStep,
  applyDose,
  blend,
  heat,
  oxidise,
  precipitate,
  stripCarbonDioxide,
  type Ledger,
  type StepTaken,
  type Water,
} from '@/lib/engine';

/** The account of a step, or the sentence that refused it. */
function accountOf(step: StepTaken, after: Water): Ledger {
  const account = accountForStep(step, after);
  if (!account.ok) throw new Error(account.message);
  return account.ledger;
}

function expectClosed(ledger: Ledger, after: Water): void {
  for (const { key, before, change, equilibrium } of ledger.species) {
    const size = Math.abs(before) + Math.abs(change);
    expect(Math.abs(before + change - equilibrium), key).toBeLessThanOrEqual(1e-15 * size);
    const solved = after.speciesMolKg[key];
    if (solved === undefined) continue;
    // A femtomole: of H+ in an alkaline water far more passes through the account than remains.
    expect(Math.abs(equilibrium - solved), key).toBeLessThanOrEqual(1e-8 * size + 1e-15);
  }
  for (const { key, logK, logQuotient, complete } of ledger.reactions) {
    if (complete !== true) expect(logQuotient, key).toBeCloseTo(logK, 8);
  }
  // Change is the sum of coefficient × extent, for every species.
  const sums = new Map<string, number>();
  for (const { coefficients, extentMolKg } of ledger.reactions) {
    for (const [key, c] of Object.entries(coefficients)) {
      sums.set(key, (sums.get(key) ?? 0) + c * extentMolKg);
    }
  }
  for (const { key, before, change } of ledger.species) {
    expect(Math.abs((sums.get(key) ?? 0) - change), key).toBeLessThanOrEqual(
      1e-12 * (Math.abs(before) + Math.abs(change)) + 1e-15,
    );
  }
}

const solved = (answer: { ok: boolean; water?: Water; message?: string }): Water => {
  if (answer.water === undefined) throw new Error(answer.message);
  return answer.water;
};

describe('the account of a step closes', () => {
  const river = waterOf(riverWater);
  const soft = waterOf(softWater);

  it('when water is heated: only equilibria move', () => {
    const after = solved(heat(river, 35));
    const ledger = accountOf({ kind: 'heat', before: river }, after);
    expectClosed(ledger, after);
    expect(ledger.reactions.every(({ complete }) => complete !== true)).toBe(true);
  });

  it('when waters are blended', () => {
    const streams = [
      { water: river, part: 3 },
      { water: soft, part: 1 },
    ];
    const after = solved(blend(streams));
    expectClosed(accountOf({ kind: 'blend', streams }, after), after);
  });

  it('when carbon dioxide is stripped: what left stands as one reaction', () => {
    const after = solved(stripCarbonDioxide(river, { efficiency: 0.8 }));
    const ledger = accountOf({ kind: 'strip', before: river }, after);
    expectClosed(ledger, after);
    const left = ledger.reactions.find(({ key }) => key === 'CO2(g)');
    expect(left?.extentMolKg).toBeLessThan(0);
  });

  it('when calcite and brucite form in softening', () => {
    const limed = solved(applyDose(river, { reagent: 'calcium-hydroxide', doseMgL: 150 }));
    const after = solved(precipitate(limed, { solids: ['calcite', 'brucite'], approach: 0.9 }));
    const ledger = accountOf({ kind: 'precipitate', before: limed }, after);
    expectClosed(ledger, after);
    expect(ledger.reactions.find(({ key }) => key === 'calcite')?.extentMolKg).toBeGreaterThan(0);
  });

  it('when chlorine oxidises iron and ammonia', () => {
    const ferrous = waterOf({
      ...riverWater,
      analytesMgL: { ...riverWater.analytesMgL, iron: 0.8, ammonia: 0.3 },
    });
    const dosed = solved(applyDose(ferrous, { reagent: 'chlorine', doseMgL: 4 }));
    const oxidised = oxidise(dosed, { oxidant: 'chlorine' });
    if (!oxidised.ok) throw new Error(oxidised.message);
    const step = { kind: 'oxidise', before: dosed, reactions: oxidised.reactions } as const;
    expectClosed(accountOf(step, oxidised.water), oxidised.water);
  });

  it.each([
    ['oxygen', {}],
    ['permanganate', { permanganateMgL: 2 }],
  ] as const)('when %s oxidises iron and manganese: nothing ends below zero', (oxidant, fed) => {
    const before = waterOf({
      ...riverWater,
      analytesMgL: { ...riverWater.analytesMgL, iron: 0.8, manganese: 0.2 },
    });
    const oxidised = oxidise(before, { oxidant, ...fed });
    if (!oxidised.ok) throw new Error(oxidised.message);
    const ledger = accountOf(
      { kind: 'oxidise', before, reactions: oxidised.reactions },
      oxidised.water,
    );
    expectClosed(ledger, oxidised.water);
    for (const { key, equilibrium } of ledger.species) {
      expect(equilibrium, key).toBeGreaterThanOrEqual(-1e-15);
    }
    expect(oxidised.water.totalsMolKg['Fe2'] ?? 0).toBe(0);
    expect(oxidised.water.totalsMolKg['Mn'] ?? 0).toBe(0);
    expect(
      Math.abs((oxidised.water.totalsMolKg['charge'] ?? 0) - (before.totalsMolKg['charge'] ?? 0)),
    ).toBeLessThan(1e-12);
  });

  it('for any water that is heated and aired', () => {
    fc.assert(
      fc.property(anyWater, fc.double({ min: 1, max: 40, noNaN: true }), (analysis, celsius) => {
        const before = waterOf(analysis);
        const warm = solved(heat(before, celsius));
        expectClosed(accountOf({ kind: 'heat', before }, warm), warm);
        if (!((warm.totalsMolKg['CO3'] ?? 0) > 0)) return;
        const aired = stripCarbonDioxide(warm, { efficiency: 0.5 });
        if (aired.ok)
          expectClosed(accountOf({ kind: 'strip', before: warm }, aired.water), aired.water);
      }),
      { numRuns: 60, seed: 5 },
    );
  });

  it('and is refused when the water after is not what the step makes', () => {
    const account = accountForStep({ kind: 'heat', before: river }, soft);
    expect(account.ok).toBe(false);
  });
});
