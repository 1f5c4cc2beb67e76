import { CACO3_G_MOL } from './constants/carbonate-equivalents';
import { molarMassGMol } from './constants/notation';
import { refuse } from './refusal';
import type { Refusal } from './types';

/** canonical = written × scale + offset. The canonical unit of a kind is the one with scale 1. */
interface Unit {
  readonly scale: number;
  readonly offset?: number;
}

const UG = 0.001;
/** US gallon in litres and grain in milligrams: definitions. */
const US_GALLON_L = 3.785411784;
const IMPERIAL_GALLON_L = 4.54609;
const GRAIN_MG = 64.79891;

/** Hardness degrees in mg/L as CaCO3: 10 mg CaO/L, 10 mg CaCO3/L, one grain per gallon. */
const GERMAN_DEGREE = (10 * CACO3_G_MOL) / molarMassGMol('CaO');
const FRENCH_DEGREE = 10;
const CLARK_DEGREE = GRAIN_MG / IMPERIAL_GALLON_L;
const GRAIN_PER_GALLON = GRAIN_MG / US_GALLON_L;

/** Mass concentrations; 1 ppm is read as 1 mg/L, as is usual in fresh water. */
const MASS = {
  'mg/L': { scale: 1 },
  'µg/L': { scale: UG },
  'g/m³': { scale: 1 },
  ppm: { scale: 1 },
  ppb: { scale: UG },
} as const;

/** Units of an ion whose canonical unit is mg/L of the ion itself. */
const ion = (formula: string, charge: number) => {
  const mass = molarMassGMol(formula);
  return {
    ...MASS,
    'mmol/L': { scale: mass },
    'meq/L': { scale: mass / charge },
    'mg/L as CaCO3': { scale: (2 * mass) / (charge * CACO3_G_MOL) },
  } as const;
};

/** g/mol of the form an analysis is counted in. */
const counted = molarMassGMol;

const AS_CACO3 = {
  'mg/L as CaCO3': { scale: 1 },
  'ppm as CaCO3': { scale: 1 },
  '°dH': { scale: GERMAN_DEGREE },
  '°f': { scale: FRENCH_DEGREE },
  '°Clark': { scale: CLARK_DEGREE },
  gpg: { scale: GRAIN_PER_GALLON },
  'meq/L': { scale: CACO3_G_MOL / 2 },
} as const;

const degrees = (formula: string) => {
  const share = molarMassGMol(formula) / CACO3_G_MOL;
  return {
    ...ion(formula, 2),
    '°dH': { scale: GERMAN_DEGREE * share },
    '°f': { scale: FRENCH_DEGREE * share },
    '°Clark': { scale: CLARK_DEGREE * share },
    gpg: { scale: GRAIN_PER_GALLON * share },
  } as const;
};

const metal = (formula: string) =>
  ({ ...MASS, 'mmol/L': { scale: molarMassGMol(formula) } }) as const;

/** Every kind of quantity a plant writes down and the units it may be written in. */
export const UNITS = {
  temperature: { '°C': { scale: 1 }, '°F': { scale: 5 / 9, offset: -160 / 9 } },
  pH: { pH: { scale: 1 } },
  conductivity: { 'µS/cm': { scale: 1 }, 'mS/cm': { scale: 1000 }, 'mS/m': { scale: 10 } },
  alkalinity: {
    ...AS_CACO3,
    'mg/L as HCO3': { scale: CACO3_G_MOL / (2 * counted('HCO3')) },
    'mmol/L': { scale: CACO3_G_MOL / 2 },
  },
  hardness: { ...AS_CACO3, 'mmol/L': { scale: CACO3_G_MOL } },
  calcium: degrees('Ca'),
  magnesium: degrees('Mg'),
  sodium: ion('Na', 1),
  potassium: ion('K', 1),
  chloride: ion('Cl', 1),
  sulfate: { ...ion('SO4', 2), 'mg/L as S': { scale: counted('SO4') / counted('S') } },
  nitrate: { ...ion('NO3', 1), 'mg/L as N': { scale: counted('NO3') / counted('N') } },
  fluoride: ion('F', 1),
  ammonia: {
    'mg/L as N': { scale: 1 },
    'µg/L as N': { scale: UG },
    'mg/L as NH3': { scale: counted('N') / counted('NH3') },
    'mg/L as NH4': { scale: counted('N') / counted('NH4') },
    'mmol/L': { scale: counted('N') },
  },
  phosphate: {
    'mg/L as P': { scale: 1 },
    'µg/L as P': { scale: UG },
    'mg/L as PO4': { scale: counted('P') / counted('PO4') },
    'mg/L as P2O5': { scale: (2 * counted('P')) / counted('P2O5') },
    'mmol/L': { scale: counted('P') },
  },
  silica: {
    'mg/L as SiO2': { scale: 1 },
    'mg/L as Si': { scale: counted('SiO2') / counted('Si') },
    'mmol/L': { scale: counted('SiO2') },
  },
  boron: {
    'mg/L as B': { scale: 1 },
    'µg/L as B': { scale: UG },
    'mg/L as B(OH)3': { scale: counted('B') / counted('B(OH)3') },
    'mmol/L': { scale: counted('B') },
  },
  sulfide: {
    'mg/L as S': { scale: 1 },
    'µg/L as S': { scale: UG },
    'mg/L as H2S': { scale: counted('S') / counted('H2S') },
    'mmol/L': { scale: counted('S') },
  },
  inorganicCarbon: {
    'mg/L as C': { scale: 1 },
    'mg/L as CO2': { scale: counted('C') / counted('CO2') },
    'mg/L as CaCO3': { scale: counted('C') / CACO3_G_MOL },
    'mmol/L': { scale: counted('C') },
  },
  carbonDioxide: {
    'mg/L as CO2': { scale: 1 },
    'mg/L as CaCO3': { scale: counted('CO2') / CACO3_G_MOL },
    'mmol/L': { scale: counted('CO2') },
  },
  iron: metal('Fe'),
  manganese: metal('Mn'),
  aluminum: metal('Al'),
  copper: metal('Cu'),
  lead: metal('Pb'),
  zinc: metal('Zn'),
  barium: metal('Ba'),
  strontium: metal('Sr'),
} as const satisfies Readonly<Record<string, Readonly<Record<string, Unit>>>>;

export type QuantityKind = keyof typeof UNITS;
/** The units one kind of quantity may be written in; any other does not compile. */
export type UnitOf<K extends QuantityKind> = keyof (typeof UNITS)[K] & string;

export type Converted = { readonly ok: true; readonly value: number } | Refusal;

/** Rounding noise of a conversion in units of the last place. */
const NOISE = 8;
const MOST_DIGITS = 11;

/** Converts a written value between two units of the same kind. Refuses unknown kinds and units met at run time. */
export function convert<K extends QuantityKind>(
  kind: K,
  value: number,
  from: UnitOf<K>,
  to: UnitOf<K>,
): Converted {
  if (!Object.hasOwn(UNITS, kind))
    return refuse('badInput', `No quantity is called ${kind}.`, 'kind');
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return refuse('badInput', 'A number is needed.', 'value');
  }
  const source = unitOf(kind, from);
  if (!source) return refuse('badInput', `${kind} is not written in ${from}.`, 'from');
  const target = unitOf(kind, to);
  if (!target) return refuse('badInput', `${kind} is not written in ${to}.`, 'to');
  if (from === to) return { ok: true, value };
  const offset = (source.offset ?? 0) - (target.offset ?? 0);
  const converted = (value * source.scale + offset) / target.scale;
  const size = Math.abs(converted) + Math.abs(offset / target.scale);
  return { ok: true, value: withoutNoise(converted, NOISE * Number.EPSILON * size) };
}

/** The shortest decimal within the noise, if it is short: a written value comes back as written. */
function withoutNoise(value: number, noise: number): number {
  for (let digits = 1; digits <= MOST_DIGITS; digits++) {
    const short = Number(value.toPrecision(digits));
    if (Math.abs(short - value) <= noise) return short;
  }
  return value;
}

function unitOf(kind: QuantityKind, unit: string): Unit | undefined {
  const units: Readonly<Record<string, Unit>> = UNITS[kind];
  return Object.hasOwn(units, unit) ? units[unit] : undefined;
}
