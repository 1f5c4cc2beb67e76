import type { ReactNode } from 'react';

export type Tone = 'calm' | 'watch' | 'act';

const TONES: Record<Tone, { word: string; colour: string; edge: string }> = {
  calm: { word: 'Note', colour: 'text-verdigris', edge: 'border-verdigris bg-verdigris-wash' },
  watch: { word: 'Watch', colour: 'text-ochre', edge: 'border-ochre bg-ochre-wash' },
  act: { word: 'Act now', colour: 'text-rust', edge: 'border-rust bg-rust-wash' },
};

/** A remark in the margin of the log: never colour alone, a word leads. */
export function Notice({
  tone,
  title,
  children,
  role,
}: {
  tone: Tone;
  title?: string;
  children: ReactNode;
  role?: 'alert' | 'status';
}) {
  const { word, colour, edge } = TONES[tone];
  return (
    <div role={role} className={`border-l-4 px-4 py-2.5 ${edge}`}>
      <p>
        <strong className={colour}>{title ?? word}.</strong> {children}
      </p>
    </div>
  );
}
