/** The demo's own chance: the same seed always gives the same numbers, on every machine. */
export interface Random {
  /** Uniform in [0, 1). */
  uniform(): number;
  between(low: number, high: number): number;
  /** Standard normal. */
  normal(): number;
  chance(probability: number): boolean;
  pick<T>(items: readonly [T, ...T[]]): T;
  bytes(count: number): Uint8Array;
  /** An independent stream of its own name: drawing from it leaves this one where it was. */
  fork(name: string): Random;
}

const UINT32 = 2 ** 32;

/** A stream named by text. Counter through a 32-bit mixer: not for secrets, only for invented data. */
export function createRandom(name: string): Random {
  const key = hashText(name);
  const step = hashText(`${name}\u0000step`) | 1;
  let counter = 0;
  const next = (): number => {
    counter = (counter + 1) >>> 0;
    return mix(key ^ mix(Math.imul(counter, step)));
  };
  const uniform = (): number => next() / UINT32;
  return {
    uniform,
    between: (low, high) => low + (high - low) * uniform(),
    normal: () => {
      // Box and Muller 1958; 1 − u keeps the logarithm finite.
      const radius = Math.sqrt(-2 * Math.log(1 - uniform()));
      return radius * Math.cos(2 * Math.PI * uniform());
    },
    chance: (probability) => uniform() < probability,
    pick: (items) => items[Math.floor(uniform() * items.length)] ?? items[0],
    bytes: (count) => Uint8Array.from({ length: count }, () => next() >>> 24),
    fork: (child) => createRandom(`${name}/${child}`),
  };
}

/** Bijective on 32 bits: every bit of the input reaches every bit of the output. */
function mix(value: number): number {
  let x = value >>> 0;
  x = Math.imul(x ^ (x >>> 16), 0x21f0aaad);
  x = Math.imul(x ^ (x >>> 15), 0x735a2d97);
  return (x ^ (x >>> 15)) >>> 0;
}

function hashText(text: string): number {
  let hash = 0x9e3779b9;
  for (let index = 0; index < text.length; index += 1) {
    hash = mix(hash ^ text.charCodeAt(index)) + index;
  }
  return mix(hash);
}

/** A process with memory: today is `memory` of yesterday plus chance; unit standard deviation in the long run. */
export function createWander(random: Random, memory: number): () => number {
  let state = random.normal();
  const fresh = Math.sqrt(1 - memory * memory);
  return () => {
    state = memory * state + fresh * random.normal();
    return state;
  };
}
