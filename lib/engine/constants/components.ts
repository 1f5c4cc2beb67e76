/**
 * The components: conserved totals and, for each, the species its activity stands for.
 *
 * The basis species are those that count zero in the alkalinity titration (CO2, H2PO4-, H4SiO4, B(OH)3, NH4+, H2S …).
 * The total of H+ over this basis is therefore exactly minus the alkalinity, whatever complexes are present.
 */
export const COMPONENTS = {
  H: 'H+',
  CO3: 'CO2',
  Ca: 'Ca++',
  Mg: 'Mg++',
  Na: 'Na+',
  K: 'K+',
  Cl: 'Cl-',
  SO4: 'SO4--',
  NO3: 'NO3-',
  F: 'F-',
  NH4: 'NH4+',
  PO4: 'H2PO4-',
  Si: 'H4SiO4',
  B: 'B(OH)3',
  S: 'H2S',
  Fe2: 'Fe++',
  Fe3: 'Fe+++',
  Mn: 'Mn++',
  Al: 'Al+++',
  Cu2: 'Cu++',
  Cu1: 'Cu+',
  Pb: 'Pb++',
  Zn: 'Zn++',
  Ba: 'Ba++',
  Sr: 'Sr++',
  HOCl: 'HOCl',
  SO3: 'HSO3-',
  NH2Cl: 'NH2Cl',
} as const;

export type Component = keyof typeof COMPONENTS;

export const COMPONENT_KEYS = Object.keys(COMPONENTS) as readonly Component[];

/** Column of hydrogen and of inorganic carbon in every composition vector. */
export const HYDROGEN = 0;
export const CARBON = 1;

export const isComponent = (key: string): key is Component => key in COMPONENTS;

/** A total below this holds less than one molecule in a million litres and counts as absent, mol/kg. */
export const LEAST_TOTAL_MOL_KG = 1e-30;
