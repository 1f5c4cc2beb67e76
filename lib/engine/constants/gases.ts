import { byExpression, type ConstantRow } from './row';

/** Solubility of gases, mol kg⁻¹ atm⁻¹. Fugacity is taken as pressure. */
export const GASES: readonly ConstantRow[] = [
  byExpression(
    'CO2(g)',
    'CO2(g) = CO2',
    -1.468,
    [108.3865, 0.01985076, -6919.53, -40.45154, 669365.0],
    'plummerBusenberg1982',
    { obtained: 'read', deltaHKJMol: -19.98 },
  ),
];
