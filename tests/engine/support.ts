import { solveWater, type Water, type WaterAnalysis } from '@/lib/engine';

/** A river water with every major ion, pH and alkalinity given. Invented. */
export const riverWater: WaterAnalysis = {
  temperatureC: 12,
  pH: 7.7,
  alkalinityMgLCaCO3: 92,
  analytesMgL: {
    calcium: 38,
    magnesium: 7.2,
    sodium: 14,
    potassium: 2.4,
    chloride: 21,
    sulfate: 29,
    nitrate: 6,
    fluoride: 0.2,
    silica: 7,
    phosphate: 0.05,
    ammonia: 0.1,
    boron: 0.03,
  },
};

/** A soft upland water. Invented. */
export const softWater: WaterAnalysis = {
  temperatureC: 6,
  pH: 6.6,
  alkalinityMgLCaCO3: 11,
  analytesMgL: { calcium: 4, magnesium: 1, sodium: 5, chloride: 7, sulfate: 4 },
};

/** A hard groundwater. Invented. */
export const hardWater: WaterAnalysis = {
  temperatureC: 11,
  pH: 7.1,
  alkalinityMgLCaCO3: 310,
  analytesMgL: {
    calcium: 118,
    magnesium: 26,
    sodium: 22,
    potassium: 3,
    chloride: 34,
    sulfate: 71,
    nitrate: 12,
    silica: 14,
    strontium: 0.4,
    iron: 0.3,
    manganese: 0.1,
  },
};

/** The water of an analysis that must be solvable. */
export function waterOf(analysis: WaterAnalysis): Water {
  const solved = solveWater(analysis);
  if (!solved.ok) throw new Error(solved.message);
  return solved.water;
}

/** The value of a result that must not be a refusal. */
export function accepted<T extends { readonly ok: boolean }>(result: T): Extract<T, { ok: true }> {
  if (!result.ok) throw new Error(`Refused: ${JSON.stringify(result)}`);
  return result as Extract<T, { ok: true }>;
}

/** Mean and worst of a list of deviations. */
export function spread(deviations: readonly number[]): {
  readonly mean: number;
  readonly worst: number;
} {
  const sizes = deviations.map(Math.abs);
  return {
    mean: sizes.reduce((sum, size) => sum + size, 0) / sizes.length,
    worst: Math.max(...sizes),
  };
}
