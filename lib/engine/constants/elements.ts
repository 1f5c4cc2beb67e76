/** Standard atomic weights, g/mol (IUPAC abridged values, as in the project's conversion factors). */
export const ATOMIC_WEIGHTS = {
  H: 1.008,
  B: 10.81,
  C: 12.011,
  N: 14.007,
  O: 15.999,
  F: 18.998,
  Na: 22.99,
  Mg: 24.305,
  Al: 26.982,
  Si: 28.085,
  P: 30.974,
  S: 32.06,
  Cl: 35.45,
  K: 39.098,
  Ca: 40.078,
  Mn: 54.938,
  Fe: 55.845,
  Cu: 63.546,
  Zn: 65.38,
  Sr: 87.62,
  Ba: 137.327,
  Pb: 207.2,
} as const satisfies Readonly<Record<string, number>>;

export type Element = keyof typeof ATOMIC_WEIGHTS;

export const isElement = (symbol: string): symbol is Element => symbol in ATOMIC_WEIGHTS;
