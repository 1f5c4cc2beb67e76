import type { LedgerReaction } from '@/lib/engine';
import { formatChange, formatNumber } from '@/lib/format';
import { Formula } from '@/components/ui/formula';

const MICROMOL_PER_MOL = 1e6;

/** The reactions that ran: how far each went, its constant, and the quotient it came to rest at. */
export function ReactionAccount({ reactions }: { reactions: readonly LedgerReaction[] }) {
  const ran = [...reactions].sort((a, b) => Math.abs(b.extentMolKg) - Math.abs(a.extentMolKg));
  return (
    <details className="border-b border-rule">
      <summary className="flex min-h-touch items-center py-2 font-semibold text-verdigris">
        ▸ Reactions, {ran.length} of them, with constants and sources
      </summary>
      <div className="overflow-x-auto pb-4" tabIndex={0} role="region" aria-label="Reactions">
        <table className="w-full min-w-176 text-[0.95rem]">
          <thead>
            <tr className="border-b border-rule-strong text-sm text-ink-soft">
              <th scope="col" className="py-1.5 text-left font-normal">
                Reaction
              </th>
              <th scope="col" className="py-1.5 pl-4 text-right font-normal">
                ran by, µmol/L
              </th>
              <th scope="col" className="py-1.5 pl-4 text-right font-normal">
                log K
              </th>
              <th scope="col" className="py-1.5 pl-4 text-right font-normal">
                log quotient
              </th>
              <th scope="col" className="py-1.5 pl-6 text-left font-normal">
                Source of K
              </th>
            </tr>
          </thead>
          <tbody>
            {ran.map(({ key, equation, extentMolKg, logK, logQuotient, source, complete }) => (
              <tr key={key} className="border-b border-rule last:border-b-0">
                <th scope="row" className="py-1 text-left font-normal whitespace-nowrap">
                  <Formula>{equation}</Formula>
                </th>
                <td className="figure py-1 pl-4 text-right">
                  {formatChange(extentMolKg * MICROMOL_PER_MOL, 3)}
                </td>
                {complete === true ? (
                  <td colSpan={2} className="py-1 pl-4 text-right text-sm text-ink-soft">
                    ran to its end
                  </td>
                ) : (
                  <>
                    <td className="figure py-1 pl-4 text-right">{formatNumber(logK, 4)}</td>
                    <td className="figure py-1 pl-4 text-right">{formatNumber(logQuotient, 4)}</td>
                  </>
                )}
                <td className="py-1 pl-6 text-sm text-ink-soft">{source}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
