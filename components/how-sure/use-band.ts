import { useCallback, useEffect, useRef, useState } from 'react';
import type { IndexBands } from '@/lib/samples/how-sure';
import type { BandMessage, BandRequest } from './messages';

export type BandState =
  | { readonly kind: 'idle' }
  | { readonly kind: 'drawing'; readonly share: number }
  | { readonly kind: 'done'; readonly answer: IndexBands }
  | { readonly kind: 'broken' };

/** One band at a time in a worker of its own: ask, watch its progress, stop it. Leaving the page stops it too. */
export function useBand() {
  const worker = useRef<Worker | null>(null);
  const [state, setState] = useState<BandState>({ kind: 'idle' });

  const end = useCallback(() => {
    worker.current?.terminate();
    worker.current = null;
  }, []);

  const ask = useCallback(
    (request: BandRequest) => {
      end();
      const started = new Worker(new URL('./band-worker.ts', import.meta.url), { type: 'module' });
      worker.current = started;
      setState({ kind: 'drawing', share: 0 });
      started.onmessage = ({ data }: MessageEvent<BandMessage>) => {
        if (data.kind === 'progress') setState({ kind: 'drawing', share: data.share });
        else {
          setState({ kind: 'done', answer: data.answer });
          end();
        }
      };
      started.onerror = () => {
        setState({ kind: 'broken' });
        end();
      };
      started.postMessage(request);
    },
    [end],
  );

  const stop = useCallback(() => {
    end();
    setState({ kind: 'idle' });
  }, [end]);

  useEffect(() => end, [end]);
  return { state, ask, stop };
}
