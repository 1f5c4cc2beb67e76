import { solveWater } from '../../lib/engine';
import { backSubstitute, factorise } from '../../lib/engine/numeric/lu';
import { evaluate } from '../../lib/engine/speciation/evaluate';
import { fillGaps } from '../../lib/engine/speciation/gaps';
import { fillJacobian } from '../../lib/engine/speciation/jacobian';
import { solveByNewton } from '../../lib/engine/speciation/newton';
import { CLOSED, prepare, solveConditions } from '../../lib/engine/speciation/solve';
import { totalsOf } from '../../lib/engine/speciation/state';
import { riverWater as twelveAnalytes } from '../../tests/engine/support';
import { bytesPerCall, secondsEach, type Line } from './measure';

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
  const iterate = () => {
    evaluate(w);
    fillGaps(w, CLOSED);
    fillJacobian(w, CLOSED);
    factorise(w.matrix, size, w.stride, w.pivots, w.right);
    backSubstitute(w.matrix, size, w.stride, w.right);
  };

  const exponents = Float64Array.from({ length: species }, (_, i) => -((i * 7) % 23));
  const powers = new Float64Array(species);
  const matrix = Float64Array.from({ length: components * components }, (_, i) =>
    i % (components + 1) === 0 ? 5 : Math.sin(i),
  );
  const work = new Float64Array(components * components);
  const right = new Float64Array(components);
  const pivots = new Int32Array(components);
  const exponentials = () => {
    for (let i = 0; i < species; i++) powers[i] = Math.exp(exponents[i] ?? 0);
  };
  const elimination = () => {
    work.set(matrix);
    right.fill(1);
    factorise(work, components, components, pivots, right);
    backSubstitute(work, components, components, right);
  };
  const warmSolve = () => {
    w.unknowns.set(rest);
    w.unknowns[0] = (w.unknowns[0] ?? 0) + 0.05;
    solveByNewton(w, CLOSED);
  };
  const seconds = secondsEach({
    exponentials,
    elimination,
    iterate,
    coldSolve: () => void solveConditions(conditions),
    warmSolve,
  });
  const floor = seconds.exponentials + seconds.elimination;
  const heap = bytesPerCall(warmSolve, 20_000);
  const us = (time: number) => `${(time * 1e6).toFixed(2)} µs`;
  const ratio = (time: number) => `${(time / floor).toFixed(2)} × floor (${us(time)})`;
  return [
    {
      what: `floor: ${species} exponentials + LU(${components})`,
      measured: us(floor),
      goal: '—',
      met: species >= 30,
    },
    {
      what: 'one Newton iteration',
      measured: ratio(seconds.iterate),
      goal: '≤ 1.8 ×',
      met: seconds.iterate <= 1.8 * floor,
    },
    {
      what: 'cold solve',
      measured: ratio(seconds.coldSolve),
      goal: '≤ 20 ×',
      met: seconds.coldSolve <= 20 * floor,
    },
    {
      what: 'warm solve',
      measured: ratio(seconds.warmSolve),
      goal: '≤ 8 ×',
      met: seconds.warmSolve <= 8 * floor,
    },
    {
      what: 'heap per warm solve',
      measured: `${heap.toFixed(0)} bytes`,
      goal: '≤ 512 (boxed results, nothing per species)',
      met: heap <= 512,
    },
  ];
}
