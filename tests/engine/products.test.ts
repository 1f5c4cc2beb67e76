import { describe, expect, it } from 'vitest';
import factors from './published/alkalinity-factors.json';
import { riverWater, waterOf } from './support';
import {
  applyDose,
  applyDoses,
  dosesOfProduct,
  oxidise,
  productFor,
  type Dose,
  type Product,
} from '@/lib/engine';

const river = waterOf(riverWater);

function alkalinityChange(dose: Dose): number {
  const dosed = applyDose(river, dose);
  if (!dosed.ok) throw new Error(dosed.message);
  return dosed.water.alkalinityMgLCaCO3 - river.alkalinityMgLCaCO3;
}

describe('polyaluminium chloride', () => {
  // Alkalinity demand 3 (1 − basicity) eq per mol Al; 2.945 mg CaCO3 per mg Al2O3 at basicity zero (computed from IUPAC
  // atomic weights in the reference's conversion factors).
  it.each([0, 0.25, 0.5, 0.7, 0.83])('of basicity %d takes its share of alkalinity', (basicity) => {
    const change = alkalinityChange({ reagent: 'polyaluminum-chloride', doseMgL: 4, basicity });
    expect(change / 4).toBeCloseTo(-2.945 * (1 - basicity), 3);
  });

  it('has a basicity of one half unless told', () => {
    const [usual, told] = [undefined, 0.5].map((basicity) =>
      alkalinityChange({ reagent: 'polyaluminum-chloride', doseMgL: 4, basicity }),
    );
    expect(usual).toBeCloseTo(told ?? NaN, 12);
  });

  it.each([
    [{ reagent: 'polyaluminum-chloride', doseMgL: 1, basicity: 1.2 }, 'basicity'],
    [{ reagent: 'aluminum-sulfate', doseMgL: 1, basicity: 0.5 }, 'basicity'],
  ] as const)('refuses %j', (dose, path) => {
    expect(applyDose(river, dose)).toMatchObject({ ok: false, path });
  });
});

describe('permanganate', () => {
  // Stoichiometry of the reference's conversion factors: 0.943 mg KMnO4 per mg Fe(II), 1.918 per mg Mn(II) (computed).
  it.each([
    ['iron', 1, 0.943],
    ['manganese', 0.5, 1.918],
  ] as const)('oxidises all %s at its factor, and not quite all below it', (what, mgL, factor) => {
    const water = waterOf({
      ...riverWater,
      analytesMgL: { ...riverWater.analytesMgL, [what]: mgL },
    });
    const component = what === 'iron' ? 'Fe2' : 'Mn';
    const left = (share: number) => {
      const step = oxidise(water, {
        oxidant: 'permanganate',
        permanganateMgL: share * factor * mgL,
      });
      if (!step.ok) throw new Error(step.message);
      return (step.water.totalsMolKg[component] ?? 0) / (water.totalsMolKg[component] ?? 1);
    };
    expect(left(1.001)).toBe(0);
    expect(left(0.9)).toBeCloseTo(0.1, 2);
  });

  it('says so when more is fed than there is to oxidise', () => {
    const step = oxidise(river, { oxidant: 'permanganate', permanganateMgL: 1 });
    expect(step.ok && step.remarks.join(' ')).toMatch(/found nothing to oxidise/);
  });
});

describe('a product', () => {
  // Commercial strengths from the reference's conversion factors (from memory): 12.5 % trade hypochlorite is 10.4 % Cl2
  // by weight at 1.2 kg/L; liquid alum 48.5 % as 14-hydrate at 1.33 kg/L.
  const hypochlorite: Product = {
    reagent: 'sodium-hypochlorite',
    strength: 0.104,
    densityKgL: 1.2,
    byProducts: [{ reagent: 'sodium-hydroxide', strength: 0.005 }],
  };

  it('is fed by mass and by volume for a dose of its reagent', () => {
    expect(productFor(hypochlorite, 2)).toEqual({
      ok: true,
      productMgL: 2 / 0.104,
      microlitresPerL: 2 / 0.104 / 1.2,
    });
  });

  it('brings what else is in it', () => {
    const given = dosesOfProduct(hypochlorite, 20);
    if (!given.ok) throw new Error(given.message);
    const dosed = applyDoses(river, given.doses);
    if (!dosed.ok) throw new Error(dosed.message);
    const change = (dosed.waters.at(-1)?.alkalinityMgLCaCO3 ?? NaN) - river.alkalinityMgLCaCO3;
    // NaOCl brings its own equivalent of alkalinity (as OCl-), 50.043 / 70.9 per mg Cl2, and the caustic 1.2512 per mg.
    expect(change).toBeCloseTo(20 * (0.104 * (50.043 / 70.9) + 0.005 * 1.2512), 3);
  });

  it('of liquid alum takes alkalinity by its active part (factor: 14-hydrate)', () => {
    const alum: Product = { reagent: 'aluminum-sulfate', strength: 0.485, hydrate: 14 };
    const given = dosesOfProduct(alum, 60);
    if (!given.ok) throw new Error(given.message);
    const [dose] = given.doses;
    const factor = factors.alkalinity_consumed_mg_CaCO3_per_mg.exact['alum.14H2O'];
    expect(dose && alkalinityChange(dose)).toBeCloseTo(-60 * 0.485 * factor, 2);
  });

  it.each([
    [{ ...hypochlorite, strength: 1.2 }, 'strength'],
    [{ ...hypochlorite, strength: 0 }, 'strength'],
    [{ ...hypochlorite, densityKgL: 13 }, 'densityKgL'],
    [
      { ...hypochlorite, byProducts: [{ reagent: 'sodium-hydroxide', strength: 0.95 }] },
      'byProducts',
    ],
    [{ ...hypochlorite, reagent: 'gold' as never }, 'reagent'],
  ] as const)('is refused when it cannot be: %j', (product, path) => {
    expect(dosesOfProduct(product as Product, 10)).toMatchObject({ ok: false, path });
  });
});
