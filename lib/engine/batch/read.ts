import { refuse } from '../refusal';
import type { Dose, Refusal, WaterAnalysis } from '../types';

export type Json = Readonly<Record<string, unknown>>;

export const isJson = (value: unknown): value is Json =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

export const isRefusal = (value: unknown): value is Refusal =>
  isJson(value) && value['ok'] === false;

/** The water of a request as an analysis; what it holds is checked by the solver. */
export function readWater(request: Json): WaterAnalysis | Refusal {
  const water = request['water'];
  if (!isJson(water)) return refuse('badInput', 'A water is needed.', 'water');
  return {
    temperatureC: water['temperature'],
    pH: water['pH'],
    alkalinityMgLCaCO3: water['alkalinity'],
    inorganicCarbonMgLC: water['inorganicCarbon'],
    carbonDioxideAtm: water['pCO2'],
    analytesMgL: water['analytes'] ?? {},
  } as WaterAnalysis;
}

/** A list under a name, or a refusal. */
export function readList(request: Json, key: string): readonly unknown[] | Refusal {
  const list = request[key];
  return Array.isArray(list) ? list : refuse('badInput', 'A list is needed.', key);
}

/** The doses of a request; what they hold is checked when they are applied. */
export function readDoses(request: Json): readonly Dose[] | Refusal {
  const list = readList(request, 'doses');
  if (isRefusal(list)) return list;
  const doses: Dose[] = [];
  for (const [i, entry] of list.entries()) {
    if (!isJson(entry)) return refuse('badInput', 'A dose is needed.', `doses.${i}`);
    const { reagent, dose: doseMgL, hydrate, basicity } = entry;
    const more = {
      ...(hydrate === undefined ? {} : { hydrate }),
      ...(basicity === undefined ? {} : { basicity }),
    };
    doses.push({ reagent, doseMgL, ...more } as Dose);
  }
  return doses;
}

/** Solid names as written: blanks for hyphens are forgiven. */
export function readSolids(request: Json): readonly string[] | Refusal | undefined {
  if (request['equilibrateWith'] === undefined) return undefined;
  const list = readList(request, 'equilibrateWith');
  if (isRefusal(list)) return list;
  return list.map((key) =>
    typeof key === 'string' ? key.trim().replaceAll(' ', '-') : key,
  ) as string[];
}
