/**
 * The engine's command line: `npm run --silent engine -- <verb>` reads JSON Lines on standard input and writes one JSON
 * line per input line, in order. Exits 0 when every line was answered, 1 when any was an error, 2 when misused.
 */
import { once } from 'node:events';
import { createInterface } from 'node:readline';
import { answerLine } from '../lib/engine/batch/answer-line';
import { isVerb, VERBS } from '../lib/engine/batch/verbs';

const FLUSH_AT_CHARACTERS = 1 << 16;

async function write(text: string): Promise<void> {
  if (!process.stdout.write(text)) await once(process.stdout, 'drain');
}

async function run(verb: keyof typeof VERBS): Promise<number> {
  let failed = false;
  let pending = '';
  for await (const text of createInterface({ input: process.stdin, crlfDelay: Infinity })) {
    const answer = answerLine(verb, text);
    failed ||= answer.failed;
    pending += `${answer.line}\n`;
    if (pending.length >= FLUSH_AT_CHARACTERS) {
      await write(pending);
      pending = '';
    }
  }
  await write(pending);
  return failed ? 1 : 0;
}

// A reader that stops early (head, say) ends the run quietly.
process.stdout.on('error', () => process.exit(1));

const verb = process.argv[2] ?? '';
if (isVerb(verb)) {
  process.exitCode = await run(verb);
} else {
  process.stderr.write(
    `usage: engine <${Object.keys(VERBS).join(' | ')}>, JSON Lines on standard input\n`,
  );
  process.exitCode = 2;
}
