import {
  applyDose,
  doseForTarget,
  howSure,
  planDoses,
  precipitationPotentialAt,
  solveWater,
  type Water,
  type WaterAnalysis,
} from '../../lib/engine';
import { CLOSED, solveConditions } from '../../lib/engine/speciation/solve';
import { solveClosed } from '../../lib/engine/speciation/closed';
import { startOf, totalsOf } from '../../lib/engine/speciation/state';
import { median, secondsPerCall, type Line } from './measure';
import { randomWaters } from './random-waters';

const WATERS = 3000;

/** Newton steps from a cold start and after a small dose, over waters of every kind. */
export function benchIterations(): Line[] {
  const cold: number[] = [];
  const warm: number[] = [];
  const source = randomWaters(20);
  while (cold.length < WATERS) {
    const solved = solveWater(source.next().value);
    if (!solved.ok) continue;
    const { water } = solved;
    const conditions = {
      temperatureC: water.temperatureC,
      totals: totalsOf(water),
      problem: CLOSED,
    };
    cold.push(solveConditions(conditions).ending.iterations);
    const dosed = applyDose(water, { reagent: 'calcium-hydroxide', doseMgL: 1 });
    if (dosed.ok) warm.push(dosed.water.evidence.iterations);
  }
  const most = (values: readonly number[]) => values.reduce((a, b) => Math.max(a, b), 0);
  const line = (what: string, values: readonly number[], goal: number): Line => ({
    what,
    measured: `median ${median(values)}, most ${most(values)} (${values.length} waters)`,
    goal: `median ≤ ${goal}`,
    met: median(values) <= goal,
  });
  return [line('steps, cold', cold, 10), line('steps, after 1 mg/L of lime', warm, 4)];
}

const river: WaterAnalysis = {
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
    silica: 7,
  },
};

/** The larger questions, in speciations (one warm solve with its description) of the same run. */
export function benchQuestions(): Line[] {
  const solved = solveWater(river);
  if (!solved.ok) throw new Error(solved.message);
  const { water } = solved;
  const one = secondsPerCall(
    () => void applyDose(water, { reagent: 'calcium-hydroxide', doseMgL: 5 }),
  );
  const totals = totalsOf(water);
  const start = startOf(water);
  const bare = secondsPerCall(() => void solveClosed(12, totals, start));
  const line = (what: string, seconds: number, goal: number): Line => ({
    what,
    measured: `${(seconds / one).toFixed(1)} speciations (${(seconds * 1e3).toFixed(2)} ms)`,
    goal: `≤ ${goal}`,
    met: seconds <= goal * one,
  });
  return [
    {
      what: 'one speciation with its description (bare warm solve)',
      measured: `${(one * 1e6).toFixed(0)} µs (${(bare * 1e6).toFixed(0)} µs)`,
      goal: '—',
      met: true,
    },
    line(
      'precipitation potential',
      secondsPerCall(() => void precipitationPotentialAt(water, 12)),
      12,
    ),
    targetLine(water),
    planLine(water),
  ];
}

/** A target by its own count of speciations, over the usual questions. */
function targetLine(water: Water): Line {
  const questions = [
    ['calcium-hydroxide', 'pH', 8.4],
    ['sodium-hydroxide', 'calciteIndex', 0.1],
    ['carbon-dioxide', 'pH', 7.2],
    ['sulfuric-acid', 'alkalinity', 70],
    ['sodium-carbonate', 'langelier', 0],
  ] as const;
  const counts = questions.map(([reagent, quantity, value]) => {
    const found = doseForTarget(water, reagent, { quantity, value });
    return found.ok ? (found.evaluations ?? NaN) : NaN;
  });
  return {
    what: `one target (${questions.length} questions)`,
    measured: `median ${median(counts)}, ${counts.join(', ')} speciations`,
    goal: 'median ≤ 15',
    met: median(counts) <= 15,
  };
}

/** A plan by its own count of speciations, and the time of a thousand draws in plans. */
function planLine(water: Water): Line {
  const evaluations = plan(water);
  const seconds = secondsPerCall(() => void plan(water), 3);
  const plans = sure() / seconds;
  return {
    what: 'plan of 4 reagents, 5 targets; 1,000 draws of an index',
    measured: `${evaluations} speciations (${(seconds * 1e3).toFixed(1)} ms); ${plans.toFixed(1)} plans`,
    goal: '≤ 300, ≤ 40 ms; ≤ 1,000 plans',
    met: evaluations <= 300 && seconds <= 0.04 && plans <= 1000,
  };
}

function plan(water: Water): number {
  const found = planDoses(water, {
    reagents: [
      { reagent: 'aluminum-sulfate', minDoseMgL: 30, maxDoseMgL: 30, costPerKg: 0.3 },
      { reagent: 'sodium-hydroxide', maxDoseMgL: 40, costPerKg: 0.6 },
      { reagent: 'calcium-hydroxide', maxDoseMgL: 40, costPerKg: 0.3 },
      { reagent: 'carbon-dioxide', maxDoseMgL: 40, costPerKg: 0.25 },
    ],
    targets: [
      { quantity: 'pH', min: 7.6, max: 8.2 },
      { quantity: 'alkalinity', min: 100 },
      { quantity: 'calciteIndex', min: 0, max: 0.3 },
      { quantity: 'larson', max: 1 },
      { quantity: 'hardness', max: 150 },
    ],
  });
  return found.ok ? found.evaluations : NaN;
}

function sure(): number {
  const from = performance.now();
  howSure(river, (water) => ({ index: water.saturationIndex['calcite'] ?? NaN }), { seed: 1 });
  return (performance.now() - from) / 1000;
}
