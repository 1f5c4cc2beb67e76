import { describe, expect, it } from 'vitest';
import { accepted, riverWater, waterOf } from './support';
import { applyDose, REAGENTS, type Dose, type ReagentKey } from '@/lib/engine';
import { atomsIn, chargeOf, molarMassGMol } from '@/lib/engine/constants/notation';
import factors from './published/alkalinity-factors.json';

const water = waterOf(riverWater);
const alkalinityPerMg = (dose: Dose): number => {
  const after = accepted(applyDose(water, dose)).water;
  return (after.alkalinityMgLCaCO3 - water.alkalinityMgLCaCO3) / dose.doseMgL;
};

const added = factors.alkalinity_added_mg_CaCO3_per_mg.exact;
const consumed = factors.alkalinity_consumed_mg_CaCO3_per_mg.exact;

const cases: readonly (readonly [string, Omit<Dose, 'doseMgL'>, number])[] = [
  ['CaO', { reagent: 'calcium-oxide' }, added.CaO],
  ['Ca(OH)2', { reagent: 'calcium-hydroxide' }, added['Ca(OH)2']],
  ['NaOH', { reagent: 'sodium-hydroxide' }, added.NaOH],
  ['Na2CO3', { reagent: 'sodium-carbonate' }, added.Na2CO3],
  ['NaHCO3', { reagent: 'sodium-bicarbonate' }, added.NaHCO3],
  ['Mg(OH)2', { reagent: 'magnesium-hydroxide' }, added['Mg(OH)2']],
  ['KOH', { reagent: 'potassium-hydroxide' }, added.KOH],
  [
    'anhydrous alum',
    { reagent: 'aluminum-sulfate', hydrate: 0 },
    -consumed['alum_anhydrous Al2(SO4)3'],
  ],
  ['alum 14', { reagent: 'aluminum-sulfate', hydrate: 14 }, -consumed['alum.14H2O']],
  ['alum 14.3', { reagent: 'aluminum-sulfate' }, -consumed['alum.14.3H2O']],
  ['alum 16', { reagent: 'aluminum-sulfate', hydrate: 16 }, -consumed['alum.16H2O']],
  ['alum 18', { reagent: 'aluminum-sulfate', hydrate: 18 }, -consumed['alum.18H2O']],
  ['FeCl3', { reagent: 'ferric-chloride' }, -consumed.FeCl3],
  ['FeCl3·6H2O', { reagent: 'ferric-chloride', hydrate: 6 }, -consumed['FeCl3.6H2O']],
  ['Fe2(SO4)3', { reagent: 'ferric-sulfate' }, -consumed['Fe2(SO4)3']],
  ['Fe2(SO4)3·9H2O', { reagent: 'ferric-sulfate', hydrate: 9 }, -consumed['Fe2(SO4)3.9H2O']],
  ['FeSO4·7H2O', { reagent: 'ferrous-sulfate' }, -consumed['FeSO4.7H2O']],
  ['H2SO4', { reagent: 'sulfuric-acid' }, -consumed.H2SO4],
  ['HCl', { reagent: 'hydrochloric-acid' }, -consumed.HCl],
  ['chlorine gas', { reagent: 'chlorine' }, -0.7058],
];

describe('alkalinity per mg of reagent', () => {
  it.each(cases)('%s moves it by the stoichiometric factor', (_, dose, factor) => {
    expect(Math.abs(alkalinityPerMg({ ...dose, doseMgL: 7 }) - factor)).toBeLessThan(1e-4);
  });

  it('covers every factor published', () => {
    expect(cases).toHaveLength(Object.keys(added).length + Object.keys(consumed).length + 1);
  });

  it.each([
    ['carbon-dioxide', 0],
    ['calcium-chloride', 0],
    ['calcium-sulfate', 0],
    ['sodium-fluoride', 0],
  ] as const)('%s leaves it alone', (reagent, factor) => {
    expect(alkalinityPerMg({ reagent, doseMgL: 11 })).toBeCloseTo(factor, 10);
  });
});

describe('the catalogue', () => {
  const all = Object.entries(REAGENTS) as [ReagentKey, (typeof REAGENTS)[ReagentKey]][];

  it.each(all)('%s feeds neutral matter of its own composition', (key, info) => {
    expect(info.key).toBe(key);
    const charge = Object.entries(info.fed).reduce((sum, [s, n]) => sum + n * chargeOf(s), 0);
    expect(charge).toBeCloseTo(0, 12);
    // Everything but hydrogen and oxygen, which water may lend, must be what the formula holds.
    const perMole = key === 'calcium-hypochlorite' ? 0.5 : 1;
    const held = atomsIn(info.formula);
    const fed = new Map<string, number>();
    for (const [species, count] of Object.entries(info.fed)) {
      for (const [element, n] of atomsIn(species) ?? []) {
        fed.set(element, (fed.get(element) ?? 0) + n * count);
      }
    }
    for (const [element, n] of held ?? []) {
      if (element === 'H' || element === 'O') continue;
      expect(fed.get(element), element).toBeCloseTo(n * perMole, 12);
    }
  });

  it.each(Object.entries(factors.molar_masses).filter(([name]) => !name.includes('_')))(
    'weighs %s like the factors file',
    (name, mass) => {
      const [, formula = '', hydrate = '0'] = /^(.*?)(?:\.([\d.]+)H2O)?$/.exec(name) ?? [];
      const waters = Number(hydrate);
      const anhydrous = formula === 'alum' ? 'Al2(SO4)3' : formula;
      expect(molarMassGMol(anhydrous) + waters * molarMassGMol('H2O')).toBeCloseTo(mass, 2);
    },
  );
});
