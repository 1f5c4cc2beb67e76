import { ATOMIC_WEIGHTS, isElement, type Element } from './elements';

/** Coefficients by key: products positive, reactants negative. The solvent is left in under `H2O`. */
export type Coefficients = ReadonlyMap<string, number>;

/** Reads `2H+ + CO3-- = H2O + CO2` into signed coefficients. Throws on a row that is not one equation: a defect here. */
export function parseReaction(reaction: string): Coefficients {
  const sides = reaction.split(' = ');
  const [left, right] = sides;
  if (sides.length !== 2 || left === undefined || right === undefined) {
    throw new Error(`Not one equation: ${reaction}`);
  }
  const coefficients = new Map<string, number>();
  const take = (side: string, sign: number) => {
    for (const term of side.split(' + ')) {
      const parts = /^(\d*)(.+)$/.exec(term.trim());
      const key = parts?.[2];
      if (key === undefined) throw new Error(`Empty term: ${reaction}`);
      const count = parts?.[1] ? Number(parts[1]) : 1;
      coefficients.set(key, (coefficients.get(key) ?? 0) + sign * count);
    }
  };
  take(left, -1);
  take(right, 1);
  return coefficients;
}

/** Charge number written at the end of a key: `CO3--` is −2, `Fe+++` is 3. */
export function chargeOf(key: string): number {
  const sign = /([+-]+)$/.exec(key)?.[1];
  if (sign === undefined) return 0;
  return sign.startsWith('+') ? sign.length : -sign.length;
}

/** Atoms in a key such as `Ca5(PO4)3OH` or `CaSO4.2H2O`; null when it holds an unknown symbol. */
export function atomsIn(key: string): ReadonlyMap<Element, number> | null {
  const formula = key.replace(/[+-]+$/, '').replace(/\((aq|g)\)$/, '');
  const atoms = new Map<Element, number>();
  for (const part of formula.split('.')) {
    const multiple = /^(\d*)(.*)$/.exec(part);
    const times = multiple?.[1] ? Number(multiple[1]) : 1;
    if (!countAtoms(multiple?.[2] ?? '', times, atoms)) return null;
  }
  return atoms;
}

function countAtoms(formula: string, times: number, atoms: Map<Element, number>): boolean {
  const token = /\(([^()]*)\)(\d*)|([A-Z][a-z]?)(\d*)/y;
  while (token.lastIndex < formula.length) {
    const found = token.exec(formula);
    if (found === null) return false;
    const [, group, groupCount, symbol, count] = found;
    if (group !== undefined) {
      if (!countAtoms(group, times * Number(groupCount || 1), atoms)) return false;
    } else if (symbol !== undefined && isElement(symbol)) {
      atoms.set(symbol, (atoms.get(symbol) ?? 0) + times * Number(count || 1));
    } else {
      return false;
    }
  }
  return true;
}

/** Molar mass of a formula in g/mol from the atomic weights. Throws on an unknown symbol: a defect in the tables. */
export function molarMassGMol(key: string): number {
  const atoms = atomsIn(key);
  if (atoms === null) throw new Error(`Not a formula: ${key}`);
  let mass = 0;
  for (const [element, count] of atoms) mass += ATOMIC_WEIGHTS[element] * count;
  return mass;
}

const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const raise = (n: number) => [...String(n)].map((d) => SUPERSCRIPTS[Number(d)] ?? d).join('');

/** A key as it is printed: `HCO3-` becomes HCO₃⁻, `Ca++` becomes Ca²⁺, `CaSO4.2H2O` becomes CaSO₄·2H₂O. */
export function formatSpecies(key: string): string {
  const charge = chargeOf(key);
  const body = key
    .replace(/[+-]+$/, '')
    .replace(/(?<=[A-Za-z)])\d+/g, (digits) =>
      [...digits].map((d) => SUBSCRIPTS[Number(d)] ?? d).join(''),
    )
    .replace(/\./g, '·');
  if (charge === 0) return body;
  const size = Math.abs(charge) === 1 ? '' : raise(Math.abs(charge));
  return `${body}${size}${charge > 0 ? '⁺' : '⁻'}`;
}

/** A reaction as it is printed, with a double arrow. */
export function formatReaction(reaction: string): string {
  const side = (text: string) =>
    text
      .split(' + ')
      .map((term) => {
        const [, count = '', key = ''] = /^(\d*)(.+)$/.exec(term.trim()) ?? [];
        return `${count === '' ? '' : `${count} `}${formatSpecies(key)}`;
      })
      .join(' + ');
  return reaction.split(' = ').map(side).join(' ⇌ ');
}
