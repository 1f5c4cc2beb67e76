import { parentPort, workerData } from 'node:worker_threads';
import { answerLine } from '../../lib/engine/batch/answer-line';
import { isVerb } from '../../lib/engine/batch/verbs';

/** One thread of `engine -- <verb> --threads`: answers blocks of lines as they come. */
const verb: unknown = workerData;
if (typeof verb !== 'string' || !isVerb(verb)) throw new Error('A verb is needed.');

parentPort?.on('message', ({ block, lines }: { block: number; lines: readonly string[] }) => {
  const answers = lines.map((line) => answerLine(verb, line));
  parentPort?.postMessage({
    block,
    text: answers.map(({ line }) => `${line}\n`).join(''),
    lines: answers.length,
    failed: answers.some(({ failed }) => failed),
  });
});
