import { COMPONENT_KEYS } from '../lib/engine/constants/components';
import { solveConditions, CLOSED } from '../lib/engine/speciation/solve';
import { SPECIES, SOLIDS } from '../lib/engine/constants/table';
console.log(SPECIES.length, SOLIDS.length);
let seed = 1;
const rnd = () => {
  seed = (seed * 1664525 + 1013904223) >>> 0;
  return seed / 4294967296;
};
const idx = (k: string) => COMPONENT_KEYS.indexOf(k as never);
const max: Record<string, number> = {
  CO3: 2e-2,
  Ca: 8e-3,
  Mg: 8e-3,
  Na: 5e-2,
  K: 5e-3,
  Cl: 5e-2,
  SO4: 1e-2,
  NO3: 2e-3,
  F: 2e-4,
  NH4: 2e-3,
  PO4: 3e-4,
  Si: 1e-3,
  B: 5e-4,
  S: 1e-4,
  Fe2: 2e-4,
  Fe3: 1e-4,
  Mn: 1e-4,
  Al: 1e-3,
  Cu2: 1e-4,
  Pb: 1e-5,
  Zn: 1e-4,
  Ba: 1e-5,
  Sr: 1e-4,
  HOCl: 1e-4,
  SO3: 1e-4,
  Cu1: 1e-6,
};
function run(mode: string, N: number) {
  const its: number[] = [];
  let fail = 0;
  const fails: any[] = [];
  for (let r = 0; r < N; r++) {
    const t = new Float64Array(COMPONENT_KEYS.length);
    for (const k in max) {
      const u = rnd();
      if (u < 0.4) continue;
      t[idx(k)] =
        rnd() < 0.15 ? max[k] * Math.pow(10, -12 * rnd()) : max[k] * Math.pow(10, -3 * rnd());
    }
    const T = rnd() * 40;
    const pH = 4 + 8 * rnd();
    // first pH held
    const held = solveConditions({
      temperatureC: T,
      totals: t,
      problem: { hydrogenRow: 'held', carbonRow: 'carbon' },
      lnHydrogen: -pH * Math.LN10,
    });
    if (mode === 'held') {
      its.push(held.ending.iterations);
      if (!held.ending.converged) {
        fail++;
        fails.push([held.ending, pH, T]);
      }
      continue;
    }
    if (!held.ending.converged) continue;
    if (held.workspace.scalars[0]! > 0.5) continue;
    t[0] = held.workspace.sums[0]!;
    const s = solveConditions({ temperatureC: T, totals: t, problem: CLOSED });
    its.push(s.ending.iterations);
    if (!s.ending.converged) {
      fail++;
      fails.push([s.ending, pH, T, Array.from(t)]);
    } else {
      const d = Math.abs(-s.workspace.unknowns[0]! / Math.LN10 - pH);
      if (d > 1e-6) fails.push(['diff', d, pH, s.ending]);
    }
  }
  its.sort((a, b) => a - b);
  console.log(
    mode,
    'n',
    its.length,
    'median',
    its[its.length >> 1],
    'p90',
    its[Math.floor(its.length * 0.9)],
    'max',
    its[its.length - 1],
    'fail',
    fail,
  );
  console.log(fails.slice(0, 4), fails.length);
}
run('held', 3000);
run('closed', 3000);
