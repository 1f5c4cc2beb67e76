import { solveWater } from '../../lib/engine';
import { factorise, substitute } from '../../lib/engine/numeric/lu';
import { assemble } from '../../lib/engine/speciation/assemble';
import { evaluate } from '../../lib/engine/speciation/evaluate';
import { solveByNewton } from '../../lib/engine/speciation/newton';
import { CLOSED, prepare, solveConditions } from '../../lib/engine/speciation/solve';
import { totalsOf } from '../../lib/engine/speciation/state';
import { riverWater as twelveAnalytes } from '../../tests/engine/support';
import { bytesPerCall, secondsPerCall, type Line } from './measure';

/** One Newton iteration against its floor: as many exponentials as species and one LU of the components. */
export function benchKernel(): Line[] {
  const solved = solveWater(twelveAnalytes);
  if (!solved.ok) throw new Error(solved.message);
  const { temperatureC } = solved.water;
  const totals = totalsOf(solved.water);
  const conditions = { temperatureC, totals, problem: CLOSED };
  solveConditions(conditions);
  const w = prepare(conditions);
  const rest = Float64Array.from(w.unknowns);
  const components = w.system.components.length;
  const size = components + 1;
  const species = w.system.species.length;
  const iteration = secondsPerCall(() => {
    evaluate(w);
    assemble(w, CLOSED);
    factorise(w.matrix, size, w.stride, w.pivots);
    substitute(w.matrix, size, w.stride, w.pivots, w.right);
  });

  const exponents = Float64Array.from({ length: species }, (_, i) => -((i * 7) % 23));
  const powers = new Float64Array(species);
  const matrix = Float64Array.from({ length: components * components }, (_, i) =>
    i % (components + 1) === 0 ? 5 : Math.sin(i),
  );
  const work = new Float64Array(components * components);
  const right = new Float64Array(components);
  const pivots = new Int32Array(components);
  const exponentials = secondsPerCall(() => {
    for (let i = 0; i < species; i++) powers[i] = Math.exp(exponents[i] ?? 0);
  });
  const elimination = secondsPerCall(() => {
    work.set(matrix);
    right.fill(1);
    factorise(work, components, components, pivots);
    substitute(work, components, components, pivots, right);
  });
  const floor = exponentials + elimination;
  const cold = secondsPerCall(() => void solveConditions(conditions));
  w.unknowns.set(rest);
  const nudged = secondsPerCall(() => {
    w.unknowns.set(rest);
    w.unknowns[0] = (w.unknowns[0] ?? 0) + 0.05;
    solveByNewton(w, CLOSED);
  });
  const heap = bytesPerCall(() => {
    w.unknowns.set(rest);
    w.unknowns[0] = (w.unknowns[0] ?? 0) + 0.05;
    solveByNewton(w, CLOSED);
  }, 20_000);
  const us = (seconds: number) => `${(seconds * 1e6).toFixed(2)} µs`;
  const ratio = (seconds: number) => `${(seconds / floor).toFixed(2)} × floor (${us(seconds)})`;
  return [
    {
      what: `floor: ${species} exponentials + LU(${components})`,
      measured: us(floor),
      goal: '—',
      met: species >= 30,
    },
    {
      what: 'one Newton iteration',
      measured: ratio(iteration),
      goal: '≤ 1.8 ×',
      met: iteration <= 1.8 * floor,
    },
    { what: 'cold solve', measured: ratio(cold), goal: '≤ 20 ×', met: cold <= 20 * floor },
    { what: 'warm solve', measured: ratio(nudged), goal: '≤ 8 ×', met: nudged <= 8 * floor },
    {
      what: 'heap per warm solve',
      measured: `${heap.toFixed(0)} bytes`,
      goal: '≤ 512 (boxed results, nothing per species)',
      met: heap <= 512,
    },
  ];
}
