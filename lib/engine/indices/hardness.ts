import { CACO3_MG_PER_MOL } from '../constants/carbonate-equivalents';
import type { Water } from '../types';

export interface Hardness {
  readonly total: number;
  readonly carbonate: number;
  readonly nonCarbonate: number;
}

/** Calcium and magnesium as mg/L CaCO3; the carbonate part is what the alkalinity covers (Standard Methods 2340 B). */
export function hardnessOf(water: Water): Hardness {
  const moles = (water.totalsMolKg['Ca'] ?? 0) + (water.totalsMolKg['Mg'] ?? 0);
  const total = moles * CACO3_MG_PER_MOL;
  const carbonate = Math.min(total, Math.max(water.alkalinityMgLCaCO3, 0));
  return { total, carbonate, nonCarbonate: total - carbonate };
}
