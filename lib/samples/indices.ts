/** What the engine makes of a sample, kept beside its results and charted like them. */
export const INDEX_KEYS = [
  'calciteIndex',
  'langelier',
  'precipitationPotential',
  'saturationPH',
  'ryznar',
  'larson',
  'chlorideSulfateMassRatio',
  'bufferIntensity',
  'inorganicCarbon',
  'carbonDioxide',
  'totalHardness',
  'ionicStrength',
  'chargeBalance',
] as const;

export type IndexKey = (typeof INDEX_KEYS)[number];

export interface IndexDescription {
  readonly key: IndexKey;
  readonly label: string;
  readonly short: string;
  readonly unit: string;
  readonly decimals: number;
  /** What the sign or size means, in words; never a promise about lead or copper. */
  readonly meaning: string;
}

const table: Record<IndexKey, Omit<IndexDescription, 'key'>> = {
  calciteIndex: {
    label: 'Calcite saturation index',
    short: 'SI',
    unit: '',
    decimals: 2,
    meaning: 'above 0 the water can deposit calcite, below 0 it can dissolve it',
  },
  langelier: {
    label: 'Langelier index',
    short: 'LSI',
    unit: '',
    decimals: 2,
    meaning:
      'pH minus saturation pH; above 0 the water can deposit calcite, below 0 it can dissolve it',
  },
  precipitationPotential: {
    label: 'Calcium carbonate precipitation potential',
    short: 'CCPP',
    unit: 'mg/L as CaCO₃',
    decimals: 1,
    meaning: 'above 0 that much calcite can come out, below 0 that much can dissolve',
  },
  saturationPH: {
    label: 'Saturation pH',
    short: 'pHs',
    unit: '',
    decimals: 2,
    meaning: 'the pH at which this calcium and alkalinity are at rest with calcite',
  },
  ryznar: {
    label: 'Ryznar index',
    short: 'RSI',
    unit: '',
    decimals: 1,
    meaning: 'around 6 to 7 little change; higher dissolves, lower deposits',
  },
  larson: {
    label: 'Larson–Skold ratio',
    short: 'Larson',
    unit: '',
    decimals: 2,
    meaning: 'chloride and sulfate against alkalinity; higher favours corrosion of iron',
  },
  chlorideSulfateMassRatio: {
    label: 'Chloride-to-sulfate mass ratio',
    short: 'CSMR',
    unit: '',
    decimals: 2,
    meaning: 'a screening figure for galvanic attack; not a lead forecast',
  },
  bufferIntensity: {
    label: 'Buffer intensity',
    short: 'β',
    unit: 'meq/L per pH',
    decimals: 3,
    meaning: 'strong base needed to move the pH by one; low means the pH drifts easily',
  },
  inorganicCarbon: {
    label: 'Dissolved inorganic carbon',
    short: 'DIC',
    unit: 'mg/L as C',
    decimals: 1,
    meaning: 'carbon dioxide, bicarbonate and carbonate together',
  },
  carbonDioxide: {
    label: 'Free carbon dioxide',
    short: 'CO₂',
    unit: 'mg/L as CO₂',
    decimals: 1,
    meaning: 'dissolved CO₂ at equilibrium with the measured pH and alkalinity',
  },
  totalHardness: {
    label: 'Total hardness',
    short: 'Hardness',
    unit: 'mg/L as CaCO₃',
    decimals: 0,
    meaning: 'calcium and magnesium together',
  },
  ionicStrength: {
    label: 'Ionic strength',
    short: 'I',
    unit: 'mol/kg',
    decimals: 4,
    meaning: 'how strongly dissolved ions screen one another',
  },
  chargeBalance: {
    label: 'Charge balance',
    short: 'Balance',
    unit: '%',
    decimals: 1,
    meaning: 'cations less anions; far from 0 something is missing or mistyped',
  },
};

export const INDICES: Readonly<Record<IndexKey, IndexDescription>> = Object.fromEntries(
  INDEX_KEYS.map((key) => [key, { key, ...table[key] }]),
) as Record<IndexKey, IndexDescription>;

export const isIndexKey = (key: string): key is IndexKey =>
  (INDEX_KEYS as readonly string[]).includes(key);
