import type { ReactNode } from 'react';
import type { TrainStepKind } from '@/lib/plants/schema';

/** Our own drawings of the steps, as one would sketch them in a log: outline in ink, water in verdigris. */
const DRAWINGS: Record<TrainStepKind, ReactNode> = {
  intake: (
    <>
      <path d="M4 14c6-5 10 5 16 0s10 5 16 0 10 5 16 0" className="stroke-verdigris" />
      <path d="M4 23c6-5 10 5 16 0s10 5 16 0 10 5 16 0" className="stroke-verdigris" />
      <path d="M28 8v26m-6-5 6 6 6-6" />
    </>
  ),
  aeration: (
    <>
      <path d="M6 10h16v8h14v8h14v8" />
      <path d="M22 12c3 1 2 4 3 6m11 2c3 1 2 4 3 6m11 2c2 1 2 3 2 6" className="stroke-verdigris" />
    </>
  ),
  'rapid-mix': (
    <>
      <path d="M12 8v26h32V8" />
      <path d="M12 15h32" className="stroke-verdigris" />
      <path d="M28 3v20m-8 0c5-4 11 4 16 0" />
    </>
  ),
  clarifier: (
    <>
      <path d="M4 10v8l18 16h12l18-16v-8" />
      <path d="M4 15h48" className="stroke-verdigris" />
      <path d="M16 15v8m24-8v8" />
    </>
  ),
  softening: (
    <>
      <path d="M10 6l14 28h8L46 6" />
      <path d="M13 12h30" className="stroke-verdigris" />
      <path d="M22 24h1m5 3h1m-3-8h1m6 3h1" strokeLinecap="round" strokeWidth="3" />
    </>
  ),
  recarbonation: (
    <>
      <path d="M10 8v26h36V8" />
      <path d="M10 14h36" className="stroke-verdigris" />
      <circle cx="20" cy="27" r="2" />
      <circle cx="28" cy="22" r="2.5" />
      <circle cx="36" cy="28" r="2" />
    </>
  ),
  filter: (
    <>
      <path d="M8 6v28h40V6" />
      <path d="M8 11h40" className="stroke-verdigris" />
      <path d="M8 19h40M8 27h40" strokeDasharray="2 3" />
    </>
  ),
  'contact-tank': (
    <>
      <path d="M6 8v26h44V8" />
      <path d="M17 8v19m11 7V14m11-6v19" />
      <path d="M6 12h5m6 0h11m0 0h11m0 0h11" className="stroke-verdigris" />
    </>
  ),
  clearwell: (
    <>
      <path d="M6 12h44v22H6z" />
      <path d="M6 20h44" className="stroke-verdigris" />
      <path d="M12 12V7h8v5" />
    </>
  ),
  network: (
    <>
      <path d="M4 22h16m0 0 12-12h20M20 22h32M20 22l12 12h20" />
      <circle cx="20" cy="22" r="3" className="fill-verdigris stroke-verdigris" />
    </>
  ),
};

export function StepGlyph({ kind }: { kind: TrainStepKind }) {
  return (
    <svg
      viewBox="0 0 56 40"
      aria-hidden="true"
      className="h-10 w-14 stroke-ink"
      fill="none"
      strokeWidth="1.75"
    >
      {DRAWINGS[kind]}
    </svg>
  );
}
