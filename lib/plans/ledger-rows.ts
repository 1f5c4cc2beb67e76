/** A ledger line as it is written: all three figures on one rounding, so that before + change = at equilibrium. */
export interface WrittenRow {
  readonly before: number;
  readonly change: number;
  readonly equilibrium: number;
  readonly decimals: number;
}

/** Rounds before and equilibrium, and takes the change between what is written, so the printed sum always closes. */
export function writeRow(before: number, equilibrium: number, decimals: number): WrittenRow {
  const scale = 10 ** decimals;
  const first = Math.round(before * scale);
  const last = Math.round(equilibrium * scale);
  return {
    before: first / scale,
    change: (last - first) / scale,
    equilibrium: last / scale,
    decimals,
  };
}

/** Decimals that give the larger of two amounts `digits` significant figures, between 0 and 8. */
export function sharedDecimals(before: number, equilibrium: number, digits = 4): number {
  const largest = Math.max(Math.abs(before), Math.abs(equilibrium));
  if (largest === 0) return 0;
  return Math.min(8, Math.max(0, digits - 1 - Math.floor(Math.log10(largest))));
}
