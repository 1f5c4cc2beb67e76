import { Worker } from 'node:worker_threads';

export interface ThreadOptions {
  readonly threads: number;
  /** Writes answered text; its promise holds the run back while the reader is slow. */
  readonly write: (text: string) => Promise<void>;
  readonly onProgress?: (answered: number, read: number) => void;
}

interface Answered {
  readonly block: number;
  readonly text: string;
  readonly lines: number;
  readonly failed: boolean;
}

/** Lines a thread is given at a time: enough to spare messages, few enough that a season's progress is seen. */
const BLOCK_LINES = 8;
/** Blocks waiting for a thread or for their turn to be written, per thread. */
const WAITING = 8;

/** Answers lines on several threads and writes the answers in the order of the lines; true when any was an error. */
export async function answerOnThreads(
  verb: string,
  lines: AsyncIterable<string>,
  { threads, write, onProgress }: ThreadOptions,
): Promise<boolean> {
  const workers = Array.from(
    { length: threads },
    () => new Worker(new URL('./thread.mjs', import.meta.url), { workerData: verb }),
  );
  const idle = [...workers];
  const finished = new Map<number, Answered>();
  let wake: () => void = () => undefined;
  let broken: Error | undefined;
  let failed = false;
  let read = 0;
  let answered = 0;
  let sent = 0;
  let written = 0;
  for (const worker of workers) {
    worker.on('message', (answer: Answered) => {
      finished.set(answer.block, answer);
      answered += answer.lines;
      failed ||= answer.failed;
      onProgress?.(answered, read);
      idle.push(worker);
      wake();
    });
    worker.on('error', (error) => {
      broken = error;
      wake();
    });
  }
  const change = () => new Promise<void>((resolve) => (wake = resolve));
  const writeInTurn = async () => {
    for (let next = finished.get(written); next; next = finished.get(written)) {
      finished.delete(written++);
      await write(next.text);
    }
  };
  const send = async (block: readonly string[]) => {
    while (!broken && (idle.length === 0 || sent - written >= threads * WAITING)) {
      await writeInTurn();
      if (idle.length === 0 || sent - written >= threads * WAITING) await change();
    }
    if (broken) throw broken;
    idle.pop()?.postMessage({ block: sent++, lines: block });
  };
  try {
    let block: string[] = [];
    for await (const line of lines) {
      read++;
      block.push(line);
      if (block.length < BLOCK_LINES) continue;
      await send(block);
      block = [];
    }
    if (block.length > 0) await send(block);
    while (written < sent) {
      await writeInTurn();
      if (written < sent) await change();
      if (broken) throw broken;
    }
    return failed;
  } finally {
    await Promise.all(workers.map((worker) => worker.terminate()));
  }
}
