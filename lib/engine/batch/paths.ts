import type { Refusal } from '../types';

/** Field names of the engine and how the batch input writes them. */
const WRITTEN: readonly (readonly [engine: string, written: string])[] = [
  ['temperatureC', 'temperature'],
  ['alkalinityMgLCaCO3', 'alkalinity'],
  ['inorganicCarbonMgLC', 'inorganicCarbon'],
  ['carbonDioxideAtm', 'pCO2'],
  ['analytesMgL', 'analytes'],
  ['maxDoseMgL', 'max'],
  ['minDoseMgL', 'min'],
  ['doseMgL', 'dose'],
  ['residualMgL', 'residual'],
  ['ctMgMinL', 'ct'],
];

/** A refusal with its path as the input writes it, below `prefix`. */
export function asWritten(refusal: Refusal, prefix: string): Refusal {
  const own = (refusal.path ?? '')
    .split('.')
    .map((part) => WRITTEN.find(([engine]) => engine === part)?.[1] ?? part)
    .join('.');
  const path = [prefix, own].filter((part) => part !== '').join('.');
  return { ...refusal, path };
}
