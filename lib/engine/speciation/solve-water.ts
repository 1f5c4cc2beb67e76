import { CACO3_MG_PER_EQ, CARBON_MG_PER_MOL } from '../constants/carbonate-equivalents';
import { CARBON, HYDROGEN } from '../constants/components';
import { refuse } from '../refusal';
import type { Refusal, Solved, WaterAnalysis } from '../types';
import type { Problem } from './problem';
import { checkAnalysis, HIGHEST_CO2_ATM, type CheckedAnalysis } from './analysis';
import { solveClosed } from './closed';
import { describe } from './describe';
import { constantsAt } from './equilibrium-constants';
import { solvePressureAndCarbon } from './pressure-and-carbon';
import { solveConditions, type Outcome } from './solve';
import type { Start } from './start';
import { foundTotals, startFrom } from './state';
import type { Workspace } from './workspace';

const HELD: Problem = { hydrogenRow: 'held', carbonRow: 'carbon' };
/** An alkalinity this far below what the pH alone explains is still read as "no inorganic carbon", eq/kg (0.05 mg/L). */
const ALKALINITY_SLACK = 1e-6;
/** Carbonate alkalinity below this is none, eq/kg. */
const NO_CARBON = 1e-11;

/**
 * Speciates an analysis at equilibrium in solution. Any two of pH, alkalinity, inorganic carbon and CO2 pressure fix
 * the carbonate system; the others are found. Refuses contradictory or impossible input with the field's path.
 */
export function solveWater(analysis: WaterAnalysis): Solved | Refusal {
  const checked = checkAnalysis(analysis);
  if (!checked.ok) return checked;
  const { given } = checked;
  checked.totals[HYDROGEN] = -(given.alkalinityMgLCaCO3 ?? 0) / CACO3_MG_PER_EQ;
  checked.totals[CARBON] = (given.inorganicCarbonMgLC ?? 0) / CARBON_MG_PER_MOL;
  if (given.carbonDioxideAtm === 0) return withoutCarbon(checked);
  if (given.carbonDioxideAtm !== undefined) return withPressure(checked, given.carbonDioxideAtm);
  if (given.pH === undefined) {
    const outcome = solveClosed(checked.temperatureC, checked.totals);
    return finish(checked, outcome, checked.totals);
  }
  return given.alkalinityMgLCaCO3 === undefined
    ? withPH(checked, HELD, given.pH)
    : withPHAndAlkalinity(checked, given.pH);
}

/** CO2 pressure given as zero: the water holds no inorganic carbon. */
function withoutCarbon(checked: CheckedAnalysis): Solved | Refusal {
  const { given } = checked;
  if ((given.inorganicCarbonMgLC ?? 0) > 0) {
    return refuse(
      'badInput',
      'Water with inorganic carbon has a CO2 pressure above zero.',
      'carbonDioxideAtm',
    );
  }
  if (given.inorganicCarbonMgLC === 0) {
    return refuse(
      'badInput',
      'Zero inorganic carbon and zero CO2 pressure say the same thing; pH or alkalinity is needed.',
      'carbonDioxideAtm',
    );
  }
  if (given.pH !== undefined) return withPH(checked, HELD, given.pH);
  return finish(checked, solveClosed(checked.temperatureC, checked.totals), checked.totals);
}

function withPH(checked: CheckedAnalysis, problem: Problem, pH: number): Solved | Refusal {
  const { temperatureC, totals } = checked;
  const outcome = solveConditions({ temperatureC, totals, problem, lnHydrogen: -pH * Math.LN10 });
  return finish(checked, outcome, foundTotals(outcome.workspace, totals));
}

function withPressure(checked: CheckedAnalysis, pressureAtm: number): Solved | Refusal {
  const { temperatureC, totals, given } = checked;
  const lnCarbonDioxide =
    Math.log(pressureAtm) + Math.LN10 * constantsAt(temperatureC).carbonDioxide;
  if (given.inorganicCarbonMgLC !== undefined) {
    const found = solvePressureAndCarbon({ temperatureC, totals, lnCarbonDioxide });
    if (found) return finish(checked, found, foundTotals(found.workspace, totals));
    return refuse(
      'badInput',
      'At this CO2 pressure dissolved CO2 alone exceeds the inorganic carbon given.',
      'inorganicCarbonMgLC',
    );
  }
  const problem: Problem = {
    carbonRow: 'held',
    hydrogenRow: given.pH === undefined ? 'alkalinity' : 'held',
  };
  const held = given.pH === undefined ? {} : { lnHydrogen: -given.pH * Math.LN10 };
  const outcome = solveConditions({ temperatureC, totals, problem, lnCarbonDioxide, ...held });
  const known = given.alkalinityMgLCaCO3 !== undefined;
  return finish(checked, outcome, foundTotals(outcome.workspace, totals, known));
}

function withPHAndAlkalinity(checked: CheckedAnalysis, pH: number): Solved | Refusal {
  const { temperatureC, totals } = checked;
  const lnHydrogen = -pH * Math.LN10;
  const bare = solveConditions({ temperatureC, totals, problem: HELD, lnHydrogen });
  const carbonate = (bare.workspace.sums[0] ?? 0) - (totals[HYDROGEN] ?? 0);
  if (bare.ending.converged && carbonate < -ALKALINITY_SLACK) {
    const least = (-(bare.workspace.sums[0] ?? 0) * CACO3_MG_PER_EQ).toPrecision(3);
    return refuse(
      'badInput',
      `At pH ${pH} the water without any carbonate already has an alkalinity of ${least} mg/L as CaCO3.`,
      'alkalinityMgLCaCO3',
    );
  }
  if (bare.ending.converged && carbonate <= NO_CARBON) {
    return finish(checked, bare, foundTotals(bare.workspace, totals), [
      'pH accounts for all the alkalinity: no inorganic carbon is assumed.',
    ]);
  }
  const problem: Problem = { hydrogenRow: 'held', carbonRow: 'alkalinity' };
  const conditions = { temperatureC, totals, problem, lnHydrogen };
  const start = startWithCarbonate(bare.workspace, carbonate, temperatureC);
  const warm = solveConditions({ ...conditions, start });
  const outcome = warm.ending.converged ? warm : solveConditions(conditions);
  return finish(checked, outcome, foundTotals(outcome.workspace, totals, true));
}

/** The carbonate-free state with the CO2 that the missing alkalinity asks for, complexes left out. */
function startWithCarbonate(bare: Workspace, carbonate: number, temperatureC: number): Start {
  const { species } = constantsAt(temperatureC);
  const start = startFrom(bare);
  const lnH = start.lnActivity[HYDROGEN] ?? 0;
  const k1 = Math.exp(Math.LN10 * (species.get('HCO3-') ?? 0) - lnH);
  const k2 = Math.exp(Math.LN10 * (species.get('CO3--') ?? 0) - 2 * lnH);
  start.lnActivity[CARBON] = Math.log(carbonate / (k1 + 2 * k2));
  return { ...start, ionicStrengthMolKg: start.ionicStrengthMolKg + carbonate / 2 };
}

function finish(
  checked: CheckedAnalysis,
  outcome: Outcome,
  totals: Float64Array,
  more: readonly string[] = [],
): Solved | Refusal {
  if (!outcome.ending.converged) {
    return refuse(
      'notConverged',
      `No equilibrium was found (${outcome.ending.why} after ${outcome.ending.iterations} steps).`,
    );
  }
  const { temperatureC, assumptions } = checked;
  const water = describe(outcome, totals, temperatureC, [...assumptions, ...more]);
  if (water.carbonDioxideAtm > HIGHEST_CO2_ATM) {
    const path = checked.given.pH === undefined ? 'inorganicCarbonMgLC' : 'pH';
    return refuse(
      'outOfRange',
      `This would need a CO2 pressure of ${water.carbonDioxideAtm.toPrecision(3)} atm; the model holds to ${HIGHEST_CO2_ATM}.`,
      path,
    );
  }
  if (water.pH < -0.5 || water.pH > 15) {
    return refuse('outOfRange', `pH would be ${water.pH.toFixed(2)}.`, 'alkalinityMgLCaCO3');
  }
  return { ok: true, water };
}
