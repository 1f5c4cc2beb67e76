import { PlainProblem } from './say.mjs';

/** Thrown between two steps of a set-up that was told to stop. */
export class Stopped extends PlainProblem {
  constructor() {
    super('Stopped.');
  }
}

/**
 * Ctrl-C, a polite kill or a closed terminal. Listening starts at once, so that a stop in the middle of the set-up still
 * takes down, in order, what was started.
 */
export class StopSignal {
  #count = 0;
  #resolve = () => {};
  /** Settles at the first signal. */
  told = new Promise((/** @type {(value: void) => void} */ resolve) => {
    this.#resolve = resolve;
  });

  /** @param {() => void} onSecond the hard way, for whoever presses Ctrl-C again */
  constructor(onSecond) {
    for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
      process.on(signal, () => {
        this.#count += 1;
        if (this.#count > 1) onSecond();
        this.#resolve();
      });
    }
  }

  /** Throws between steps once a stop was asked for. */
  check() {
    if (this.#count > 0) throw new Stopped();
  }
}
