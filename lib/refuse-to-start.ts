import { env } from './env';

/** Ends the process when its settings will not do. */
export function refuseToStart(): void {
  try {
    env();
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  }
}
