import type { SourceKey } from './sources';

/** A, B, C, D, E of log10 K = A + B·T + C/T + D·log10 T + E/T², T in kelvin. */
export type Analytic = readonly [number, number, number, number, number];

/** One constant: the reaction it belongs to, its value, how it moves with temperature, where it holds, who published it. */
export interface ConstantRow {
  /** The species, solid or gas the row defines. */
  readonly key: string;
  /** Balanced reaction in words of other keys; `H2O` is the solvent. */
  readonly reaction: string;
  readonly logK25: number;
  readonly deltaHKJMol?: number;
  readonly analytic?: Analytic;
  readonly rangeC: readonly [number, number];
  readonly source: SourceKey;
  /** `read`: seen in print or on a public page; `recalled`: from memory, cross-checked in the tests where it can be. */
  readonly obtained: 'read' | 'recalled';
  readonly note?: string;
}

type More = Partial<Pick<ConstantRow, 'obtained' | 'note' | 'deltaHKJMol' | 'rangeC'>>;

const base = { obtained: 'recalled' } as const;

/** A row with a published temperature expression. */
export const byExpression = (
  key: string,
  reaction: string,
  logK25: number,
  expression: Analytic,
  source: SourceKey,
  more: More = {},
): ConstantRow => ({
  ...base,
  key,
  reaction,
  logK25,
  analytic: expression,
  rangeC: [0, 90],
  source,
  ...more,
});

/** A row moved by a constant enthalpy (van 't Hoff), which holds within 0.05 log units some 35 K either side of 25 °C. */
export const byEnthalpy = (
  key: string,
  reaction: string,
  logK25: number,
  deltaHKJMol: number,
  source: SourceKey,
  more: More = {},
): ConstantRow => ({
  ...base,
  key,
  reaction,
  logK25,
  deltaHKJMol,
  rangeC: [0, 60],
  source,
  ...more,
});

/** A row known at 25 °C only; used unchanged elsewhere, and said so when it matters outside its range. */
export const at25 = (
  key: string,
  reaction: string,
  logK25: number,
  source: SourceKey,
  more: More = {},
): ConstantRow => ({ ...base, key, reaction, logK25, rangeC: [15, 35], source, ...more });
