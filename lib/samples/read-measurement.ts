import type { Qualifier } from './solve-sample';

/** What a person wrote in a result's field, understood or explained. */
export type Measurement =
  | { readonly kind: 'empty' }
  | {
      readonly kind: 'value';
      readonly value: number;
      readonly qualifier: Qualifier;
      readonly text: string;
    }
  | { readonly kind: 'problem'; readonly message: string };

const SIGNS: readonly (readonly [RegExp, Qualifier])[] = [
  [/^(?:<|nd\s*<)\s*/i, '<'],
  [/^>\s*/, '>'],
  [/^n\.?d\.?\s+/i, 'nd'],
  [/^(?:e|≈|~)\s*(?=[\d.])/i, 'e'],
];

const DECIMAL = /^[+-]?(?:\d+\.?\d*|\.\d+)$/;

/**
 * Reads one figure as typed or pasted: "7.10", "<0.05", "ND 0.01". The decimal mark is the point; a comma is never
 * guessed at, because "1,234" means different numbers to different people. The figures stay as typed.
 */
export function readMeasurement(typed: string, chosen: Qualifier = ''): Measurement {
  const trimmed = typed.trim().replaceAll('\u2212', '-').replaceAll('\u00a0', ' ');
  if (trimmed === '') return { kind: 'empty' };
  const sign = SIGNS.find(([pattern]) => pattern.test(trimmed));
  const text = sign === undefined ? trimmed : trimmed.replace(sign[0], '').trim();
  const qualifier = sign === undefined ? chosen : sign[1];
  if (text === '' || text === '-' || text === '+' || text === '.') {
    return {
      kind: 'problem',
      message: `“${typed.trim()}” has no figures yet. Write the number after it.`,
    };
  }
  if (text.includes(',')) return { kind: 'problem', message: commaMessage(text) };
  if (!DECIMAL.test(text)) {
    return {
      kind: 'problem',
      message: `“${typed.trim()}” is not a number. Write figures with a decimal point, such as 7.10 or <0.05.`,
    };
  }
  const value = Number(text);
  if (!Number.isFinite(value)) {
    return { kind: 'problem', message: `“${typed.trim()}” is too large to be a measured value.` };
  }
  return { kind: 'value', value, qualifier, text };
}

function commaMessage(text: string): string {
  const asDecimal = text.replace(',', '.');
  if (/^[+-]?\d+,\d{3}$/.test(text)) {
    return `“${text}” can be read two ways. Write ${text.replace(',', '')} or ${asDecimal}, with a point for decimals.`;
  }
  return DECIMAL.test(asDecimal)
    ? `Use a point for decimals here: ${asDecimal}, not “${text}”.`
    : `“${text}” has more than one comma. Write one number with a decimal point.`;
}
