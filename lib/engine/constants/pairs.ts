import { at25, byEnthalpy, byExpression, type ConstantRow } from './row';

/**
 * Ion pairs of calcium, magnesium, strontium, barium and the alkalis.
 *
 * NaCO3- and NaHCO3 are left out on purpose: the pairs of the older compilations put the carbonate pH standard
 * 0.15 low at 25 °C and 0.33 low at 50 °C; the ion-size parameters below already carry that interaction.
 */
export const PAIRS: readonly ConstantRow[] = [
  byExpression(
    'CaCO3(aq)',
    'Ca++ + CO3-- = CaCO3(aq)',
    3.224,
    [-1228.732, -0.299444, 35512.75, 485.818, 0],
    'plummerBusenberg1982',
    { obtained: 'read', deltaHKJMol: 14.83, rangeC: [5, 80] },
  ),
  byExpression(
    'CaHCO3+',
    'Ca++ + HCO3- = CaHCO3+',
    1.106,
    [1209.12, 0.31294, -34765.05, -478.782, 0],
    'plummerBusenberg1982',
    { obtained: 'read', deltaHKJMol: 11.25 },
  ),
  byExpression(
    'MgCO3(aq)',
    'Mg++ + CO3-- = MgCO3(aq)',
    2.98,
    [0.991, 0.00667, 0, 0, 0],
    'nordstrom1990',
    { deltaHKJMol: 11.35 },
  ),
  byExpression(
    'MgHCO3+',
    'Mg++ + HCO3- = MgHCO3+',
    1.07,
    [-59.215, 0, 2537.455, 20.92298, 0],
    'nordstrom1990',
    { deltaHKJMol: 3.31 },
  ),
  byExpression(
    'SrCO3(aq)',
    'Sr++ + CO3-- = SrCO3(aq)',
    2.81,
    [-1.019, 0.012826, 0, 0, 0],
    'nordstrom1990',
    { deltaHKJMol: 21.84 },
  ),
  byExpression(
    'SrHCO3+',
    'Sr++ + HCO3- = SrHCO3+',
    1.185,
    [-3.248, 0.014867, 0, 0, 0],
    'busenberg1984',
  ),
  byExpression(
    'BaCO3(aq)',
    'Ba++ + CO3-- = BaCO3(aq)',
    2.71,
    [0.113, 0.008721, 0, 0, 0],
    'nordstrom1990',
    { deltaHKJMol: 14.85 },
  ),
  byExpression(
    'BaHCO3+',
    'Ba++ + HCO3- = BaHCO3+',
    0.982,
    [-3.0938, 0.013669, 0, 0, 0],
    'busenberg1986',
  ),
  at25('CaOH+', 'Ca++ + H2O = CaOH+ + H+', -12.78, 'nordstrom1990'),
  byEnthalpy('MgOH+', 'Mg++ + H2O = MgOH+ + H+', -11.44, 66.74, 'nordstrom1990'),
  byEnthalpy('CaSO4(aq)', 'Ca++ + SO4-- = CaSO4(aq)', 2.3, 6.9, 'nordstrom1990'),
  byEnthalpy('MgSO4(aq)', 'Mg++ + SO4-- = MgSO4(aq)', 2.37, 19.04, 'nordstrom1990'),
  byEnthalpy('NaSO4-', 'Na+ + SO4-- = NaSO4-', 0.7, 4.69, 'nordstrom1990'),
  byEnthalpy('KSO4-', 'K+ + SO4-- = KSO4-', 0.85, 9.41, 'nordstrom1990', {
    note: 'Enthalpy used: the expression of the same compilation implies 12.9 kJ/mol.',
  }),
  byEnthalpy('SrSO4(aq)', 'Sr++ + SO4-- = SrSO4(aq)', 2.29, 8.7, 'nordstrom1990'),
  at25('BaSO4(aq)', 'Ba++ + SO4-- = BaSO4(aq)', 2.7, 'nordstrom1990'),
  at25('NH4SO4-', 'NH4+ + SO4-- = NH4SO4-', 1.11, 'ballNordstrom1991'),
  byEnthalpy('CaF+', 'Ca++ + F- = CaF+', 0.94, 17.24, 'nordstrom1990'),
  byEnthalpy('MgF+', 'Mg++ + F- = MgF+', 1.82, 13.39, 'nordstrom1990'),
  at25('NaF(aq)', 'Na+ + F- = NaF(aq)', -0.24, 'nordstrom1990'),
  byEnthalpy('CaPO4-', 'Ca++ + PO4--- = CaPO4-', 6.459, 12.97, 'nordstrom1990'),
  byEnthalpy('CaHPO4(aq)', 'Ca++ + HPO4-- = CaHPO4(aq)', 2.739, 13.81, 'nordstrom1990'),
  byEnthalpy('CaH2PO4+', 'Ca++ + H2PO4- = CaH2PO4+', 1.408, 14.23, 'nordstrom1990'),
  byEnthalpy('MgPO4-', 'Mg++ + PO4--- = MgPO4-', 6.589, 12.97, 'nordstrom1990'),
  byEnthalpy('MgHPO4(aq)', 'Mg++ + HPO4-- = MgHPO4(aq)', 2.87, 13.81, 'nordstrom1990'),
  byEnthalpy('MgH2PO4+', 'Mg++ + H2PO4- = MgH2PO4+', 1.513, 14.23, 'nordstrom1990'),
  at25('NaHPO4-', 'Na+ + HPO4-- = NaHPO4-', 0.29, 'nordstrom1990'),
  at25('KHPO4-', 'K+ + HPO4-- = KHPO4-', 0.29, 'nordstrom1990'),
];
