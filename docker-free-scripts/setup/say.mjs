/** What a newcomer reads: calm, one sentence at a time. */

/** @param {string} sentence */
export function say(sentence) {
  process.stdout.write(`${sentence}\n`);
}

/** Something the person at the keyboard can understand and mend; shown without a stack trace. */
export class PlainProblem extends Error {}

/**
 * Runs a script's main function: a plain problem is shown as its sentence, anything else as an honest surprise.
 * @param {() => Promise<number | void>} main
 */
export async function runPlainly(main) {
  try {
    process.exitCode = (await main()) ?? 0;
  } catch (error) {
    process.exitCode = 1;
    if (error instanceof PlainProblem) {
      process.stderr.write(`${error.message}\n`);
    } else {
      process.stderr.write(
        `Something unexpected went wrong: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
      );
    }
  }
}
