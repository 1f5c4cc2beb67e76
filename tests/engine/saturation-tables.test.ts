import { describe, expect, it } from 'vitest';
import { riverWater, spread, waterOf } from './support';
import { emptyTable, fillCoefficients, fillTable } from '@/lib/engine/activity/coefficients';
import { classOf } from '@/lib/engine/activity/ion-class';
import { debyeHuckelAt } from '@/lib/engine/activity/water-properties';
import { CONSTANT_ROWS } from '@/lib/engine/constants/table';
import { logKAt } from '@/lib/engine/constants/temperature';
import { indicesOf } from '@/lib/engine';
import published from './published/saturation-tables.json';

const logK = (key: string, temperatureC: number): number => {
  const row = CONSTANT_ROWS.find((candidate) => candidate.key === key);
  return row ? logKAt(row, temperatureC) : NaN;
};

/** pHs − pCa − pAlk with the engine's constants and activity coefficients. */
function engineC(temperatureC: number, ionic: number): number {
  const groups = [classOf('Ca++', 2), classOf('HCO3-', -1)];
  const lnGamma = new Float64Array(2);
  const table = emptyTable(2);
  fillTable(groups, debyeHuckelAt(temperatureC), table);
  fillCoefficients(table, ionic, lnGamma, new Float64Array(2));
  const activities = ((lnGamma[0] ?? NaN) + (lnGamma[1] ?? NaN)) / Math.LN10;
  return -logK('CO3--', temperatureC) + logK('calcite', temperatureC) - activities;
}

describe('the printed Langelier C constants', () => {
  const { temps_C: celsius, rows_I_TDS_C: rows } = published.langelier_C_constants;
  const samples = rows.flatMap(([ionic, , values]) =>
    (values as number[]).map((printed, i) => ({
      ionic: ionic as number,
      temperatureC: celsius[i] ?? NaN,
      printed,
    })),
  );

  it('lie above the engine by what older constants explain, never by more than 0.4', () => {
    // The printed table rests on constants of the 1940s: pK2 − pKs is 0.06 to 0.2 higher, and its salt correction
    // rises faster than any Debye–Hückel form below 0.002 mol/kg.
    const gaps = samples.map((s) => s.printed - engineC(s.temperatureC, s.ionic));
    expect(spread(gaps).worst).toBeLessThan(0.4);
    expect(spread(gaps).mean).toBeLessThan(0.25);
  });

  it('fall with temperature like the engine’s own, within 0.2 from 10 to 60 °C', () => {
    for (const [ionic, , values] of rows) {
      const printed = (values as number[])[1] ?? NaN;
      const printedEnd = (values as number[])[6] ?? NaN;
      const fall = engineC(10, ionic as number) - engineC(60, ionic as number);
      expect(Math.abs(printed - printedEnd - fall)).toBeLessThan(0.2);
    }
  });

  it('are all compared', () => {
    expect(samples).toHaveLength(150);
  });
});

it('the A of Standard Methods 2330 is the engine’s within 0.003 to 50 °C (from memory)', () => {
  const { T_C: celsius, A } = published.sm2330B.table;
  celsius.forEach((temperatureC, i) => {
    if (temperatureC > 50) return;
    expect(Math.abs(debyeHuckelAt(temperatureC).a - (A[i] ?? NaN))).toBeLessThan(0.003);
  });
});

it('the saturation pH is pCa + pAlk + C', () => {
  const water = waterOf(riverWater);
  const free = water.speciesMolKg['Ca++'] ?? NaN;
  const alkalinity = water.alkalinityMgLCaCO3 / 50_043;
  const c = engineC(water.temperatureC, water.ionicStrengthMolKg);
  expect(indicesOf(water).saturationPH).toBeCloseTo(
    -Math.log10(free) - Math.log10(alkalinity) + c,
    6,
  );
});
