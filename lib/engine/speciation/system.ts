import { classOf, type IonClass } from '../activity/ion-class';
import { COMPONENT_KEYS } from '../constants/components';
import { SOLIDS, SPECIES, type Entry } from '../constants/table';

/**
 * The species and solids that can exist with a set of components, laid out for the solver. Column 0 is always H+;
 * the composition of species i is the run start[i] … start[i + 1] of `column` and `count`.
 */
export interface System {
  /** Index into COMPONENT_KEYS of each column. */
  readonly components: readonly number[];
  /** Column of inorganic carbon, −1 when the water holds none. */
  readonly carbon: number;
  readonly species: readonly Entry[];
  readonly charges: Float64Array;
  readonly start: Int32Array;
  readonly column: Int32Array;
  readonly count: Float64Array;
  /** Moles of H+ in each species over the basis. */
  readonly hydrogen: Float64Array;
  readonly classes: readonly IonClass[];
  readonly classIndex: Int32Array;
  /** Species of one mole of a component and H+ alone: run aloneStart[j] … aloneStart[j + 1] of `alone`, per column. */
  readonly aloneStart: Int32Array;
  readonly alone: Int32Array;
  readonly solids: readonly Entry[];
}

/** Layouts kept; a plant's waters need a handful, a stream of arbitrary ones must not fill the memory. */
const KEPT = 64;
const compiled = new Map<number, System>();

/** The system of a set of components (bit mask, H+ among them), laid out once and kept while it is in use. */
export function systemOf(mask: number): System {
  const known = compiled.get(mask);
  if (known) return known;
  if (compiled.size >= KEPT) compiled.clear();
  const system = compile(mask);
  compiled.set(mask, system);
  return system;
}

const possible = (entry: Entry, mask: number): boolean => (entry.mask & ~mask) === 0;

function compile(mask: number): System {
  const components = COMPONENT_KEYS.map((_, i) => i).filter((i) => (mask & (1 << i)) !== 0);
  const columnOf = new Map(components.map((component, column) => [component, column]));
  const species = SPECIES.filter((entry) => possible(entry, mask));
  const start = new Int32Array(species.length + 1);
  const columns: number[] = [];
  const counts: number[] = [];
  const classes: IonClass[] = [];
  const classIndex = new Int32Array(species.length);
  const names: string[] = [];
  species.forEach((entry, i) => {
    entry.composition.forEach((count, component) => {
      const column = columnOf.get(component);
      if (count === 0 || column === undefined) return;
      columns.push(column);
      counts.push(count);
    });
    start[i + 1] = columns.length;
    const group = classOf(entry.key, entry.charge);
    const name = JSON.stringify(group);
    const found = names.indexOf(name);
    if (found < 0) {
      names.push(name);
      classes.push(group);
    }
    classIndex[i] = found < 0 ? names.length - 1 : found;
  });
  const { alone, aloneStart } = speciesAlone(components, species);
  return {
    components,
    alone,
    aloneStart,
    carbon: columnOf.get(1) ?? -1,
    species,
    charges: Float64Array.from(species, (entry) => entry.charge),
    start,
    column: Int32Array.from(columns),
    count: Float64Array.from(counts),
    hydrogen: Float64Array.from(species, (entry) => entry.composition[0] ?? 0),
    classes,
    classIndex,
    solids: SOLIDS.filter((entry) => possible(entry, mask)),
  };
}

function speciesAlone(components: readonly number[], species: readonly Entry[]) {
  const aloneStart = new Int32Array(components.length + 1);
  const alone: number[] = [];
  components.forEach((component, column) => {
    const allowed = 1 | (1 << component);
    species.forEach((entry, i) => {
      const among = (entry.mask & ~allowed) === 0;
      if (among && (column === 0 || entry.composition[component] === 1)) alone.push(i);
    });
    aloneStart[column + 1] = alone.length;
  });
  return { alone: Int32Array.from(alone), aloneStart };
}
