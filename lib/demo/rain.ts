import { yearlyWave } from './season';
import type { Random } from './random';

/** Early December in this invented region is the wettest time of the year. */
const WETTEST_DAY = 335;
const WET_DAY_SHARE = { mean: 0.42, swing: 0.1 } as const;
/** A wet day likes to follow a wet day. */
const PERSISTENCE = 0.22;
const MEAN_FALL_MM = { mean: 5.2, swing: 1.4 } as const;
const DOWNPOUR_CHANCE = 0.045;

/** Daily rain over the region, mm, one value per day of the year given. */
export function dailyRainMm(daysOfYear: readonly number[], random: Random): number[] {
  let wasWet = false;
  return daysOfYear.map((day) => {
    const wave = yearlyWave(day, WETTEST_DAY);
    const share = WET_DAY_SHARE.mean + WET_DAY_SHARE.swing * wave;
    wasWet = random.chance(wasWet ? share + PERSISTENCE : share - PERSISTENCE / 2);
    if (!wasWet) return 0;
    const mean = MEAN_FALL_MM.mean + MEAN_FALL_MM.swing * wave;
    const downpour = random.chance(DOWNPOUR_CHANCE) ? random.between(18, 40) : 0;
    return -mean * Math.log(1 - random.uniform()) + downpour;
  });
}

/** Rain above what the ground holds back starts to run off; a catchment this wet is in full spate. */
const HELD_BACK_MM = 16;
const FULL_SPATE_MM = 62;

/**
 * How strongly a catchment runs off: 0 in dry weather, 1 in full spate. Yesterday's water counts for `memory`
 * (0 … 1) of itself, so a large reservoir answers later and longer than a river. Every catchment holds the same
 * amount back in the long run, whatever its memory.
 */
export function runoff(rainMm: readonly number[], memory: number): number[] {
  // Scaled to the store of a catchment that keeps four fifths, for which the two amounts above were chosen.
  const scale = (1 - memory) / 0.2;
  let storedMm = (0.42 * 5.2) / (1 - memory);
  return rainMm.map((fallenMm) => {
    storedMm = memory * storedMm + fallenMm;
    return Math.max(0, (storedMm * scale - HELD_BACK_MM) / (FULL_SPATE_MM - HELD_BACK_MM));
  });
}
