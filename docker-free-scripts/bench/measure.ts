/** Median of a list. */
export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? NaN;
}

/** Seconds one call takes: the least of several rounds, each long enough for the clock. */
export function secondsPerCall(call: () => void, rounds = 7, roundSeconds = 0.08): number {
  for (let i = 0; i < 200; i++) call();
  let calls = 1;
  let least = Infinity;
  for (let round = 0; round < rounds;) {
    const from = performance.now();
    for (let i = 0; i < calls; i++) call();
    const seconds = (performance.now() - from) / 1000;
    if (seconds < roundSeconds / 2) {
      calls *= 2;
      continue;
    }
    least = Math.min(least, seconds / calls);
    round++;
  }
  return least;
}

/**
 * Seconds a call of each takes, the calls taking turns so that a busy moment of the machine strikes all alike: the least
 * of many short rounds.
 */
export function secondsEach<Name extends string>(
  calls: Readonly<Record<Name, () => void>>,
  rounds = 60,
  roundSeconds = 0.01,
): Record<Name, number> {
  const names = Object.keys(calls) as Name[];
  const least = Object.fromEntries(names.map((name) => [name, Infinity])) as Record<Name, number>;
  for (let round = 0; round < rounds; round++) {
    for (const name of names) {
      const expected = least[name] === Infinity ? 1e-5 : least[name];
      const count = Math.max(1, Math.round(roundSeconds / expected));
      const from = performance.now();
      for (let i = 0; i < count; i++) calls[name]();
      least[name] = Math.min(least[name], (performance.now() - from) / 1000 / count);
    }
  }
  return least;
}

/** Bytes the heap grows by per call, over many calls. */
export function bytesPerCall(call: () => void, calls: number): number {
  for (let i = 0; i < 1000; i++) call();
  globalThis.gc?.();
  const before = process.memoryUsage().heapUsed;
  for (let i = 0; i < calls; i++) call();
  return (process.memoryUsage().heapUsed - before) / calls;
}

export interface Line {
  readonly what: string;
  readonly measured: string;
  readonly goal: string;
  readonly met: boolean;
}

/** A Markdown table of results. */
export function table(lines: readonly Line[]): string {
  const rows = lines.map(
    ({ what, measured, goal, met }) =>
      `| ${what} | ${measured} | ${goal} | ${met ? 'yes' : 'NO'} |`,
  );
  return ['| what | measured | goal | met |', '|---|---|---|---|', ...rows].join('\n');
}
