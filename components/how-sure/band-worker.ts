import { howSureOfSample } from '@/lib/samples/how-sure';
import type { BandMessage, BandRequest } from './messages';

/** Draws in a worker, so that the page never waits for it. To stop it, the page ends the worker. */
const say = (message: BandMessage): void => self.postMessage(message);

self.onmessage = ({ data }: MessageEvent<BandRequest>) => {
  const answer = howSureOfSample(data.values, data.shown, data.draws, (share) => {
    say({ kind: 'progress', share });
    return true;
  });
  say({ kind: 'done', answer });
};
