import { describe, expect, it } from 'vitest';
import { emptyTable, fillCoefficients, fillTable } from '@/lib/engine/activity/coefficients';
import type { IonClass } from '@/lib/engine/activity/ion-class';
import {
  debyeHuckelAt,
  waterDensityKgM3,
  waterPermittivity,
} from '@/lib/engine/activity/water-properties';
import published from './published/activity-density.json';

describe('density of water', () => {
  it.each(Object.entries(published.water_density.check_values_kg_m3.values))(
    'at %s °C is the published value to 0.01 kg/m³ (from memory)',
    (celsius, density) => {
      expect(Math.abs(waterDensityKgM3(Number(celsius)) - density)).toBeLessThan(0.011);
    },
  );
});

it('permittivity at 25 °C lies between the two published values (from memory)', () => {
  const [low = NaN, high = NaN] = published.permittivity['25C'].values;
  expect(waterPermittivity(25)).toBeGreaterThan(low - 0.01);
  expect(waterPermittivity(25)).toBeLessThan(high);
});

describe('Debye–Hückel slopes', () => {
  const tables = [
    ['Freeze & Cherry 1979', published.debye_huckel.freeze_cherry_1979, 60, 0.006, 0.002],
    ['Helgeson & Kirkham 1974', published.debye_huckel.helgeson_kirkham_1974, 75, 0.006, 0.002],
    // Volume basis: A is some 0.2 to 0.4 % larger than on the molal scale in cold water.
    [
      'Robinson & Stokes, from memory',
      published.debye_huckel['robinson_stokes_appendix_7.1'],
      40,
      0.004,
      0.0015,
    ],
  ] as const;
  it.each(tables)('agree with %s', (_, table, upTo, toleranceA, toleranceB) => {
    let compared = 0;
    table.T_C.forEach((temperatureC, i) => {
      if (temperatureC > upTo) return;
      compared++;
      const { a, b } = debyeHuckelAt(temperatureC);
      expect(Math.abs(a - (table.A[i] ?? NaN)), `A ${temperatureC}`).toBeLessThan(toleranceA);
      expect(Math.abs(b - (table.B[i] ?? NaN)), `B ${temperatureC}`).toBeLessThan(toleranceB);
    });
    expect(compared).toBeGreaterThanOrEqual(4);
  });
});

const tableOf = (group: IonClass) => {
  const table = emptyTable(1);
  fillTable([group], debyeHuckelAt(25), table);
  return table;
};

const coefficientOf = (group: IonClass, ionic: number): number => {
  const lnGamma = new Float64Array(1);
  fillCoefficients(tableOf(group), ionic, lnGamma, new Float64Array(1));
  return Math.exp(lnGamma[0] ?? NaN);
};

describe('single-ion activity coefficients', () => {
  const { ionic_strengths: strengths, ...charges } = published.kielland_activity_coefficients;
  const rows = ([1, 2, 3] as const).flatMap((charge) =>
    Object.entries(charges[`charge${charge}`]).map(([a, values]) => ({ charge, a, values })),
  );

  it.each(rows)(
    'charge $charge, size $a Å follow Kielland within 0.013',
    ({ charge, a, values }) => {
      const group: IonClass = {
        kind: 'extended',
        chargeSquared: charge * charge,
        aAngstrom: Number(a),
        b: 0,
      };
      values.forEach((value, i) => {
        expect(Math.abs(coefficientOf(group, strengths[i] ?? NaN) - value)).toBeLessThan(0.013);
      });
    },
  );

  it('drops no published row', () => {
    expect(rows.flatMap((row) => row.values)).toHaveLength(88);
  });

  const groups: readonly IonClass[] = [
    { kind: 'neutral' },
    { kind: 'davies', chargeSquared: 4 },
    { kind: 'extended', chargeSquared: 4, aAngstrom: 5, b: 0.165 },
  ];
  it.each(groups)('$kind: the slope is the derivative', (group) => {
    const slope = new Float64Array(1);
    fillCoefficients(tableOf(group), 0.05, new Float64Array(1), slope);
    const step = 1e-6;
    const rise =
      Math.log(coefficientOf(group, 0.05 + step)) - Math.log(coefficientOf(group, 0.05 - step));
    expect(slope[0]).toBeCloseTo(rise / (2 * step), 5);
  });
});
