/** What stands in the place of the hydrogen row and of the carbon row. */
export type Row = 'alkalinity' | 'carbon' | 'held';

export interface Problem {
  /** Row of H+: the alkalinity balance, the carbon balance (CO2 pressure given too), or pH held. */
  readonly hydrogenRow: Row;
  /** Row of inorganic carbon: its own balance, the alkalinity balance (pH given too), or CO2 pressure held. */
  readonly carbonRow: Row;
}
