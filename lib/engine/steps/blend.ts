import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import { totalsOf } from '../speciation/state';
import type { Refusal, Solved, Water } from '../types';
import { settleStep } from './settle-step';

/** A stream and its part of the whole; parts are taken relative to their sum. */
export interface Stream {
  readonly water: Water;
  readonly part: number;
}

/** Mixes streams: every total, the alkalinity, the charge and (by equal heat capacity) the temperature by its part. */
export function blend(streams: readonly Stream[]): Solved | Refusal {
  let whole = 0;
  for (const [i, stream] of streams.entries()) {
    const fault = checkNumber(stream.part, `${i}.part`, [0, 1e12]);
    if (fault) return fault;
    whole += stream.part;
  }
  const largest = streams.reduce<Stream | undefined>(
    (most, stream) => (most && most.part >= stream.part ? most : stream),
    undefined,
  );
  if (!largest || !(whole > 0)) return refuse('badInput', 'At least one stream must flow.', '');
  const totals = new Float64Array(totalsOf(largest.water).length);
  let temperatureC = 0;
  const assumptions = new Set<string>();
  for (const { water, part } of streams) {
    const share = part / whole;
    if (share === 0) continue;
    temperatureC += share * water.temperatureC;
    totalsOf(water).forEach((total, i) => {
      totals[i] = (totals[i] ?? 0) + share * total;
    });
    for (const sentence of water.assumptions) assumptions.add(sentence);
  }
  return settleStep({ ...largest.water, assumptions: [...assumptions] }, totals, temperatureC);
}
