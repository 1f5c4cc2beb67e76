import { classOf, type IonClass } from '../activity/ion-class';
import { COMPONENT_KEYS } from '../constants/components';
import { SOLIDS, SPECIES, type Entry } from '../constants/table';

/** Sums over species: entry e is Σ factor · molality of owner over the run from[e] … from[e + 1], and goes to at[e]. */
export interface Gather {
  readonly at: Int32Array;
  readonly from: Int32Array;
  readonly factor: Float64Array;
  readonly owner: Int32Array;
}

/**
 * The species and solids that can exist with a set of components, laid out for the solver in flat lists, which the
 * processor runs through without branching. Column 0 is always H+.
 */
export interface System {
  /** Index into COMPONENT_KEYS of each column. */
  readonly components: readonly number[];
  /** Column of inorganic carbon, −1 when the water holds none. */
  readonly carbon: number;
  readonly species: readonly Entry[];
  readonly charges: Float64Array;
  /** ½ z² of each species. */
  readonly halfSquare: Float64Array;
  /**
   * Composition by component: run from[j] … from[j + 1] of pairs in `terms`, a species and its moles of j. The basis
   * species themselves, which are the first of `species` and hold one mole of their own component, are left out.
   */
  readonly from: Int32Array;
  readonly terms: Int32Array;
  /** Moles of j times ½ z² of the species, term by term. */
  readonly termStrength: Float64Array;
  /** Σ count · count · molality above the diagonal (row-major). */
  readonly pairs: Gather;
  /** Row and column of each entry of `pairs`. */
  readonly pairPlaces: { readonly rows: Int32Array; readonly columns: Int32Array };
  /** What the diagonal holds over the plain sum: Σ (count² − count) · molality. */
  readonly squares: Gather;
  /** The same for the species that hold H+ over the basis, in the hydrogen row alone. */
  readonly acidPairs: Gather;
  /** Moles of H+ in each species over the basis. */
  readonly hydrogen: Float64Array;
  /** Species that hold more H+ than the basis. */
  readonly acids: Int32Array;
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
  const owners: number[] = [];
  const columns: number[] = [];
  const counts: number[] = [];
  const classes: IonClass[] = [];
  const classIndex = new Int32Array(species.length);
  const names: string[] = [];
  species.forEach((entry, i) => {
    entry.composition.forEach((count, component) => {
      const column = columnOf.get(component);
      if (count === 0 || column === undefined) return;
      owners.push(i);
      columns.push(column);
      counts.push(count);
    });
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
    halfSquare: Float64Array.from(species, (entry) => 0.5 * entry.charge * entry.charge),
    ...byComponent(components.length, owners, columns, counts, species),
    ...pairsOf(components.length, owners, columns, counts),
    hydrogen: Float64Array.from(species, (entry) => entry.composition[0] ?? 0),
    acids: Int32Array.from(
      [...species.keys()].filter((i) => (species[i]?.composition[0] ?? 0) > 0),
    ),
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

function byComponent(
  m: number,
  owners: readonly number[],
  columns: readonly number[],
  counts: readonly number[],
  species: readonly Entry[],
) {
  const order = columns
    .map((_, p) => p)
    .filter((p) => (owners[p] ?? 0) >= m)
    .sort((a, b) => (columns[a] ?? 0) - (columns[b] ?? 0));
  const from = new Int32Array(m + 1);
  for (const p of order) {
    const column = columns[p] ?? 0;
    from[column + 1] = (from[column + 1] ?? 0) + 1;
  }
  for (let j = 0; j < m; j++) from[j + 1] = (from[j + 1] ?? 0) + (from[j] ?? 0);
  return {
    from,
    terms: Int32Array.from(order.flatMap((p) => [owners[p] ?? 0, counts[p] ?? 0])),
    termStrength: Float64Array.from(
      order,
      (p) => 0.5 * (species[owners[p] ?? 0]?.charge ?? 0) ** 2 * (counts[p] ?? 0),
    ),
  };
}

/** Products of counts within each species, and those with the H+ it holds over the basis. */
function pairsOf(
  m: number,
  owners: readonly number[],
  columns: readonly number[],
  counts: readonly number[],
) {
  const pairs: Term[] = [];
  const squares: Term[] = [];
  const acids: Term[] = [];
  owners.forEach((owner, p) => {
    const row = columns[p] ?? 0;
    const count = counts[p] ?? 0;
    const overPlain = count * count - count;
    if (overPlain !== 0) squares.push([row * m + row, overPlain, owner]);
    for (let q = p; owners[q] === owner; q++) {
      const column = columns[q] ?? 0;
      const factor = count * (counts[q] ?? 0);
      if (q > p) pairs.push([row * m + column, factor, owner]);
      if (row === 0 && count > 0) acids.push([column, factor, owner]);
    }
  });
  const gathered = gather(pairs);
  const pairPlaces = {
    rows: gathered.at.map((at) => Math.floor(at / m)),
    columns: gathered.at.map((at) => at % m),
  };
  return {
    pairs: gathered,
    pairPlaces,
    squares: gather(squares),
    acidPairs: gather(acids),
  };
}

type Term = readonly [at: number, factor: number, owner: number];

function gather(terms: readonly Term[]): Gather {
  const sorted = [...terms].sort((a, b) => a[0] - b[0]);
  const at = [...new Set(sorted.map(([place]) => place))];
  const from = at.map((place) => sorted.findIndex((term) => term[0] === place));
  return {
    at: Int32Array.from(at),
    from: Int32Array.from([...from, sorted.length]),
    factor: Float64Array.from(sorted, ([, factor]) => factor),
    owner: Int32Array.from(sorted, ([, , owner]) => owner),
  };
}
