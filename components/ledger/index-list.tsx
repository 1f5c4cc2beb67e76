import { INDICES, type IndexKey } from '@/lib/samples/indices';
import { formatNumber } from '@/lib/format';
import { Figure } from '@/components/ui/figure';

/** Indices with their meaning in words beneath each: the sign of none is left to memory. */
export function IndexList({
  indices,
  shown,
}: {
  indices: Readonly<Partial<Record<IndexKey, number>>>;
  shown: readonly IndexKey[];
}) {
  return (
    <dl className="ruled mt-2">
      {shown.map((key) => {
        const value = indices[key];
        const { label, unit, decimals, meaning } = INDICES[key];
        return (
          <div key={key} className="py-1.5">
            <div className="flex items-baseline justify-between gap-3">
              <dt>{label}</dt>
              <dd className="text-right font-semibold">
                {value === undefined ? (
                  <span className="text-sm font-normal text-ink-soft">no meaning here</span>
                ) : (
                  <Figure unit={unit}>{formatNumber(value, decimals)}</Figure>
                )}
              </dd>
            </div>
            <p className="text-sm text-ink-soft">{meaning}</p>
          </div>
        );
      })}
    </dl>
  );
}
