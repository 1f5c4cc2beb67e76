import { emptyTable, fillTable, type CoefficientTable } from '../activity/coefficients';
import { debyeHuckelAt } from '../activity/water-properties';
import { constantsAt } from './equilibrium-constants';
import type { System } from './system';

/** Everything the solver writes to, allocated once per system and used again by every solve. */
export interface Workspace {
  readonly system: System;
  /** Unknowns: ln activity of each basis species, then ionic strength, then moles of each active solid. */
  readonly unknowns: Float64Array;
  readonly totals: Float64Array;
  readonly lnK: Float64Array;
  readonly molality: Float64Array;
  /** Molality times the slope of its ln γ. */
  readonly steep: Float64Array;
  readonly coefficients: CoefficientTable;
  readonly lnGamma: Float64Array;
  readonly slope: Float64Array;
  /** Σ count · molality per component. */
  readonly sums: Float64Array;
  /** Σ count · count · molality, row-major over components, upper triangle filled. */
  readonly products: Float64Array;
  /** Minus the derivative of `sums` by ionic strength. */
  readonly byIonic: Float64Array;
  /** Derivative of ½ Σ z² m by ln activity of each component. */
  readonly ionicBy: Float64Array;
  /** The part of the hydrogen row that comes from species holding H+ over the basis; last entry by ionic strength. */
  readonly acid: Float64Array;
  /** [½ Σ z² m, minus its derivative by ionic strength, Σ H+ held over the basis, largest residual]. */
  readonly scalars: Float64Array;
  readonly matrix: Float64Array;
  readonly right: Float64Array;
  /** What each row of the matrix is divided by. */
  readonly scale: Float64Array;
  readonly inverse: Float64Array;
  readonly pivots: Int32Array;
  readonly stride: number;
  /** The unknowns before the last step. */
  readonly held: Float64Array;
  /** Composition (row-major over components) and ln of the solubility product of the solids that take part. */
  readonly solidCounts: Float64Array;
  readonly solidLnK: Float64Array;
  activeSolids: number;
  /** Ionic strength may not pass this in a step, mol/kg. */
  ionicBound: number;
  temperatureC: number;
}

const workspaces = new WeakMap<System, Workspace>();

/** The workspace of a system, set to a temperature. One solve at a time: the engine is single-threaded by design. */
export function workspaceOf(system: System, temperatureC: number): Workspace {
  const known = workspaces.get(system);
  const workspace = known ?? allocate(system);
  if (!known) workspaces.set(system, workspace);
  setTemperature(workspace, temperatureC);
  return workspace;
}

function allocate(system: System): Workspace {
  const m = system.components.length;
  const n = system.species.length;
  const stride = 2 * m + 1;
  return {
    system,
    unknowns: new Float64Array(stride),
    totals: new Float64Array(m),
    lnK: new Float64Array(n),
    molality: new Float64Array(n),
    steep: new Float64Array(n),
    coefficients: emptyTable(system.classes.length),
    lnGamma: new Float64Array(system.classes.length),
    slope: new Float64Array(system.classes.length),
    sums: new Float64Array(m),
    products: new Float64Array(m * m),
    byIonic: new Float64Array(m),
    ionicBy: new Float64Array(m),
    acid: new Float64Array(m + 1),
    scalars: new Float64Array(4),
    matrix: new Float64Array(stride * stride),
    right: new Float64Array(stride),
    scale: new Float64Array(stride),
    inverse: new Float64Array(stride),
    pivots: new Int32Array(stride),
    stride,
    held: new Float64Array(stride),
    solidCounts: new Float64Array(m * m),
    solidLnK: new Float64Array(m),
    activeSolids: 0,
    ionicBound: Infinity,
    temperatureC: NaN,
  };
}

function setTemperature(workspace: Workspace, temperatureC: number): void {
  if (workspace.temperatureC === temperatureC) return;
  const constants = constantsAt(temperatureC);
  workspace.temperatureC = temperatureC;
  fillTable(workspace.system.classes, debyeHuckelAt(temperatureC), workspace.coefficients);
  workspace.system.species.forEach((entry, i) => {
    workspace.lnK[i] = Math.LN10 * (constants.species.get(entry.key) ?? 0);
  });
}
