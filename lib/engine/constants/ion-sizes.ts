import type { SourceKey } from './sources';

/** Ion-size parameter a in ångström and b in kg/mol of log γ = −A z² √I / (1 + B a √I) + b I. */
export interface IonSize {
  readonly aAngstrom: number;
  readonly b: number;
  readonly source: SourceKey;
}

const truesdellJones = (aAngstrom: number, b: number): IonSize => ({
  aAngstrom,
  b,
  source: 'truesdellJones1974',
});
const kielland = (aAngstrom: number): IonSize => ({ aAngstrom, b: 0, source: 'kielland1937' });

/** Published parameters (recalled); every other ion uses the Davies equation with 0.3. */
export const ION_SIZES: Readonly<Record<string, IonSize>> = {
  'Ca++': truesdellJones(5.0, 0.165),
  'Mg++': truesdellJones(5.5, 0.2),
  'Na+': truesdellJones(4.0, 0.075),
  'K+': truesdellJones(3.5, 0.015),
  'Cl-': truesdellJones(3.5, 0.015),
  'SO4--': truesdellJones(5.0, -0.04),
  'HCO3-': truesdellJones(5.4, 0.0),
  'CO3--': truesdellJones(5.4, 0.0),
  'H+': kielland(9.0),
  'OH-': kielland(3.5),
};
