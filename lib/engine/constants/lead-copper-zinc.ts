import { at25, byEnthalpy, type ConstantRow } from './row';

const LEAD: readonly ConstantRow[] = [
  at25('PbOH+', 'Pb++ + H2O = PbOH+ + H+', -7.22, 'schock'),
  at25('Pb(OH)2(aq)', 'Pb++ + 2H2O = Pb(OH)2(aq) + 2H+', -16.91, 'schock'),
  at25('Pb(OH)3-', 'Pb++ + 3H2O = Pb(OH)3- + 3H+', -28.08, 'schock'),
  at25('Pb(OH)4--', 'Pb++ + 4H2O = Pb(OH)4-- + 4H+', -39.72, 'schock'),
  at25('Pb2OH+++', '2Pb++ + H2O = Pb2OH+++ + H+', -6.36, 'schock'),
  at25('Pb3(OH)4++', '3Pb++ + 4H2O = Pb3(OH)4++ + 4H+', -23.86, 'schock'),
  at25('Pb4(OH)4++++', '4Pb++ + 4H2O = Pb4(OH)4++++ + 4H+', -20.88, 'schock'),
  at25('Pb6(OH)8++++', '6Pb++ + 8H2O = Pb6(OH)8++++ + 8H+', -43.62, 'schock'),
  at25('PbCO3(aq)', 'Pb++ + CO3-- = PbCO3(aq)', 7.1, 'schock'),
  at25('Pb(CO3)2--', 'Pb++ + 2CO3-- = Pb(CO3)2--', 10.33, 'schock'),
  at25('PbHCO3+', 'Pb++ + H+ + CO3-- = PbHCO3+', 12.59, 'schock'),
  at25('PbSO4(aq)', 'Pb++ + SO4-- = PbSO4(aq)', 2.73, 'schock'),
  at25('Pb(SO4)2--', 'Pb++ + 2SO4-- = Pb(SO4)2--', 3.5, 'schock'),
  at25('PbCl+', 'Pb++ + Cl- = PbCl+', 1.59, 'schock'),
  at25('PbCl2(aq)', 'Pb++ + 2Cl- = PbCl2(aq)', 1.8, 'schock'),
  at25('PbCl3-', 'Pb++ + 3Cl- = PbCl3-', 1.71, 'schock'),
  at25('PbF+', 'Pb++ + F- = PbF+', 1.25, 'ballNordstrom1991'),
  at25('PbHPO4(aq)', 'Pb++ + H+ + PO4--- = PbHPO4(aq)', 15.41, 'schock'),
  at25('PbH2PO4+', 'Pb++ + 2H+ + PO4--- = PbH2PO4+', 21.05, 'schock'),
];

const COPPER: readonly ConstantRow[] = [
  at25('CuOH+', 'Cu++ + H2O = CuOH+ + H+', -7.96, 'epaCopper1995'),
  at25('Cu(OH)2(aq)', 'Cu++ + 2H2O = Cu(OH)2(aq) + 2H+', -16.24, 'epaCopper1995'),
  at25('Cu(OH)3-', 'Cu++ + 3H2O = Cu(OH)3- + 3H+', -26.7, 'epaCopper1995'),
  at25('Cu(OH)4--', 'Cu++ + 4H2O = Cu(OH)4-- + 4H+', -39.6, 'epaCopper1995'),
  at25('Cu2(OH)2++', '2Cu++ + 2H2O = Cu2(OH)2++ + 2H+', -10.36, 'epaCopper1995'),
  at25('CuCO3(aq)', 'Cu++ + CO3-- = CuCO3(aq)', 6.77, 'epaCopper1995'),
  at25('Cu(CO3)2--', 'Cu++ + 2CO3-- = Cu(CO3)2--', 10.2, 'epaCopper1995'),
  at25('CuHCO3+', 'Cu++ + H+ + CO3-- = CuHCO3+', 12.13, 'epaCopper1995'),
  at25('CuSO4(aq)', 'Cu++ + SO4-- = CuSO4(aq)', 2.36, 'epaCopper1995'),
  at25('CuCl+', 'Cu++ + Cl- = CuCl+', 0.43, 'ballNordstrom1991'),
  at25('CuF+', 'Cu++ + F- = CuF+', 1.26, 'ballNordstrom1991'),
  at25('CuNH3++', 'Cu++ + NH3 = CuNH3++', 4.04, 'smithMartell'),
  at25('Cu(NH3)2++', 'Cu++ + 2NH3 = Cu(NH3)2++', 7.47, 'smithMartell'),
  at25('CuHPO4(aq)', 'Cu++ + HPO4-- = CuHPO4(aq)', 3.3, 'epaCopper1995', {
    note: 'Recalled with low confidence.',
  }),
  at25('CuCl2-', 'Cu+ + 2Cl- = CuCl2-', 5.5, 'ballNordstrom1991'),
  at25('CuCl3--', 'Cu+ + 3Cl- = CuCl3--', 5.7, 'ballNordstrom1991'),
  at25('Cu(NH3)2+', 'Cu+ + 2NH3 = Cu(NH3)2+', 10.8, 'smithMartell'),
];

const ZINC: readonly ConstantRow[] = [
  byEnthalpy('ZnOH+', 'Zn++ + H2O = ZnOH+ + H+', -8.96, 56.07, 'ballNordstrom1991'),
  at25('Zn(OH)2(aq)', 'Zn++ + 2H2O = Zn(OH)2(aq) + 2H+', -16.9, 'ballNordstrom1991'),
  at25('Zn(OH)3-', 'Zn++ + 3H2O = Zn(OH)3- + 3H+', -28.4, 'ballNordstrom1991'),
  at25('Zn(OH)4--', 'Zn++ + 4H2O = Zn(OH)4-- + 4H+', -41.2, 'ballNordstrom1991'),
  at25('ZnHCO3+', 'Zn++ + HCO3- = ZnHCO3+', 2.1, 'ballNordstrom1991'),
  at25('ZnCO3(aq)', 'Zn++ + CO3-- = ZnCO3(aq)', 5.3, 'ballNordstrom1991'),
  at25('Zn(CO3)2--', 'Zn++ + 2CO3-- = Zn(CO3)2--', 9.63, 'ballNordstrom1991'),
  byEnthalpy('ZnSO4(aq)', 'Zn++ + SO4-- = ZnSO4(aq)', 2.37, 5.69, 'ballNordstrom1991'),
  at25('Zn(SO4)2--', 'Zn++ + 2SO4-- = Zn(SO4)2--', 3.28, 'ballNordstrom1991'),
  byEnthalpy('ZnCl+', 'Zn++ + Cl- = ZnCl+', 0.43, 32.59, 'ballNordstrom1991'),
  byEnthalpy('ZnF+', 'Zn++ + F- = ZnF+', 1.15, 9.29, 'ballNordstrom1991'),
  at25('ZnHPO4(aq)', 'Zn++ + HPO4-- = ZnHPO4(aq)', 3.3, 'smithMartell', {
    note: 'Recalled with low confidence.',
  }),
];

/** Complexes of lead, copper(II) and (I), and zinc. */
export const LEAD_COPPER_ZINC: readonly ConstantRow[] = [...LEAD, ...COPPER, ...ZINC];
