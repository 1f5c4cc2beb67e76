/** Prints the engine's speed as ratios of one run on this machine. `--full` adds the full counts (some minutes). */
import { cpus } from 'node:os';
import { ENGINE_VERSION } from '../../lib/engine';
import { benchIterations, benchQuestions } from './counts';
import { countMalformed, countWaters } from './full-count';
import { benchKernel } from './kernel';
import { table, type Line } from './measure';

const full = process.argv.includes('--full');
const [cpu] = cpus();
const machine = `${cpu?.model ?? 'unknown processor'}, ${cpus().length} cores, Node ${process.version}`;
const lines: Line[] = [
  ...benchKernel(),
  ...benchIterations(),
  ...benchQuestions(),
  ...countWaters(full ? 100_000 : 5_000),
  ...countMalformed(full ? 100_000 : 5_000),
];
process.stdout.write(`Engine ${ENGINE_VERSION} on ${machine}\n\n${table(lines)}\n`);
process.exitCode = lines.every((line) => line.met) ? 0 : 1;
