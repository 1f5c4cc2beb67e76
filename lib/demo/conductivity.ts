import type { QuantityKey } from '@/lib/samples/quantities';

interface Carrier {
  readonly mgPerMeq: number;
  readonly charge: number;
  /** Limiting equivalent conductance at 25 °C, S·cm²/eq: handbook values, from memory. */
  readonly conductance: number;
}

/** Alkalinity is taken as bicarbonate, as it nearly all is below pH 9. */
const CARRIERS: Partial<Record<QuantityKey, Carrier>> = {
  calcium: { mgPerMeq: 20.039, charge: 2, conductance: 59.5 },
  magnesium: { mgPerMeq: 12.1525, charge: 2, conductance: 53.1 },
  sodium: { mgPerMeq: 22.99, charge: 1, conductance: 50.1 },
  potassium: { mgPerMeq: 39.098, charge: 1, conductance: 73.5 },
  alkalinity: { mgPerMeq: 50.043, charge: 1, conductance: 44.5 },
  chloride: { mgPerMeq: 35.45, charge: 1, conductance: 76.3 },
  sulfate: { mgPerMeq: 48.03, charge: 2, conductance: 80 },
  nitrate: { mgPerMeq: 62.004, charge: 1, conductance: 71.4 },
};

/** Conductivity at 25 °C of a water's major ions, µS/cm. */
export function conductivityUsPerCm(values: Partial<Record<QuantityKey, number>>): number {
  const carried = (Object.entries(CARRIERS) as [QuantityKey, Carrier][]).map(([key, carrier]) => ({
    ...carrier,
    meqPerL: (values[key] ?? 0) / carrier.mgPerMeq,
  }));
  const ionicStrength =
    carried.reduce((sum, { meqPerL, charge }) => sum + meqPerL * charge, 0) / 2000;
  const root = Math.sqrt(ionicStrength);
  // Onsager's limiting law at 25 °C, ion by ion; its two constants from memory.
  return carried.reduce(
    (sum, { meqPerL, charge, conductance }) =>
      sum + meqPerL * (conductance - charge * (30.2 + 0.229 * conductance) * root),
    0,
  );
}
