import type { ReagentKey } from '@/lib/engine';
import { cautionsFor, GENERAL_CAUTION } from '@/lib/plans/cautions';

/** The cautions that stand beside every dose, on screen and on paper. */
export function DoseCautions({ reagents }: { reagents: readonly ReagentKey[] }) {
  const sentences = [...new Set(reagents.flatMap((reagent) => cautionsFor(reagent)))];
  return (
    <section
      aria-label="Cautions"
      className="border-l-4 border-ochre bg-ochre-wash px-4 py-3 text-[0.95rem]"
    >
      <p>
        <strong className="text-ochre">Before you feed anything.</strong> {GENERAL_CAUTION}
      </p>
      <ul className="mt-1 list-disc pl-5">
        {sentences.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </section>
  );
}
