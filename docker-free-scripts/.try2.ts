import { COMPONENT_KEYS } from '../lib/engine/constants/components';
import { prepare } from '../lib/engine/speciation/solve';
import { guess } from '../lib/engine/speciation/start';
import { constantsAt } from '../lib/engine/speciation/equilibrium-constants';
import { evaluate } from '../lib/engine/speciation/evaluate';
import { solveByNewton } from '../lib/engine/speciation/newton';
const t = new Float64Array(COMPONENT_KEYS.length);
const idx = (k: string) => COMPONENT_KEYS.indexOf(k as never);
for (const [k, v] of Object.entries({
  Ca: 1e-3,
  Na: 5e-3,
  Cl: 2e-3,
  SO4: 1e-3,
  CO3: 2e-3,
  Al: 1e-4,
  Fe3: 1e-5,
  Pb: 1e-6,
  F: 1e-5,
} as any))
  t[idx(k)] = v as number;
const c = {
  temperatureC: 20,
  totals: t,
  problem: { hydrogenRow: 'held', carbonRow: 'carbon' } as any,
  lnHydrogen: -9.2 * Math.LN10,
};
for (let lim = 0; lim < 16; lim++) {
  const w = prepare(c);
  guess(w, c, constantsAt(20));
  w.unknowns[0] = c.lnHydrogen;
  const e = solveByNewton(w, c.problem, lim);
  const m = w.system.components.length;
  console.log(
    lim,
    e.residual.toExponential(2),
    'I',
    w.unknowns[m]!.toExponential(3),
    w.system.components
      .map((k, j) => COMPONENT_KEYS[k] + ':' + (w.sums[j]! / w.totals[j]!).toExponential(2))
      .join(' '),
  );
  if (e.converged) break;
}
