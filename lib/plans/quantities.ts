import { indicesOf, type TargetQuantity, type Water } from '@/lib/engine';

/** The quantities a plan's ledger follows, in the order it writes them. */
export const PLAN_QUANTITY_KEYS = [
  'pH',
  'alkalinity',
  'inorganicCarbon',
  'carbonDioxide',
  'calcium',
  'totalHardness',
  'sodium',
  'chloride',
  'sulfate',
  'calciteIndex',
  'langelier',
  'precipitationPotential',
  'bufferIntensity',
] as const;

export type PlanQuantity = (typeof PLAN_QUANTITY_KEYS)[number];

export const PLAN_QUANTITIES: Readonly<
  Record<PlanQuantity, { readonly label: string; readonly unit: string; readonly decimals: number }>
> = {
  pH: { label: 'pH', unit: '', decimals: 2 },
  alkalinity: { label: 'Total alkalinity', unit: 'mg/L as CaCO₃', decimals: 1 },
  inorganicCarbon: { label: 'Dissolved inorganic carbon', unit: 'mg/L as C', decimals: 2 },
  carbonDioxide: { label: 'Free carbon dioxide', unit: 'mg/L as CO₂', decimals: 2 },
  calcium: { label: 'Calcium', unit: 'mg/L as Ca', decimals: 1 },
  totalHardness: { label: 'Total hardness', unit: 'mg/L as CaCO₃', decimals: 1 },
  sodium: { label: 'Sodium', unit: 'mg/L', decimals: 1 },
  chloride: { label: 'Chloride', unit: 'mg/L', decimals: 1 },
  sulfate: { label: 'Sulfate', unit: 'mg/L', decimals: 1 },
  calciteIndex: { label: 'Calcite saturation index', unit: '', decimals: 2 },
  langelier: { label: 'Langelier index', unit: '', decimals: 2 },
  precipitationPotential: { label: 'Precipitation potential', unit: 'mg/L as CaCO₃', decimals: 1 },
  bufferIntensity: { label: 'Buffer intensity', unit: 'meq/L per pH', decimals: 3 },
};

// mg per mmol, IUPAC atomic weights.
const MG_PER_MMOL = { Ca: 40.078, Na: 22.99, Cl: 35.45, SO4: 96.056 } as const;

const totalMgL = (water: Water, component: keyof typeof MG_PER_MMOL): number =>
  (water.totalsMolKg[component] ?? 0) * 1000 * MG_PER_MMOL[component];

/** Every ledger quantity of one water; null where it has no meaning for it. */
export function planQuantitiesOf(water: Water): Record<PlanQuantity, number | null> {
  const indices = indicesOf(water);
  return {
    pH: water.pH,
    alkalinity: water.alkalinityMgLCaCO3,
    inorganicCarbon: water.inorganicCarbonMgLC,
    carbonDioxide: water.carbonDioxideMgLCO2,
    calcium: totalMgL(water, 'Ca'),
    totalHardness: indices.totalHardnessMgLCaCO3,
    sodium: totalMgL(water, 'Na'),
    chloride: totalMgL(water, 'Cl'),
    sulfate: totalMgL(water, 'SO4'),
    calciteIndex: indices.calciteIndex,
    langelier: indices.langelier,
    precipitationPotential: indices.precipitationPotentialMgLCaCO3,
    bufferIntensity: indices.bufferIntensityMeqLPerPH,
  };
}

/** What a single dose can be asked to reach on the plan screen. */
export const TARGETS = {
  pH: { label: 'pH', unit: '', decimals: 2 },
  alkalinity: { label: 'Total alkalinity', unit: 'mg/L as CaCO₃', decimals: 1 },
  calciteIndex: { label: 'Calcite saturation index', unit: '', decimals: 2 },
  langelier: { label: 'Langelier index', unit: '', decimals: 2 },
  precipitationPotential: { label: 'Precipitation potential', unit: 'mg/L as CaCO₃', decimals: 1 },
  inorganicCarbon: { label: 'Dissolved inorganic carbon', unit: 'mg/L as C', decimals: 1 },
  calcium: { label: 'Calcium', unit: 'mg/L as Ca', decimals: 1 },
  hardness: { label: 'Total hardness', unit: 'mg/L as CaCO₃', decimals: 1 },
  larson: { label: 'Larson–Skold ratio', unit: '', decimals: 2 },
  chlorideSulfateMassRatio: { label: 'Chloride-to-sulfate mass ratio', unit: '', decimals: 2 },
} as const satisfies Record<TargetQuantity, { label: string; unit: string; decimals: number }>;

export const TARGET_KEYS = Object.keys(TARGETS) as (keyof typeof TARGETS)[];
