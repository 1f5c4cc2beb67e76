import { ANALYTE_KEYS, ANALYTES, isAnalyte } from '../constants/analytes';
import { COMPONENT_KEYS } from '../constants/components';
import { refuse } from '../refusal';
import type { Refusal, WaterAnalysis } from '../types';

export const TEMPERATURE_RANGE_C = [0, 90] as const;
export const PH_RANGE = [0, 14] as const;
const ALKALINITY_RANGE = [-50_000, 100_000] as const;
const CARBON_RANGE = [0, 12_000] as const;
/** Henry's law with fugacity taken as pressure holds within a few per cent to here. */
export const HIGHEST_CO2_ATM = 10;

export const CARBONATE_FIELDS = [
  'pH',
  'alkalinityMgLCaCO3',
  'inorganicCarbonMgLC',
  'carbonDioxideAtm',
] as const;
export type CarbonateField = (typeof CARBONATE_FIELDS)[number];

/** An analysis that has been checked: two carbonate quantities and the totals of everything else (mol/kg). */
export interface CheckedAnalysis {
  readonly ok: true;
  readonly temperatureC: number;
  readonly given: Readonly<Partial<Record<CarbonateField, number>>>;
  readonly totals: Float64Array;
  readonly assumptions: readonly string[];
}

/** Checks every field of an analysis, whatever its origin; the first fault is refused with its path. */
export function checkAnalysis(input: WaterAnalysis): CheckedAnalysis | Refusal {
  if (typeof input !== 'object' || input === null) {
    return refuse('badInput', 'An analysis is needed.', '');
  }
  const temperature = checkNumber(input.temperatureC, 'temperatureC', TEMPERATURE_RANGE_C);
  if (temperature) return temperature;
  const ranges = [PH_RANGE, ALKALINITY_RANGE, CARBON_RANGE, [0, HIGHEST_CO2_ATM]] as const;
  const given: Partial<Record<CarbonateField, number>> = {};
  for (const [i, field] of CARBONATE_FIELDS.entries()) {
    const value = input[field];
    if (value === undefined || value === null) continue;
    const fault = checkNumber(value, field, ranges[i] ?? PH_RANGE);
    if (fault) return fault;
    given[field] = value;
  }
  const count = Object.keys(given).length;
  if (count !== 2) {
    return refuse(
      'badInput',
      `Exactly two of pH, alkalinity, inorganic carbon and CO2 pressure are needed; ${count} given.`,
      count > 2 ? Object.keys(given)[2] : CARBONATE_FIELDS.find((field) => !(field in given)),
    );
  }
  const totals = new Float64Array(COMPONENT_KEYS.length);
  const fault = fillTotals(input.analytesMgL, totals);
  if (fault) return fault;
  return {
    ok: true,
    temperatureC: input.temperatureC,
    given,
    totals,
    assumptions: assumptionsOf(input.analytesMgL),
  };
}

/** Refuses anything but a finite number in a range. */
export function checkNumber(
  value: unknown,
  path: string,
  [low, high]: readonly [number, number],
): Refusal | undefined {
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return refuse('badInput', `A number is needed.`, path);
  }
  if (value < low || value > high) {
    return refuse('outOfRange', `${value} is outside ${low} to ${high}.`, path);
  }
  return undefined;
}

function fillTotals(analytes: unknown, totals: Float64Array): Refusal | undefined {
  if (typeof analytes !== 'object' || analytes === null || Array.isArray(analytes)) {
    return refuse('badInput', 'A list of analytes is needed (it may be empty).', 'analytesMgL');
  }
  for (const [key, value] of Object.entries(analytes) as [string, unknown][]) {
    const path = `analytesMgL.${key}`;
    if (!isAnalyte(key)) return refuse('badInput', `No analyte is called ${key}.`, path);
    if (value === undefined || value === null) continue;
    const { component, largestMgL, molarMassGMol } = ANALYTES[key];
    if (typeof value === 'number' && value < 0) {
      return refuse('badInput', 'An amount cannot be negative.', path);
    }
    const fault = checkNumber(value, path, [0, largestMgL]);
    if (fault) return fault;
    totals[COMPONENT_KEYS.indexOf(component)] = (value as number) / (1000 * molarMassGMol);
  }
  return undefined;
}

function assumptionsOf(analytes: WaterAnalysis['analytesMgL']): readonly string[] {
  const missing = ANALYTE_KEYS.filter((key) => typeof analytes[key] !== 'number');
  const sentences: string[] = [];
  if (missing.length > 0) {
    const names = missing.map((key) => ANALYTES[key].label).join(', ');
    sentences.push(`Not analysed and counted as zero: ${names}.`);
  }
  if ((analytes.iron ?? 0) > 0) sentences.push('Iron is counted as dissolved iron(II).');
  if ((analytes.copper ?? 0) > 0) sentences.push('Copper is counted as dissolved copper(II).');
  return sentences;
}
