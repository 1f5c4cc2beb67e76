/** Seeded draws: the same seed gives the same draws everywhere. */
export interface Draws {
  /** Uniform in (0, 1). */
  readonly uniform: () => number;
  /** Standard normal. */
  readonly normal: () => number;
}

/** Draws thrown away first, so that near seeds part. */
const WARM_UP = 20;

/**
 * Xorshift on 32 bits with a Weyl sequence added (Marsaglia 2003, J. Stat. Softw. 8, 14), normal deviates by the polar
 * method (Marsaglia & Bray 1964).
 */
export function drawsFrom(seed: number): Draws {
  let x = (Math.imul(seed >>> 0, 2654435761) ^ 0x9e3779b9) >>> 0 || 1;
  let weyl = seed >>> 0;
  let kept: number | undefined;
  const uniform = (): number => {
    x ^= x << 13;
    x ^= x >>> 17;
    x ^= x << 5;
    weyl = (weyl + 362437) >>> 0;
    return ((((x >>> 0) + weyl) % 4294967296) + 0.5) / 4294967296;
  };
  const normal = (): number => {
    if (kept !== undefined) {
      const value = kept;
      kept = undefined;
      return value;
    }
    for (;;) {
      const a = 2 * uniform() - 1;
      const b = 2 * uniform() - 1;
      const r = a * a + b * b;
      if (r >= 1 || r === 0) continue;
      const scale = Math.sqrt((-2 * Math.log(r)) / r);
      kept = b * scale;
      return a * scale;
    }
  };
  for (let i = 0; i < WARM_UP; i++) uniform();
  return { uniform, normal };
}
