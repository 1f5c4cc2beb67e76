import { Formula } from '@/components/ui/formula';
import type { KeptSample } from '@/db/queries/samples';
import { isQuantityKey, QUANTITIES, QUANTITY_KEYS } from '@/lib/samples/quantities';

const QUALIFIER_WORDS = {
  '': '',
  '<': '<',
  '>': '>',
  nd: 'not detected at',
  e: 'estimated',
} as const;

/** The results exactly as the person wrote them, decimals and qualifier kept. */
export function ResultTable({ results }: { results: KeptSample['results'] }) {
  const ordered = [...results].sort(
    (a, b) =>
      QUANTITY_KEYS.findIndex((k) => k === a.quantity) -
      QUANTITY_KEYS.findIndex((k) => k === b.quantity),
  );
  return (
    <table className="mt-2 w-full border-y border-rule-strong">
      <thead className="sr-only">
        <tr>
          <th scope="col">Quantity</th>
          <th scope="col">Result</th>
          <th scope="col">Unit</th>
        </tr>
      </thead>
      <tbody>
        {ordered.map(({ quantity, text, unit, qualifier }) => {
          const label = isQuantityKey(quantity) ? QUANTITIES[quantity].label : quantity;
          return (
            <tr key={quantity} className="border-b border-rule last:border-b-0">
              <th scope="row" className="py-1.5 text-left font-normal">
                {label}
              </th>
              <td className="figure py-1.5 pl-4 text-right font-semibold">
                {qualifier === '' ? null : (
                  <span className="font-normal text-ink-soft">{QUALIFIER_WORDS[qualifier]} </span>
                )}
                {text}
              </td>
              <td className="py-1.5 pl-2">
                <span className="unit">{unit === label ? '' : <Formula>{unit}</Formula>}</span>
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
