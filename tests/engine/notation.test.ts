import { describe, expect, it } from 'vitest';
import { formatSpecies } from '@/lib/engine';
import {
  atomsIn,
  chargeOf,
  formatReaction,
  molarMassGMol,
  parseReaction,
} from '@/lib/engine/constants/notation';

describe('a species as printed', () => {
  it.each([
    ['HCO3-', 'HCO₃⁻'],
    ['CO3--', 'CO₃²⁻'],
    ['Ca++', 'Ca²⁺'],
    ['H+', 'H⁺'],
    ['H4SiO4', 'H₄SiO₄'],
    ['Fe2(OH)2++++', 'Fe₂(OH)₂⁴⁺'],
    ['CaCO3(aq)', 'CaCO₃(aq)'],
    ['Pb6(OH)8++++', 'Pb₆(OH)₈⁴⁺'],
    ['CaSO4.2H2O', 'CaSO₄·2H₂O'],
    ['calcite', 'calcite'],
    ['alkalinity', 'alkalinity'],
  ])('%s is %s', (key, printed) => {
    expect(formatSpecies(key)).toBe(printed);
  });
});

it('prints a reaction with a double arrow', () => {
  expect(formatReaction('Mg(OH)2 + 2H+ = Mg++ + 2H2O')).toBe('Mg(OH)₂ + 2 H⁺ ⇌ Mg²⁺ + 2 H₂O');
});

it('reads coefficients with their sign', () => {
  expect([...parseReaction('2Fe+++ + 2H2O = Fe2(OH)2++++ + 2H+')]).toEqual([
    ['Fe+++', -2],
    ['H2O', -2],
    ['Fe2(OH)2++++', 1],
    ['H+', 2],
  ]);
  expect(() => parseReaction('H2O')).toThrow();
});

it('reads charge and atoms', () => {
  expect(chargeOf('PO4---')).toBe(-3);
  expect(chargeOf('NH4+')).toBe(1);
  expect(Object.fromEntries(atomsIn('Zn5(OH)6(CO3)2') ?? [])).toEqual({ Zn: 5, O: 12, H: 6, C: 2 });
  expect(atomsIn('Xx2')).toBeNull();
  expect(molarMassGMol('CaSO4.2H2O')).toBeCloseTo(172.164, 2);
});
