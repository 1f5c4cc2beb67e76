import { INDEX_NOTES, type WaterIndices } from '@/lib/engine';
import { INDICES, type IndexKey } from '@/lib/samples/indices';
import { Formula } from '@/components/ui/formula';

/** Which note of the engine belongs to which index kept with a sample. */
const NOTE_OF: Partial<Record<IndexKey, keyof WaterIndices>> = {
  calciteIndex: 'calciteIndex',
  langelier: 'langelier',
  precipitationPotential: 'precipitationPotentialMgLCaCO3',
  saturationPH: 'saturationPH',
  ryznar: 'ryznar',
  larson: 'larson',
  chlorideSulfateMassRatio: 'chlorideSulfateMassRatio',
  bufferIntensity: 'bufferIntensityMeqLPerPH',
  totalHardness: 'totalHardnessMgLCaCO3',
};

/** Formula, source, range of use and sign of every index shown. */
export function IndexNotes({ shown }: { shown: readonly IndexKey[] }) {
  return (
    <details className="mt-3 border-y border-rule">
      <summary className="flex min-h-touch items-center font-semibold text-verdigris">
        ▸ Formulas, sources and where each index may be used
      </summary>
      <dl className="ruled pb-3 text-sm">
        {shown.map((key) => {
          const noteKey = NOTE_OF[key];
          if (noteKey === undefined) return null;
          const { formula, source, use, sign } = INDEX_NOTES[noteKey];
          return (
            <div key={key} className="py-2">
              <dt className="font-semibold">{INDICES[key].label}</dt>
              <dd>
                <Formula>{formula}</Formula>
              </dd>
              <dd className="text-ink-soft">
                {sign}. Use: <Formula>{use}</Formula>. Source: {source}.
              </dd>
            </div>
          );
        })}
      </dl>
    </details>
  );
}
