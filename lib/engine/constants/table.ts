import { fnv1a64 } from '../numeric/hash';
import { ACIDS_AND_BASES } from './acids-and-bases';
import { COMPONENT_KEYS, COMPONENTS } from './components';
import { ION_SIZES } from './ion-sizes';
import { GASES } from './gases';
import { IRON_AND_ALUMINUM } from './iron-and-aluminum';
import { LEAD_COPPER_ZINC } from './lead-copper-zinc';
import { chargeOf, parseReaction, type Coefficients } from './notation';
import { PAIRS } from './pairs';
import type { ConstantRow } from './row';
import { SOLIDS_OF_HARDNESS } from './solids-of-hardness';
import { SOLIDS_OF_METALS } from './solids-of-metals';
import { SOURCES } from './sources';

/** A species, solid or gas with what follows from its row: charge and composition in components. */
export interface Entry {
  readonly key: string;
  readonly charge: number;
  /** Moles of each component (order of COMPONENT_KEYS) in one mole; H+ may be negative. */
  readonly composition: Float64Array;
  /** Bit per component it holds. */
  readonly mask: number;
  /** Absent for the basis species of a component. */
  readonly row?: ConstantRow;
  readonly coefficients?: Coefficients;
}

const AQUEOUS_ROWS: readonly ConstantRow[] = [
  ...ACIDS_AND_BASES,
  ...PAIRS,
  ...IRON_AND_ALUMINUM,
  ...LEAD_COPPER_ZINC,
];
const SOLID_ROWS: readonly ConstantRow[] = [...SOLIDS_OF_HARDNESS, ...SOLIDS_OF_METALS];

const basisEntries: readonly Entry[] = COMPONENT_KEYS.map((component, column) => {
  const composition = new Float64Array(COMPONENT_KEYS.length);
  composition[column] = 1;
  const key = COMPONENTS[component];
  return { key, charge: chargeOf(key), composition, mask: 1 << column };
});

/** Composition of the defined key from the composition of everything else in its reaction. */
function compose(row: ConstantRow, term: string, known: ReadonlyMap<string, Entry>): Entry {
  const coefficients = parseReaction(row.reaction);
  const own = coefficients.get(term);
  if (own === undefined) throw new Error(`${row.key} is not in its own reaction`);
  const composition = new Float64Array(COMPONENT_KEYS.length);
  for (const [key, coefficient] of coefficients) {
    if (key === term || key === 'H2O') continue;
    const part = known.get(key);
    if (part === undefined) throw new Error(`${row.key} is defined before ${key}`);
    part.composition.forEach((count, column) => {
      composition[column] = (composition[column] ?? 0) - (coefficient / own) * count;
    });
  }
  const mask = composition.reduce((bits, n, column) => (n === 0 ? bits : bits | (1 << column)), 0);
  return { key: row.key, charge: chargeOf(row.key), composition, mask, row, coefficients };
}

function composeAqueous(): readonly Entry[] {
  const known = new Map(basisEntries.map((entry) => [entry.key, entry]));
  for (const row of AQUEOUS_ROWS) known.set(row.key, compose(row, row.key, known));
  return [...known.values()];
}

/** Every dissolved species: the basis species first, then in the order their rows build on each other. */
export const SPECIES: readonly Entry[] = composeAqueous();

export const SPECIES_BY_KEY: ReadonlyMap<string, Entry> = new Map(SPECIES.map((e) => [e.key, e]));

/** Formula of a solid: the first term of its dissolution reaction. */
export const solidFormula = (row: ConstantRow): string => {
  const first = parseReaction(row.reaction).keys().next().value;
  if (first === undefined) throw new Error(`${row.key} has no formula`);
  return first;
};

export const SOLIDS: readonly Entry[] = SOLID_ROWS.map((row) =>
  compose(row, solidFormula(row), SPECIES_BY_KEY),
);

export const SOLIDS_BY_KEY: ReadonlyMap<string, Entry> = new Map(SOLIDS.map((e) => [e.key, e]));

export const CONSTANT_ROWS: readonly ConstantRow[] = [...AQUEOUS_ROWS, ...SOLID_ROWS, ...GASES];

/** Changes whenever any constant, reaction, ion size or source changes. */
export const CONSTANTS_HASH: string = fnv1a64(
  JSON.stringify([COMPONENTS, CONSTANT_ROWS, ION_SIZES, SOURCES]),
);
