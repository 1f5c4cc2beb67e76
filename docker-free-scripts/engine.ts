/**
 * The engine's command line: `npm run --silent engine -- <verb>` reads JSON Lines on standard input and writes one JSON
 * line per input line, in order. Exits 0 when every line was answered, 1 when any was an error, 2 when misused.
 *
 * `--threads` spreads the lines over all cores (a season of plans, say) and tells on standard error how far it is.
 */
import { once } from 'node:events';
import { availableParallelism } from 'node:os';
import { createInterface } from 'node:readline';
import { answerLine } from '../lib/engine/batch/answer-line';
import { isVerb, VERBS } from '../lib/engine/batch/verbs';
import { answerOnThreads } from './engine-threads/answer-on-threads';

const FLUSH_AT_CHARACTERS = 1 << 16;

async function write(text: string): Promise<void> {
  if (!process.stdout.write(text)) await once(process.stdout, 'drain');
}

async function answerHere(
  verb: keyof typeof VERBS,
  lines: AsyncIterable<string>,
): Promise<boolean> {
  let failed = false;
  let pending = '';
  for await (const text of lines) {
    const answer = answerLine(verb, text);
    failed ||= answer.failed;
    pending += `${answer.line}\n`;
    if (pending.length >= FLUSH_AT_CHARACTERS) {
      await write(pending);
      pending = '';
    }
  }
  await write(pending);
  return failed;
}

const sayProgress = (answered: number, read: number): void => {
  const end = process.stderr.isTTY ? '\r' : '\n';
  process.stderr.write(`answered ${answered} of ${read} lines read${end}`);
};

// A reader that stops early (head, say) ends the run quietly.
process.stdout.on('error', () => process.exit(1));

const [verb = '', option] = process.argv.slice(2);
if (isVerb(verb) && (option === undefined || option === '--threads')) {
  const lines = createInterface({ input: process.stdin, crlfDelay: Infinity });
  const failed =
    option === '--threads'
      ? await answerOnThreads(verb, lines, {
          threads: availableParallelism(),
          write,
          onProgress: sayProgress,
        })
      : await answerHere(verb, lines);
  process.exitCode = failed ? 1 : 0;
} else {
  process.stderr.write(
    `usage: engine <${Object.keys(VERBS).join(' | ')}> [--threads], JSON Lines on standard input\n`,
  );
  process.exitCode = 2;
}
