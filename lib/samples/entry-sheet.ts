import type { QuantityKey } from './quantities';

/** One line of the entry form: the quantity as this point writes it, what it last was and what it usually is. */
export interface EntryField {
  readonly quantity: QuantityKey;
  readonly label: string;
  readonly unit: string;
  readonly decimals: number;
  readonly usualLow: number | null;
  readonly usualHigh: number | null;
  readonly last: { readonly text: string; readonly age: string } | null;
}

export interface EntrySheet {
  readonly points: readonly { readonly slug: string; readonly name: string }[];
  readonly pointSlug: string;
  readonly pointName: string;
  readonly takenAtLocal: string;
  readonly fields: readonly EntryField[];
}
