import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accepted, hardWater, riverWater, softWater, waterOf } from './support';
import { anyDose, anyWater } from './waters';
import { accountFor, applyDose, applyDoses, type Dose, type Water } from '@/lib/engine';
import { doseMolarMass, feed } from '@/lib/engine/steps/dose';
import { REAGENTS } from '@/lib/engine';
import { COMPONENT_KEYS } from '@/lib/engine/constants/components';
import { chargeOf, parseReaction } from '@/lib/engine/constants/notation';
import { SOLIDS_BY_KEY, SPECIES_BY_KEY } from '@/lib/engine/constants/table';
import { CACO3_MG_PER_EQ } from '@/lib/engine/constants/carbonate-equivalents';

/** Moles of each component and of charge fed by a chain of doses, less what left as hydroxide. */
function bookkeeping(start: Water, doses: readonly Dose[]): Map<string, number> {
  const book = new Map<string, number>(Object.entries(start.totalsMolKg));
  const add = (key: string, n: number) => book.set(key, (book.get(key) ?? 0) + n);
  for (const dose of doses) {
    const info = REAGENTS[dose.reagent];
    const moles = dose.doseMgL / (1000 * doseMolarMass(dose));
    for (const [species, n] of Object.entries(info.fed)) {
      SPECIES_BY_KEY.get(species)?.composition.forEach((count, c) => {
        if (c > 0) add(COMPONENT_KEYS[c] ?? '', n * moles * count);
      });
      add('charge', n * moles * chargeOf(species));
    }
    if (info.precipitates) {
      const { solid, molPerMol } = info.precipitates;
      SOLIDS_BY_KEY.get(solid)?.composition.forEach((count, c) => {
        if (c > 0) add(COMPONENT_KEYS[c] ?? '', -molPerMol * moles * count);
      });
    }
    // Chlorine and sulfite destroy each other.
    const gone = Math.min(book.get('HOCl') ?? 0, book.get('SO3') ?? 0);
    if (gone > 0) {
      add('HOCl', -gone);
      add('SO3', -gone);
      add('Cl', gone);
      add('SO4', gone);
    }
  }
  return book;
}

describe('a chain of doses', () => {
  it('conserves every component and charge to 1e-9', () => {
    fc.assert(
      fc.property(
        anyWater,
        fc.array(anyDose, { minLength: 1, maxLength: 6 }),
        (analysis, doses) => {
          const water = waterOf(analysis);
          const { waters } = accepted(applyDoses(water, doses));
          const last = waters.at(-1) ?? water;
          const book = bookkeeping(water, doses);
          const size = Math.max(...[...book.values()].map(Math.abs));
          for (const [key, expected] of book) {
            const found = last.totalsMolKg[key] ?? 0;
            const scale = key === 'charge' ? size : Math.max(Math.abs(expected), 1e-6 * size);
            expect(Math.abs(found - expected) / scale, key).toBeLessThan(1e-9);
          }
          const net = Object.entries(last.speciesMolKg).reduce(
            (sum, [key, m]) => sum + chargeOf(key) * m,
            0,
          );
          expect(Math.abs(net - (book.get('charge') ?? NaN))).toBeLessThan(1e-9 * size);
        },
      ),
      { numRuns: 150, seed: 17 },
    );
  });

  it('ends at the same water in two half doses as in one', () => {
    const water = waterOf(riverWater);
    const whole = accepted(applyDose(water, { reagent: 'calcium-hydroxide', doseMgL: 20 })).water;
    const half = { reagent: 'calcium-hydroxide', doseMgL: 10 } as const;
    const { waters } = accepted(applyDoses(water, [half, half]));
    expect(waters.at(-1)?.pH).toBeCloseTo(whole.pH, 10);
  });

  it('destroys chlorine with bisulfite mole for mole and leaves the rest', () => {
    const water = waterOf(riverWater);
    const { waters } = accepted(
      applyDoses(water, [
        { reagent: 'chlorine', doseMgL: 7.09 },
        { reagent: 'sodium-bisulfite', doseMgL: 5.2 },
      ]),
    );
    const last = waters.at(-1);
    expect(last?.totalsMolKg['HOCl']).toBeCloseTo(1e-4 - 5.2 / 104_056, 8);
    expect(last?.totalsMolKg['SO3']).toBeUndefined();
  });

  it('takes the coagulant metal out as its hydroxide and says so', () => {
    const water = waterOf(riverWater);
    const { water: after } = accepted(
      applyDose(water, { reagent: 'ferric-chloride', doseMgL: 16.2195 }),
    );
    expect(after.precipitatedMolKg?.['ferrihydrite']).toBeCloseTo(1e-4, 12);
    expect(after.totalsMolKg['Fe3']).toBeUndefined();
  });
});

describe('the ledger of a dose', () => {
  const cases = [riverWater, softWater, hardWater].flatMap((analysis) =>
    (Object.keys(REAGENTS) as Dose['reagent'][]).map((reagent) => ({ analysis, reagent })),
  );

  it.each(cases)('$reagent: before + change = equilibrium, for every species', (row) => {
    const before = waterOf(row.analysis);
    const dose = { reagent: row.reagent, doseMgL: 9 };
    const { water: after } = accepted(applyDose(before, dose));
    const { ledger } = accepted(accountFor(before, after, dose));
    const largest = Math.max(...ledger.species.map((s) => s.equilibrium));
    for (const species of ledger.species) {
      const gap = species.before + species.change - species.equilibrium;
      expect(Math.abs(gap)).toBeLessThanOrEqual(1e-15 * largest);
      const solved = after.speciesMolKg[species.key];
      if (solved === undefined) continue;
      expect(Math.abs(species.equilibrium - solved)).toBeLessThan(1e-13 * largest);
    }
    const changes = new Map<string, number>();
    for (const { coefficients, extentMolKg } of ledger.reactions) {
      for (const [key, c] of Object.entries(coefficients)) {
        changes.set(key, (changes.get(key) ?? 0) + c * extentMolKg);
      }
    }
    for (const species of ledger.species) {
      const sum = changes.get(species.key) ?? 0;
      expect(Math.abs(species.change - sum), species.key).toBeLessThanOrEqual(1e-15 * largest);
    }
    for (const reaction of ledger.reactions) {
      if (reaction.complete) continue;
      expect(Math.abs(reaction.logQuotient - reaction.logK), reaction.key).toBeLessThan(1e-9);
    }
  });

  it('reads each equation with the coefficients it balances with', () => {
    const before = waterOf(hardWater);
    const dose = { reagent: 'calcium-hydroxide', doseMgL: 30 } as const;
    const { water: after } = accepted(applyDose(before, dose));
    const { ledger } = accepted(accountFor(before, after, dose));
    const first = ledger.reactions.find((reaction) => reaction.key === 'HCO3-');
    expect(first?.equation).toBe('CO₂ + H₂O ⇌ H⁺ + HCO₃⁻');
    expect(first?.coefficients).toEqual({ CO2: -1, 'H+': 1, 'HCO3-': 1 });
    expect(parseReaction('CO2 + H2O = H+ + HCO3-').get('H2O')).toBe(-1);
  });

  it('starts from what the dose brought in as fed', () => {
    const before = waterOf(softWater);
    const dose = { reagent: 'calcium-hydroxide', doseMgL: 7.4092 } as const;
    const { water: after } = accepted(applyDose(before, dose));
    const { ledger } = accepted(accountFor(before, after, dose));
    const hydroxide = ledger.species.find((row) => row.key === 'OH-');
    expect(hydroxide?.before).toBeCloseTo((before.speciesMolKg['OH-'] ?? 0) + 2e-4, 9);
    const alkalinity = -(feed(before, dose).totals[0] ?? 0) * CACO3_MG_PER_EQ;
    expect(alkalinity).toBeCloseTo(after.alkalinityMgLCaCO3, 9);
  });

  it('is refused when the waters do not belong to the dose', () => {
    const before = waterOf(softWater);
    const { water: after } = accepted(
      applyDose(before, { reagent: 'calcium-hydroxide', doseMgL: 7 }),
    );
    const other = accountFor(before, after, { reagent: 'calcium-hydroxide', doseMgL: 8 });
    expect(other).toMatchObject({ ok: false, reason: 'notConverged' });
  });
});
