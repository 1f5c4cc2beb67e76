/** A root in [a, b] found by bracketing; says why when there is none. */
export type Root =
  | { readonly ok: true; readonly x: number; readonly evaluations: number }
  | { readonly ok: false; readonly reason: 'noSignChange' | 'notFinite' | 'notConverged' };

export interface Bracket {
  readonly a: number;
  readonly fa: number;
  readonly b: number;
  readonly fb: number;
}

/**
 * Finds a zero of `f` inside a bracket with a sign change, by inverse quadratic interpolation guarded by bisection
 * (Chandrupatla 1997, Adv. Eng. Softw. 28, 145). Stops when the bracket is narrower than `tolerance` (absolute) plus
 * four units in the last place, or when f is exactly zero.
 */
export function findRoot(
  f: (x: number) => number,
  bracket: Bracket,
  tolerance: number,
  limit = 100,
): Root {
  let { a: x1, fa: f1, b: x2, fb: f2 } = bracket;
  if (!Number.isFinite(f1) || !Number.isFinite(f2)) return { ok: false, reason: 'notFinite' };
  if (f1 === 0) return { ok: true, x: x1, evaluations: 0 };
  if (f2 === 0) return { ok: true, x: x2, evaluations: 0 };
  if (f1 > 0 === f2 > 0) return { ok: false, reason: 'noSignChange' };
  let x3 = x1;
  let f3 = f1;
  let t = f1 / (f1 - f2);
  for (let evaluations = 1; evaluations <= limit; evaluations++) {
    const x = x1 + t * (x2 - x1);
    const fx = f(x);
    if (!Number.isFinite(fx)) return { ok: false, reason: 'notFinite' };
    if (fx > 0 === f1 > 0) {
      x3 = x1;
      f3 = f1;
    } else {
      x3 = x2;
      f3 = f2;
      x2 = x1;
      f2 = f1;
    }
    x1 = x;
    f1 = fx;
    const best = Math.abs(f1) < Math.abs(f2) ? x1 : x2;
    const fBest = Math.abs(f1) < Math.abs(f2) ? f1 : f2;
    const slack = tolerance + 4 * Number.EPSILON * Math.abs(best);
    const width = Math.abs(x2 - x1);
    if (fBest === 0 || width <= 2 * slack) return { ok: true, x: best, evaluations };
    t = interpolate(x1, f1, x2, f2, x3, f3);
    const least = slack / width;
    t = Math.min(1 - least, Math.max(least, t));
  }
  return { ok: false, reason: 'notConverged' };
}

/** Where to try next, as a fraction of the way from x1 to x2. */
function interpolate(x1: number, f1: number, x2: number, f2: number, x3: number, f3: number) {
  const xi = (x1 - x2) / (x3 - x2);
  const phi = (f1 - f2) / (f3 - f2);
  const trusted = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
  if (!trusted) return 0.5;
  return (
    (f1 / (f2 - f1)) * (f3 / (f2 - f3)) +
    ((x3 - x1) / (x2 - x1)) * (f1 / (f3 - f1)) * (f2 / (f3 - f2))
  );
}
