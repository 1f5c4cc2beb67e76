import { molarMassGMol } from '../constants/notation';
import type { ReagentKey } from '../types';

export interface ReagentInfo {
  readonly key: ReagentKey;
  /** Plain words: `hydrated lime`. */
  readonly name: string;
  readonly formula: string;
  readonly molarMassGMol: number;
  /** What a mg/L of dose is a milligram of: `as Ca(OH)2`. */
  readonly doseBasis: string;
  /** Species the compound brings into the water, mol per mol; water of hydration left out. */
  readonly fed: Readonly<Record<string, number>>;
  /** The hydroxide its metal forms, and moles of it per mole of compound. */
  readonly precipitates?: { readonly solid: string; readonly molPerMol: number };
  readonly note?: string;
}

type More = Partial<Pick<ReagentInfo, 'precipitates' | 'note' | 'molarMassGMol' | 'doseBasis'>>;

const reagent = (
  key: ReagentKey,
  name: string,
  formula: string,
  fed: Readonly<Record<string, number>>,
  more: More = {},
): ReagentInfo => ({
  key,
  name,
  formula,
  molarMassGMol: more.molarMassGMol ?? molarMassGMol(formula),
  doseBasis: `as ${formula}`,
  fed,
  ...more,
});

/** Chlorine products are dosed by their available chlorine. */
const asChlorine = { molarMassGMol: molarMassGMol('Cl2'), doseBasis: 'as Cl2' } as const;

/** g/mol of water of hydration. */
export const WATER_G_MOL = molarMassGMol('H2O');

/** What two moles of aluminium of a polyaluminium chloride bring, by its basicity. */
export function polyaluminumChloride(basicity: number): Record<string, number> {
  return { 'Al+++': 2, 'OH-': 6 * basicity, 'Cl-': 6 * (1 - basicity) };
}

/** Usual hydration of commercial aluminium sulfate, mol of water per mol. */
export const ALUM_HYDRATE = 14.3;

/** Basicity of a common polyaluminium chloride; products run from 0.1 to 0.83. */
export const PACL_BASICITY = 0.5;

/** Every pure compound the engine can feed. Strengths and products are the plant's own matter. */
export const REAGENTS: Readonly<Record<ReagentKey, ReagentInfo>> = {
  'calcium-hydroxide': reagent('calcium-hydroxide', 'hydrated lime', 'Ca(OH)2', {
    'Ca++': 1,
    'OH-': 2,
  }),
  'calcium-oxide': reagent('calcium-oxide', 'quicklime', 'CaO', { 'Ca++': 1, 'OH-': 2 }),
  'sodium-hydroxide': reagent('sodium-hydroxide', 'caustic soda', 'NaOH', { 'Na+': 1, 'OH-': 1 }),
  'sodium-carbonate': reagent('sodium-carbonate', 'soda ash', 'Na2CO3', { 'Na+': 2, 'CO3--': 1 }),
  'sodium-bicarbonate': reagent('sodium-bicarbonate', 'sodium bicarbonate', 'NaHCO3', {
    'Na+': 1,
    'HCO3-': 1,
  }),
  'potassium-hydroxide': reagent('potassium-hydroxide', 'caustic potash', 'KOH', {
    'K+': 1,
    'OH-': 1,
  }),
  'magnesium-hydroxide': reagent('magnesium-hydroxide', 'magnesium hydroxide', 'Mg(OH)2', {
    'Mg++': 1,
    'OH-': 2,
  }),
  'carbon-dioxide': reagent('carbon-dioxide', 'carbon dioxide', 'CO2', { CO2: 1 }),
  'sulfuric-acid': reagent('sulfuric-acid', 'sulfuric acid', 'H2SO4', { 'H+': 2, 'SO4--': 1 }),
  'hydrochloric-acid': reagent('hydrochloric-acid', 'hydrochloric acid', 'HCl', {
    'H+': 1,
    'Cl-': 1,
  }),
  'aluminum-sulfate': reagent(
    'aluminum-sulfate',
    'alum',
    'Al2(SO4)3',
    { 'Al+++': 2, 'SO4--': 3 },
    {
      molarMassGMol: molarMassGMol('Al2(SO4)3') + ALUM_HYDRATE * WATER_G_MOL,
      doseBasis: `as Al2(SO4)3·${ALUM_HYDRATE}H2O`,
      precipitates: { solid: 'aluminum-hydroxide', molPerMol: 2 },
    },
  ),
  'ferric-chloride': reagent(
    'ferric-chloride',
    'ferric chloride',
    'FeCl3',
    { 'Fe+++': 1, 'Cl-': 3 },
    { precipitates: { solid: 'ferrihydrite', molPerMol: 1 } },
  ),
  'ferric-sulfate': reagent(
    'ferric-sulfate',
    'ferric sulfate',
    'Fe2(SO4)3',
    { 'Fe+++': 2, 'SO4--': 3 },
    { precipitates: { solid: 'ferrihydrite', molPerMol: 2 } },
  ),
  'ferrous-sulfate': reagent(
    'ferrous-sulfate',
    'ferrous sulfate',
    'FeSO4.7H2O',
    { 'Fe++': 1, 'SO4--': 1 },
    {
      doseBasis: 'as FeSO4·7H2O',
      precipitates: { solid: 'iron-ii-hydroxide', molPerMol: 1 },
      note: 'Oxidised by dissolved oxygen it takes the same alkalinity, 2 equivalents per mole.',
    },
  ),
  'sodium-aluminate': reagent(
    'sodium-aluminate',
    'sodium aluminate',
    'NaAlO2',
    { 'Na+': 1, 'Al(OH)4-': 1 },
    { precipitates: { solid: 'aluminum-hydroxide', molPerMol: 1 } },
  ),
  chlorine: reagent('chlorine', 'chlorine gas', 'Cl2', { HOCl: 1, 'H+': 1, 'Cl-': 1 }, asChlorine),
  'sodium-hypochlorite': reagent(
    'sodium-hypochlorite',
    'sodium hypochlorite',
    'NaOCl',
    { 'Na+': 1, 'OCl-': 1 },
    asChlorine,
  ),
  'calcium-hypochlorite': reagent(
    'calcium-hypochlorite',
    'calcium hypochlorite',
    'Ca(OCl)2',
    { 'Ca++': 0.5, 'OCl-': 1 },
    asChlorine,
  ),
  'calcium-chloride': reagent('calcium-chloride', 'calcium chloride', 'CaCl2', {
    'Ca++': 1,
    'Cl-': 2,
  }),
  'calcium-sulfate': reagent('calcium-sulfate', 'calcium sulfate', 'CaSO4', {
    'Ca++': 1,
    'SO4--': 1,
  }),
  'sodium-fluoride': reagent('sodium-fluoride', 'sodium fluoride', 'NaF', { 'Na+': 1, 'F-': 1 }),
  'hexafluorosilicic-acid': reagent(
    'hexafluorosilicic-acid',
    'hexafluorosilicic acid',
    'H2SiF6',
    { 'H+': 6, 'F-': 6, H4SiO4: 1 },
    {
      note: 'Hydrolysed completely to fluoride and silica, as it is at the dilution of drinking water.',
    },
  ),
  'phosphoric-acid': reagent('phosphoric-acid', 'phosphoric acid', 'H3PO4', {
    'H+': 1,
    'H2PO4-': 1,
  }),
  'sodium-silicate': reagent(
    'sodium-silicate',
    'sodium silicate',
    'Na2SiO3',
    { 'Na+': 2, 'OH-': 2, H4SiO4: 1 },
    { note: 'The metasilicate; a water glass of higher ratio brings less alkali per silica.' },
  ),
  ammonia: reagent('ammonia', 'ammonia', 'NH3', { NH3: 1 }),
  'sodium-bisulfite': reagent(
    'sodium-bisulfite',
    'sodium bisulfite',
    'NaHSO3',
    { 'Na+': 1, 'HSO3-': 1 },
    {
      note: 'Reacts at once with free chlorine to sulfate and chloride; any rest stays as sulfite.',
    },
  ),
  'polyaluminum-chloride': reagent(
    'polyaluminum-chloride',
    'polyaluminium chloride',
    'Al2(OH)3Cl3',
    polyaluminumChloride(PACL_BASICITY),
    {
      molarMassGMol: molarMassGMol('Al2O3'),
      doseBasis: 'as Al2O3',
      precipitates: { solid: 'aluminum-hydroxide', molPerMol: 2 },
      note: 'Written at a basicity of one half; the product’s own replaces it.',
    },
  ),
  'ammonium-sulfate': reagent('ammonium-sulfate', 'ammonium sulfate', '(NH4)2SO4', {
    'NH4+': 2,
    'SO4--': 1,
  }),
  'sodium-hexafluorosilicate': reagent(
    'sodium-hexafluorosilicate',
    'sodium hexafluorosilicate',
    'Na2SiF6',
    { 'Na+': 2, 'H+': 4, 'F-': 6, H4SiO4: 1 },
    { note: 'Hydrolysed completely to fluoride and silica.' },
  ),
  'monosodium-phosphate': reagent(
    'monosodium-phosphate',
    'monosodium phosphate',
    'NaH2PO4',
    { 'Na+': 1, 'H2PO4-': 1 },
    { note: 'The orthophosphate of a blend; its polyphosphate part is no orthophosphate.' },
  ),
  'zinc-sulfate': reagent('zinc-sulfate', 'zinc sulfate', 'ZnSO4', { 'Zn++': 1, 'SO4--': 1 }),
  'zinc-chloride': reagent('zinc-chloride', 'zinc chloride', 'ZnCl2', { 'Zn++': 1, 'Cl-': 2 }),
};

export const isReagent = (key: string): key is ReagentKey => Object.hasOwn(REAGENTS, key);
