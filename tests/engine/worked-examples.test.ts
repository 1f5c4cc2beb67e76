import { describe, expect, it } from 'vitest';
import { accepted, waterOf } from './support';
import { solveWater, type Water, type WaterAnalysis } from '@/lib/engine';
import { findRoot } from '@/lib/engine/numeric/root';
import published from './published/worked-examples.json';

/** mg/L as CaCO3 of one eq/L, mg/L of one mol/L. */
const CACO3 = 50_043;
const CARBON = 12_011;
const AIR_ATM = 10 ** -3.5;

const at25 = (
  rest: Omit<WaterAnalysis, 'temperatureC' | 'analytesMgL'>,
  sodiumM = 0,
  potassiumM = 0,
) =>
  waterOf({
    temperatureC: 25,
    analytesMgL: { sodium: sodiumM * 22_990, potassium: potassiumM * 39_098 },
    ...rest,
  });

/** Calcite in equilibrium with air: alkalinity twice the calcium, found so that the index is zero. */
function calciteInAir(): Water {
  const waterWith = (calciumM: number) =>
    accepted(
      solveWater({
        temperatureC: 25,
        alkalinityMgLCaCO3: 2 * calciumM * CACO3,
        carbonDioxideAtm: AIR_ATM,
        analytesMgL: { calcium: calciumM * 40_078 },
      }),
    ).water;
  const index = (calciumM: number) => waterWith(calciumM).saturationIndex['calcite'] ?? NaN;
  const bracket = { a: 1e-4, fa: index(1e-4), b: 2e-3, fb: index(2e-3) };
  const root = findRoot(index, bracket, 1e-9);
  if (!root.ok) throw new Error(root.reason);
  return waterWith(root.x);
}

/**
 * The printed answers were made with textbook constants (pK1 6.3, pK2 10.3, no activities) and rounded to 0.1: the
 * engine's own constants move pH by up to 0.1 more.
 */
const TEXTBOOK = 0.12;

const examples: Readonly<
  Record<string, readonly [label: string, found: () => number, tolerance: number][]>
> = {
  C1: [
    ['pH', () => at25({ alkalinityMgLCaCO3: 25, inorganicCarbonMgLC: 0 }, 5e-4).pH, TEXTBOOK],
    [
      'alk_mg_L_CaCO3',
      () => at25({ pH: 10.6805, inorganicCarbonMgLC: 0 }, 5e-4).alkalinityMgLCaCO3,
      0.5,
    ],
  ],
  C3: [
    ['pH', () => bicarbonate().pH, TEXTBOOK],
    ['pCO2_atm', () => bicarbonate().carbonDioxideAtm, 0.6e-5],
  ],
  C4: [['pH', () => at25({ alkalinityMgLCaCO3: -50.043, inorganicCarbonMgLC: 0 }).pH, 0.05]],
  C5: [
    ['pH', () => at25({ alkalinityMgLCaCO3: 25, carbonDioxideAtm: AIR_ATM }, 5e-4).pH, TEXTBOOK],
  ],
  C7: [
    [
      'pH',
      () => at25({ alkalinityMgLCaCO3: 2.5, carbonDioxideAtm: AIR_ATM }, 0, 5e-5).pH,
      TEXTBOOK,
    ],
  ],
  // Read off a diagram; pure bicarbonate is at 8.3.
  C9: [
    [
      'pH',
      () => at25({ alkalinityMgLCaCO3: 25, inorganicCarbonMgLC: 5e-4 * CARBON }, 5e-4).pH,
      0.3,
    ],
  ],
  // Recalled from memory.
  C14: [['pH', () => at25({ alkalinityMgLCaCO3: 0, carbonDioxideAtm: AIR_ATM }).pH, 0.02]],
  C15: [
    ['pH', () => calciteInAir().pH, 0.05],
    ['Ca_M', () => calciteInAir().totalsMolKg['Ca'] ?? NaN, 0.6e-4],
    ['HCO3_M', () => calciteInAir().speciesMolKg['HCO3-'] ?? NaN, 0.6e-4],
  ],
  S6: [
    ['Ca_as_CaCO3', () => 80 * (100.086 / 40.078), 0.5],
    [
      'TH',
      () => {
        const water = waterOf({
          temperatureC: 25,
          pH: 7.5,
          alkalinityMgLCaCO3: 200,
          analytesMgL: { calcium: 80, magnesium: 45 },
        });
        const moles = (water.totalsMolKg['Ca'] ?? 0) + (water.totalsMolKg['Mg'] ?? 0);
        return moles * 100_086;
      },
      // The printed sum adds rounded parts.
      1.5,
    ],
  ],
  S8: [
    [
      'OH_as_CaCO3',
      () => (at25({ pH: 9, inorganicCarbonMgLC: 0 }).speciesMolKg['OH-'] ?? NaN) * CACO3,
      0.01,
    ],
  ],
};

function bicarbonate(): Water {
  return at25({ alkalinityMgLCaCO3: 2.5022, inorganicCarbonMgLC: 5e-5 * CARBON }, 0, 5e-5);
}

const printedAnswer = (answers: object, label: string): number => {
  const value: unknown = Object.entries(answers).find(([key]) => key === label)?.[1];
  return typeof value === 'number' ? value : NaN;
};

describe('worked examples', () => {
  const rows = published.examples.flatMap((example) =>
    (examples[example.id] ?? []).map(([label, found, tolerance]) => ({
      id: example.id,
      label,
      printed: printedAnswer(example.answers, label),
      found,
      tolerance,
    })),
  );

  it.each(rows)('$id: $label is $printed', ({ printed, found, tolerance }) => {
    expect(Math.abs(found() - printed)).toBeLessThanOrEqual(tolerance);
  });

  it('leaves out no example of those copied', () => {
    expect(published.examples.map((example) => example.id)).toEqual(Object.keys(examples));
  });
});
