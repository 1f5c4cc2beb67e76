import fc from 'fast-check';
import { solveWater } from '../../lib/engine';
import { answerLine } from '../../lib/engine/batch/answer-line';
import { COMPONENT_KEYS } from '../../lib/engine/constants/components';
import { solveClosed } from '../../lib/engine/speciation/closed';
import { CLOSED, solveConditions } from '../../lib/engine/speciation/solve';
import { startFrom, totalsOf } from '../../lib/engine/speciation/state';
import { malformedLine } from '../../tests/engine/malformed';
import type { Line } from './measure';
import { randomWaters } from './random-waters';

const HIGHEST_IONIC_STRENGTH = 0.5;
const STARTS_PH = [4.5, 6, 7.5, 9, 11] as const;

/** Every valid water converges, and from five starting points to the same answer. */
export function countWaters(wanted: number): Line[] {
  let tried = 0;
  let unsolved = 0;
  let otherAnswer = 0;
  let startFailed = 0;
  let fellBack = 0;
  let worst = 0;
  for (const analysis of randomWaters(1)) {
    if (tried === wanted) break;
    const solved = solveWater(analysis);
    if (!solved.ok) {
      // Refused for what it is (CO2 far above the model) is no failure to converge.
      if (solved.reason === 'notConverged') unsolved++;
      continue;
    }
    const { water } = solved;
    if (water.ionicStrengthMolKg > HIGHEST_IONIC_STRENGTH) continue;
    tried++;
    worst = Math.max(worst, water.evidence.residual);
    const { temperatureC } = water;
    const totals = totalsOf(water);
    for (const pH of STARTS_PH) {
      const lnHydrogen = -pH * Math.LN10;
      const problem = { hydrogenRow: 'held', carbonRow: 'carbon' } as const;
      const held = solveConditions({ temperatureC, totals, problem, lnHydrogen });
      if (!held.ending.converged) {
        startFailed++;
        continue;
      }
      const start = startFrom(held.workspace);
      const bare = solveConditions({ temperatureC, totals, problem: CLOSED, start });
      if (!bare.ending.converged) fellBack++;
      const again = bare.ending.converged ? bare : solveClosed(temperatureC, totals, start);
      if (!again.ending.converged) startFailed++;
      else if (Math.abs(-(again.workspace.unknowns[0] ?? NaN) / Math.LN10 - water.pH) > 1e-6)
        otherAnswer++;
    }
  }
  const starts = tried * STARTS_PH.length;
  return [
    {
      what: `${tried} random waters of up to ${COMPONENT_KEYS.length} components: not converged`,
      measured: `${unsolved}, worst residual ${worst.toExponential(1)}`,
      goal: '0, ≤ 1e-10',
      met: unsolved === 0 && worst <= 1e-10,
    },
    {
      what: `${starts} starts from five pH: another answer; none`,
      measured: `${otherAnswer}; ${startFailed} (${fellBack} by way of a fresh guess)`,
      goal: '0; 0',
      met: otherAnswer === 0 && startFailed === 0,
    },
  ];
}

/** Malformed requests never throw and never answer with anything but one line of JSON. */
export function countMalformed(wanted: number): Line[] {
  let thrown = 0;
  let answered = 0;
  const sample = 5000;
  for (let seed = 0; answered < wanted; seed++) {
    for (const { verb, line } of fc.sample(malformedLine, { numRuns: sample, seed })) {
      answered++;
      try {
        JSON.parse(answerLine(verb, line).line);
      } catch {
        thrown++;
      }
    }
  }
  return [
    {
      what: `${answered} malformed requests: thrown`,
      measured: `${thrown}`,
      goal: '0',
      met: thrown === 0,
    },
  ];
}
