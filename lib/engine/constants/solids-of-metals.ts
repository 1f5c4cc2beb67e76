import { at25, byEnthalpy, type ConstantRow } from './row';

/** Solids of iron, manganese, aluminium, lead, copper and zinc. Dissolution reactions. */
export const SOLIDS_OF_METALS: readonly ConstantRow[] = [
  byEnthalpy('siderite', 'FeCO3 = Fe++ + CO3--', -10.89, -10.38, 'nordstrom1990'),
  at25('fresh-siderite', 'FeCO3 = Fe++ + CO3--', -10.45, 'nordstrom1990'),
  at25('iron-ii-hydroxide', 'Fe(OH)2 + 2H+ = Fe++ + 2H2O', 13.0, 'stummMorgan1996'),
  at25('ferrihydrite', 'Fe(OH)3 + 3H+ = Fe+++ + 3H2O', 4.891, 'nordstrom1990', {
    note: 'Published values run from 3 to 5 with age.',
  }),
  byEnthalpy('goethite', 'FeOOH + 3H+ = Fe+++ + 2H2O', -1.0, -60.58, 'nordstrom1990'),
  at25('vivianite', 'Fe3(PO4)2.8H2O = 3Fe++ + 2PO4--- + 8H2O', -36.0, 'nordstrom1990'),
  at25('strengite', 'FePO4.2H2O = Fe+++ + PO4--- + 2H2O', -26.4, 'nordstrom1990'),
  at25('mackinawite', 'FeS + H+ = Fe++ + HS-', -4.648, 'ballNordstrom1991'),
  byEnthalpy('rhodochrosite', 'MnCO3 = Mn++ + CO3--', -11.13, -5.98, 'nordstrom1990'),
  at25('fresh-rhodochrosite', 'MnCO3 = Mn++ + CO3--', -10.39, 'nordstrom1990'),
  at25('pyrochroite', 'Mn(OH)2 + 2H+ = Mn++ + 2H2O', 15.2, 'nordstrom1990'),
  byEnthalpy('gibbsite', 'Al(OH)3 + 3H+ = Al+++ + 3H2O', 8.11, -95.4, 'nordstrom1990'),
  at25(
    'microcrystalline-aluminum-hydroxide',
    'Al(OH)3 + 3H+ = Al+++ + 3H2O',
    9.35,
    'nordstrom1990',
  ),
  byEnthalpy('aluminum-hydroxide', 'Al(OH)3 + 3H+ = Al+++ + 3H2O', 10.8, -110.88, 'nordstrom1990'),
  at25('cerussite', 'PbCO3 = Pb++ + CO3--', -13.11, 'schock', {
    note: 'Xiong 2015 gives -13.76 at 22.5 °C; the set is kept whole because its solids and complexes were fitted together.',
  }),
  at25('hydrocerussite', 'Pb3(CO3)2(OH)2 + 2H+ = 3Pb++ + 2CO3-- + 2H2O', -18.0, 'schock'),
  at25('lead-hydroxide', 'Pb(OH)2 + 2H+ = Pb++ + 2H2O', 13.06, 'schock'),
  at25('litharge', 'PbO + 2H+ = Pb++ + H2O', 12.72, 'schock'),
  at25('massicot', 'PbO + 2H+ = Pb++ + H2O', 12.89, 'schock'),
  at25('hydroxypyromorphite', 'Pb5(PO4)3OH + H+ = 5Pb++ + 3PO4--- + H2O', -62.83, 'schock'),
  at25('lead-phosphate', 'Pb3(PO4)2 = 3Pb++ + 2PO4---', -44.4, 'schock'),
  at25('anglesite', 'PbSO4 = Pb++ + SO4--', -7.79, 'schock'),
  at25('copper-hydroxide', 'Cu(OH)2 + 2H+ = Cu++ + 2H2O', 8.89, 'epaCopper1995'),
  at25('tenorite', 'CuO + 2H+ = Cu++ + H2O', 7.66, 'epaCopper1995'),
  at25('malachite', 'Cu2(OH)2CO3 = 2Cu++ + 2OH- + CO3--', -33.8, 'epaCopper1995'),
  at25('azurite', 'Cu3(OH)2(CO3)2 = 3Cu++ + 2OH- + 2CO3--', -45.96, 'epaCopper1995'),
  at25('cuprite', 'Cu2O + 2H+ = 2Cu+ + H2O', -1.55, 'ballNordstrom1991', {
    note: 'Copper(I); recalled with low confidence. Agrees with E° 0.471 V of Cu2O/Cu and 0.521 V of Cu+/Cu within 0.15.',
  }),
  at25('zinc-hydroxide', 'Zn(OH)2 + 2H+ = Zn++ + 2H2O', 12.45, 'ballNordstrom1991', {
    note: 'Amorphous.',
  }),
  byEnthalpy('smithsonite', 'ZnCO3 = Zn++ + CO3--', -10.0, -18.24, 'ballNordstrom1991'),
  at25('hydrozincite', 'Zn5(OH)6(CO3)2 + 6H+ = 5Zn++ + 2CO3-- + 6H2O', 9.15, 'smithMartell', {
    note: 'Recalled with low confidence.',
  }),
  at25('zinc-phosphate', 'Zn3(PO4)2.4H2O = 3Zn++ + 2PO4--- + 4H2O', -32.04, 'ballNordstrom1991'),
];
