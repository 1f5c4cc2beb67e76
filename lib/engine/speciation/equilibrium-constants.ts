import { SPECIES, SOLIDS, type Entry } from '../constants/table';
import { GASES } from '../constants/gases';
import { logKAt } from '../constants/temperature';

/** Formation constants at one temperature, over the basis species, base 10. */
export interface ConstantsAt {
  readonly temperatureC: number;
  /** log10 a(species) = log K + Σ composition · log10 a(basis). */
  readonly species: ReadonlyMap<string, number>;
  /** log10 of the ion activity product of the basis at saturation. */
  readonly solids: ReadonlyMap<string, number>;
  /** log10 of a(CO2)/p(CO2), mol kg⁻¹ atm⁻¹. */
  readonly carbonDioxide: number;
}

let latest: ConstantsAt | undefined;

/** All constants at a temperature in °C; the last temperature asked is kept. */
export function constantsAt(temperatureC: number): ConstantsAt {
  if (latest?.temperatureC === temperatureC) return latest;
  const species = new Map<string, number>();
  for (const entry of SPECIES)
    species.set(entry.key, formation(entry, entry.key, species, temperatureC));
  const solids = new Map<string, number>();
  for (const entry of SOLIDS) {
    const term = entry.coefficients?.keys().next().value ?? entry.key;
    solids.set(entry.key, -formation(entry, term, species, temperatureC));
  }
  const gas = GASES[0];
  latest = { temperatureC, species, solids, carbonDioxide: gas ? logKAt(gas, temperatureC) : NaN };
  return latest;
}

/** Formation constant of `term` from the basis, through the row's own reaction. */
function formation(
  entry: Entry,
  term: string,
  known: ReadonlyMap<string, number>,
  temperatureC: number,
): number {
  const { row, coefficients } = entry;
  if (row === undefined || coefficients === undefined) return 0;
  let own = 1;
  let logK = logKAt(row, temperatureC);
  for (const [key, coefficient] of coefficients) {
    if (key === term) own = coefficient;
    else if (key !== 'H2O') logK -= coefficient * (known.get(key) ?? 0);
  }
  return logK / own;
}
