import { ZERO_CELSIUS_K } from '../constants/temperature';

/** Density of air-free water at 1 atm, kg/m³, 0–100 °C. Kell 1975, J. Chem. Eng. Data 20, 97, eq. 16. */
export function waterDensityKgM3(temperatureC: number): number {
  const t = temperatureC;
  const numerator =
    999.83952 +
    t *
      (16.945176 +
        t * (-7.9870401e-3 + t * (-46.170461e-6 + t * (105.56302e-9 + t * -280.54253e-12))));
  return numerator / (1 + 16.87985e-3 * t);
}

/** Relative permittivity of water, 0–100 °C. Malmberg & Maryott 1956, J. Res. NBS 56, 1. */
export function waterPermittivity(temperatureC: number): number {
  const t = temperatureC;
  return 87.74 + t * (-0.40008 + t * (9.398e-4 + t * -1.41e-6));
}

export interface DebyeHuckel {
  /** kg^½ mol^−½, base 10. */
  readonly a: number;
  /** kg^½ mol^−½ Å⁻¹. */
  readonly b: number;
}

/** Debye–Hückel limiting slope A and B on the molal scale (Truesdell & Jones 1974, J. Res. USGS 2, 233, eq. 9 and 10). */
export function debyeHuckelAt(temperatureC: number): DebyeHuckel {
  const density = waterDensityKgM3(temperatureC) / 1000;
  const product = waterPermittivity(temperatureC) * (temperatureC + ZERO_CELSIUS_K);
  return {
    a: (1.82483e6 * Math.sqrt(density)) / (product * Math.sqrt(product)),
    b: (50.2916 * Math.sqrt(density)) / Math.sqrt(product),
  };
}
