import { checkNumber, TEMPERATURE_RANGE_C } from '../speciation/analysis';
import { totalsOf } from '../speciation/state';
import type { Refusal, Solved, Water } from '../types';
import { settleStep } from './settle-step';

/** The same water at another temperature (°C), closed: nothing escapes and nothing precipitates. */
export function heat(water: Water, temperatureC: number): Solved | Refusal {
  const fault = checkNumber(temperatureC, 'temperatureC', TEMPERATURE_RANGE_C);
  return fault ?? settleStep(water, totalsOf(water), temperatureC);
}
