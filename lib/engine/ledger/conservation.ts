/**
 * What a set of reactions conserves. Every reaction is made to define one species (its own), so that the others, the
 * basis, carry all amounts: amount of own species s counts `share[s][b]` of each basis species b.
 */
export interface Conservation {
  readonly species: readonly string[];
  /** Index of the species each reaction defines. */
  readonly own: readonly number[];
  readonly basis: readonly number[];
  /** Row per species, column per basis species. */
  readonly share: readonly (readonly number[])[];
  /** ln of each species' activity over the basis' at equilibrium. */
  readonly lnFormation: readonly number[];
}

/** Below this a coefficient left by elimination is rounding. */
const ROUNDING = 1e-9;

/**
 * Eliminates one species per reaction (Gauss–Jordan with the largest coefficient as pivot). null when the reactions are
 * not independent.
 */
export function conservationOf(
  species: readonly string[],
  coefficients: readonly (readonly number[])[],
  lnK: readonly number[],
): Conservation | null {
  const rows = coefficients.map((row) => [...row]);
  const logs = [...lnK];
  const own: number[] = [];
  for (let r = 0; r < rows.length; r++) {
    const row = rows[r] ?? [];
    let pivot = -1;
    let size = ROUNDING;
    row.forEach((c, s) => {
      if (!own.includes(s) && Math.abs(c) > size) {
        size = Math.abs(c);
        pivot = s;
      }
    });
    if (pivot < 0) return null;
    own.push(pivot);
    const scale = row[pivot] ?? 1;
    rows[r] = row.map((c) => c / scale);
    logs[r] = (logs[r] ?? 0) / scale;
    rows.forEach((other, k) => {
      const factor = other[pivot] ?? 0;
      if (k === r || factor === 0) return;
      rows[k] = other.map((c, s) => tidy(c - factor * (rows[r]?.[s] ?? 0)));
      logs[k] = (logs[k] ?? 0) - factor * (logs[r] ?? 0);
    });
  }
  const basis = species.map((_, s) => s).filter((s) => !own.includes(s));
  const share = species.map((_, s) => {
    const r = own.indexOf(s);
    // own + Σ c·basis = 0 in the reaction, so one mole of it is made from −c of each.
    return basis.map((b) => (r < 0 ? (s === b ? 1 : 0) : -(rows[r]?.[b] ?? 0)));
  });
  const lnFormation = species.map((_, s) => {
    const r = own.indexOf(s);
    return r < 0 ? 0 : (logs[r] ?? 0);
  });
  return { species, own, basis, share, lnFormation };
}

const tidy = (c: number): number => (Math.abs(c) < ROUNDING ? 0 : c);
