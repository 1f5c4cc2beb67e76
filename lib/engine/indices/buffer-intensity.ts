import { HYDROGEN } from '../constants/components';
import { factorise, substitute } from '../numeric/lu';
import { solveClosed } from '../speciation/closed';
import { fillJacobian } from '../speciation/jacobian';
import { CLOSED } from '../speciation/solve';
import { startOf, totalsOf } from '../speciation/state';
import type { Water } from '../types';

const MEQ_PER_EQ = 1000;

/**
 * Buffer intensity, meq/L per unit of pH: strong base needed at constant inorganic carbon and constant everything
 * else (Van Slyke 1922). Taken from the Jacobian of the solved water, not by differences.
 */
export function bufferIntensityOf(water: Water): number {
  const totals = totalsOf(water);
  const { workspace, ending } = solveClosed(water.temperatureC, totals, startOf(water));
  if (!ending.converged) return NaN;
  const { matrix, right, pivots, stride, scalars, system } = workspace;
  const size = system.components.length + 1;
  const place = system.components.length - 1;
  // Hydrogen stands last of the components; its row compares ln of acids and bases; at the solution both equal this sum.
  const side = (scalars[2] ?? 0) + Math.max(-(totals[HYDROGEN] ?? 0), 0);
  fillJacobian(workspace, CLOSED);
  right.fill(0);
  right[place] = 1 / side;
  if (!factorise(matrix, size, stride, pivots)) return NaN;
  substitute(matrix, size, stride, pivots, right);
  return (MEQ_PER_EQ * Math.LN10) / (right[place] ?? NaN);
}
