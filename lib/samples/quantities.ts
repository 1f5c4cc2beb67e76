import type { Analyte } from '@/lib/engine';

/**
 * The quantities a plant measures. Values are kept in the canonical unit (the first of `units`) beside the text and
 * unit as written; `possible` is what can physically be true of a drinking-water sample, in the canonical unit.
 */
export interface Quantity {
  readonly key: QuantityKey;
  readonly label: string;
  /** Short form for narrow columns and the plant line. */
  readonly short: string;
  readonly units: readonly [UnitOption, ...UnitOption[]];
  readonly possible: readonly [number, number];
  readonly decimals: number;
  /** Which analyte of the engine this is, or what else it gives to the analysis. */
  readonly engine?: Analyte | 'temperature' | 'pH' | 'alkalinity';
}

/** canonical = written × scale + offset. */
export interface UnitOption {
  readonly label: string;
  readonly scale: number;
  readonly offset?: number;
}

export const QUANTITY_KEYS = [
  'temperature',
  'pH',
  'alkalinity',
  'calcium',
  'magnesium',
  'sodium',
  'potassium',
  'chloride',
  'sulfate',
  'nitrate',
  'fluoride',
  'silica',
  'phosphate',
  'ammonia',
  'iron',
  'manganese',
  'aluminum',
  'conductivity',
  'turbidity',
  'colour',
  'uvAbsorbance',
  'freeChlorine',
] as const;

export type QuantityKey = (typeof QUANTITY_KEYS)[number];

const mgL: UnitOption = { label: 'mg/L', scale: 1 };
const ugL: UnitOption = { label: 'µg/L', scale: 0.001 };

// mg CaCO3 per mg of ion, from IUPAC atomic weights (CaCO3 100.086, Ca 40.078, Mg 24.305).
const CALCIUM_PER_CACO3 = 40.078 / 100.086;
const MAGNESIUM_PER_CACO3 = 24.305 / 100.086;
// P 30.974, PO4 94.970.
const PHOSPHORUS_PER_PHOSPHATE = 30.974 / 94.97;
// N 14.007, NO3 62.004.
const NITRATE_PER_NITROGEN = 62.004 / 14.007;

const define = (
  label: string,
  short: string,
  units: Quantity['units'],
  possible: Quantity['possible'],
  decimals: number,
  engine?: Quantity['engine'],
): Omit<Quantity, 'key'> => ({ label, short, units, possible, decimals, engine });

const table: Record<QuantityKey, Omit<Quantity, 'key'>> = {
  temperature: define(
    'Temperature',
    'Temp.',
    [
      { label: '°C', scale: 1 },
      { label: '°F', scale: 5 / 9, offset: -160 / 9 },
    ],
    [0, 45],
    1,
    'temperature',
  ),
  pH: define('pH', 'pH', [{ label: 'pH', scale: 1 }], [2, 13], 2, 'pH'),
  alkalinity: define(
    'Total alkalinity',
    'Alk.',
    [
      { label: 'mg/L as CaCO₃', scale: 1 },
      { label: 'mmol/L', scale: 50.043 },
    ],
    [0, 2000],
    0,
    'alkalinity',
  ),
  calcium: define(
    'Calcium',
    'Ca',
    [
      { label: 'mg/L as Ca', scale: 1 },
      { label: 'mg/L as CaCO₃', scale: CALCIUM_PER_CACO3 },
    ],
    [0, 2000],
    1,
    'calcium',
  ),
  magnesium: define(
    'Magnesium',
    'Mg',
    [
      { label: 'mg/L as Mg', scale: 1 },
      { label: 'mg/L as CaCO₃', scale: MAGNESIUM_PER_CACO3 },
    ],
    [0, 1500],
    1,
    'magnesium',
  ),
  sodium: define('Sodium', 'Na', [mgL], [0, 10000], 1, 'sodium'),
  potassium: define('Potassium', 'K', [mgL], [0, 1000], 1, 'potassium'),
  chloride: define('Chloride', 'Cl', [mgL], [0, 20000], 1, 'chloride'),
  sulfate: define('Sulfate', 'SO₄', [mgL], [0, 5000], 1, 'sulfate'),
  nitrate: define(
    'Nitrate',
    'NO₃',
    [
      { label: 'mg/L as NO₃', scale: 1 },
      { label: 'mg/L as N', scale: NITRATE_PER_NITROGEN },
    ],
    [0, 500],
    1,
    'nitrate',
  ),
  fluoride: define('Fluoride', 'F', [mgL], [0, 50], 2, 'fluoride'),
  silica: define('Silica', 'SiO₂', [{ label: 'mg/L as SiO₂', scale: 1 }], [0, 200], 1, 'silica'),
  phosphate: define(
    'Orthophosphate',
    'PO₄-P',
    [
      { label: 'mg/L as P', scale: 1 },
      { label: 'mg/L as PO₄', scale: PHOSPHORUS_PER_PHOSPHATE },
    ],
    [0, 50],
    2,
    'phosphate',
  ),
  ammonia: define('Ammonia', 'NH₃-N', [{ label: 'mg/L as N', scale: 1 }], [0, 100], 2, 'ammonia'),
  iron: define('Iron', 'Fe', [mgL, ugL], [0, 100], 3, 'iron'),
  manganese: define('Manganese', 'Mn', [mgL, ugL], [0, 50], 3, 'manganese'),
  aluminum: define('Aluminium', 'Al', [mgL, ugL], [0, 50], 3, 'aluminum'),
  conductivity: define(
    'Conductivity at 25 °C',
    'Cond.',
    [
      { label: 'µS/cm', scale: 1 },
      { label: 'mS/m', scale: 10 },
    ],
    [0, 50000],
    0,
  ),
  turbidity: define('Turbidity', 'Turb.', [{ label: 'NTU', scale: 1 }], [0, 10000], 2),
  colour: define('Colour', 'Colour', [{ label: 'mg/L Pt-Co', scale: 1 }], [0, 1000], 0),
  uvAbsorbance: define(
    'UV absorbance at 254 nm',
    'UV254',
    [
      { label: '1/cm', scale: 1 },
      { label: '1/m', scale: 0.01 },
    ],
    [0, 5],
    3,
  ),
  freeChlorine: define('Free chlorine', 'Cl₂', [{ label: 'mg/L as Cl₂', scale: 1 }], [0, 20], 2),
};

export const QUANTITIES: Readonly<Record<QuantityKey, Quantity>> = Object.fromEntries(
  QUANTITY_KEYS.map((key) => [key, { key, ...table[key] }]),
) as Record<QuantityKey, Quantity>;

export const isQuantityKey = (key: string): key is QuantityKey =>
  (QUANTITY_KEYS as readonly string[]).includes(key);

/** Throws when the unit is not one of the quantity's own: a wrong pair never passes in silence. */
export function unitOf(quantity: QuantityKey, unitLabel: string): UnitOption {
  const unit = QUANTITIES[quantity].units.find(({ label }) => label === unitLabel);
  if (unit === undefined) {
    throw new RangeError(`${QUANTITIES[quantity].label} cannot be written in ${unitLabel}.`);
  }
  return unit;
}

export const toCanonical = (quantity: QuantityKey, written: number, unitLabel: string): number => {
  const { scale, offset = 0 } = unitOf(quantity, unitLabel);
  return written * scale + offset;
};

export const fromCanonical = (quantity: QuantityKey, value: number, unitLabel: string): number => {
  const { scale, offset = 0 } = unitOf(quantity, unitLabel);
  return (value - offset) / scale;
};
