import type { ConstantRow } from './row';

export const ZERO_CELSIUS_K = 273.15;
/** Gas constant, kJ mol⁻¹ K⁻¹ (CODATA 2018, exact). */
export const GAS_CONSTANT_KJ = 8.31446261815324e-3;
const STANDARD_K = 298.15;

/** log10 K of a row at a temperature: its expression, else van 't Hoff, else its value at 25 °C. */
export function logKAt(row: ConstantRow, temperatureC: number): number {
  const kelvin = temperatureC + ZERO_CELSIUS_K;
  if (row.analytic) {
    const [a, b, c, d, e] = row.analytic;
    return a + b * kelvin + c / kelvin + d * Math.log10(kelvin) + e / (kelvin * kelvin);
  }
  if (row.deltaHKJMol !== undefined) {
    const slope = row.deltaHKJMol / (GAS_CONSTANT_KJ * Math.LN10);
    return row.logK25 + slope * (1 / STANDARD_K - 1 / kelvin);
  }
  return row.logK25;
}
