import { findRoot } from '../numeric/root';
import { REAGENTS } from '../reagents/catalogue';
import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import { applyDose, checkDose, LARGEST_DOSE_MG_L } from '../steps/dose';
import type { DoseSuggestion, DoseTarget, ReagentKey, Water } from '../types';
import { isTargetQuantity, quantityOf, QUANTITY_NAMES } from './quantity';

export const DEFAULT_MAX_DOSE_MG_L = 500;
/** Places looked at before closing in, as shares of the largest dose; close together where waters turn. */
const LOOK_AT = [0, 0.02, 0.08, 0.2, 0.45, 1] as const;
/** Doses closer than this are one dose, mg/L. */
const DOSE_RESOLUTION_MG_L = 1e-9;
/** A quantity that moves less than this over the whole span does not answer to the reagent. */
const UNMOVED = 1e-9;
/** Golden-section steps when a turn between two looks has to be found. */
const TURN_STEPS = 30;
/** Where the slope at an end of the span is taken, as a share of the way to the next look. */
const BESIDE = 1e-3;

interface Point {
  readonly doseMgL: number;
  readonly value: number;
}

/**
 * Every dose of one reagent between 0 and the largest allowed that brings one quantity to its target. Where the
 * quantity turns within the span both doses are returned, smallest first; where the target cannot be met the range
 * that can be reached is returned with the reason.
 */
export function doseForTarget(
  water: Water,
  reagent: ReagentKey,
  target: DoseTarget,
  options: { readonly maxDoseMgL?: number } = {},
): DoseSuggestion {
  const max = options.maxDoseMgL ?? DEFAULT_MAX_DOSE_MG_L;
  const fault =
    checkDose({ reagent, doseMgL: 0 }) ??
    checkNumber(target.value, 'target.value', [-1e9, 1e9]) ??
    checkNumber(max, 'maxDoseMgL', [0, LARGEST_DOSE_MG_L]);
  if (fault) return fault;
  if (!isTargetQuantity(target.quantity)) {
    return refuse(
      'badInput',
      `No quantity is called ${String(target.quantity)}.`,
      'target.quantity',
    );
  }
  const tried = new Map<number, Water>();
  const valueAt = (doseMgL: number): number => {
    const solved = applyDose(water, { reagent, doseMgL });
    if (!solved.ok) return NaN;
    tried.set(doseMgL, solved.water);
    return quantityOf(solved.water, target.quantity) ?? NaN;
  };
  const looks: Point[] = [];
  for (const share of LOOK_AT) {
    const doseMgL = share * max;
    const value = valueAt(doseMgL);
    if (Number.isFinite(value)) looks.push({ doseMgL, value });
  }
  const points = withTurns(looks, target.value, valueAt);
  const doses = rootsBetween(points, target.value, valueAt);
  if (doses.length === 0) return unreachable(points, reagent, target, max);
  return {
    ok: true,
    doses: doses.flatMap((doseMgL) => {
      const there = tried.get(doseMgL);
      return there ? [{ doseMgL, water: there }] : [];
    }),
    evaluations: tried.size,
  };
}

/**
 * Adds the turns that could hide the target: a peak or trough between looks none of which passes it. A turn shows as
 * three looks that change direction, or at an end of the span as a slope against the run of the last two looks.
 */
function withTurns(
  looks: readonly Point[],
  target: number,
  valueAt: (doseMgL: number) => number,
): readonly Point[] {
  const points = [...looks];
  for (let i = 1; i + 1 < looks.length; i++) {
    const [left, middle, right] = [looks[i - 1], looks[i], looks[i + 1]];
    if (!left || !middle || !right) continue;
    const peak = middle.value > left.value && middle.value >= right.value;
    const trough = middle.value < left.value && middle.value <= right.value;
    const hidden = (peak && middle.value <= target) || (trough && middle.value >= target);
    if (hidden) points.push(turnBetween(left.doseMgL, right.doseMgL, peak, target, valueAt));
  }
  const ends = [
    [looks[0], looks[1]],
    [looks.at(-1), looks.at(-2)],
  ] as const;
  for (const [end, inner] of ends) {
    if (!end || !inner || end === inner) continue;
    const peak = end.value > inner.value;
    if (peak ? target < end.value : target > end.value) continue;
    const beside = valueAt(end.doseMgL + BESIDE * (inner.doseMgL - end.doseMgL));
    const turns = peak ? beside > end.value : beside < end.value;
    if (turns) points.push(turnBetween(end.doseMgL, inner.doseMgL, peak, target, valueAt));
  }
  return points.sort((a, b) => a.doseMgL - b.doseMgL);
}

/** Golden-section search for the turn between two doses; stops early at a value past the target. */
function turnBetween(
  from: number,
  to: number,
  highest: boolean,
  target: number,
  valueAt: (doseMgL: number) => number,
): Point {
  const sign = highest ? 1 : -1;
  const ratio = (Math.sqrt(5) - 1) / 2;
  const at = (doseMgL: number): Point => ({ doseMgL, value: valueAt(doseMgL) });
  let [low, high] = [Math.min(from, to), Math.max(from, to)];
  let a = at(high - ratio * (high - low));
  let b = at(low + ratio * (high - low));
  for (let i = 0; i < TURN_STEPS; i++) {
    const best = sign * a.value > sign * b.value ? a : b;
    if (sign * best.value > sign * target) return best;
    if (best === a) {
      high = b.doseMgL;
      b = a;
      a = at(high - ratio * (high - low));
    } else {
      low = a.doseMgL;
      a = b;
      b = at(low + ratio * (high - low));
    }
  }
  return sign * a.value > sign * b.value ? a : b;
}

function rootsBetween(
  points: readonly Point[],
  target: number,
  valueAt: (doseMgL: number) => number,
): number[] {
  const doses: number[] = [];
  const add = (doseMgL: number) => {
    const last = doses.at(-1);
    if (last === undefined || doseMgL - last > DOSE_RESOLUTION_MG_L) doses.push(doseMgL);
  };
  const span = Math.max(...points.map((p) => p.value)) - Math.min(...points.map((p) => p.value));
  if (!(span > UNMOVED)) return Math.abs((points[0]?.value ?? NaN) - target) <= UNMOVED ? [0] : [];
  points.forEach((point, i) => {
    if (point.value === target) add(point.doseMgL);
    const next = points[i + 1];
    if (!next || point.value > target === next.value > target) return;
    const root = findRoot(
      (doseMgL) => valueAt(doseMgL) - target,
      { a: point.doseMgL, fa: point.value - target, b: next.doseMgL, fb: next.value - target },
      DOSE_RESOLUTION_MG_L / 10,
    );
    if (root.ok) add(root.x);
  });
  return doses;
}

function unreachable(
  points: readonly Point[],
  reagent: ReagentKey,
  target: DoseTarget,
  max: number,
): DoseSuggestion {
  const { name } = REAGENTS[reagent];
  const quantity = QUANTITY_NAMES[target.quantity];
  const values = points.map((point) => point.value);
  if (values.length === 0) {
    return refuse(
      'badInput',
      `This water has no ${quantity.replace(/^the /, '')}.`,
      'target.quantity',
    );
  }
  const from = Math.min(...values);
  const to = Math.max(...values);
  const reachable = { from, to };
  const shown = `${from.toPrecision(4)} to ${to.toPrecision(4)}`;
  const way =
    to - from <= UNMOVED
      ? `${name} does not move ${quantity}; it stays at ${from.toPrecision(4)}`
      : target.value > to
        ? `up to ${max} mg/L of ${name} cannot raise ${quantity} to ${target.value}; it reaches ${shown}`
        : `up to ${max} mg/L of ${name} cannot lower ${quantity} to ${target.value}; it reaches ${shown}`;
  const message = `${way.charAt(0).toUpperCase()}${way.slice(1)}.`;
  return { ...refuse('targetUnreachable', message, 'target.value'), reachable };
}
