import { formatSpecies, type LedgerRow } from '@/lib/engine';
import { sharedDecimals } from '@/lib/plans/ledger-rows';
import { LedgerHead, LedgerLine } from './ledger';

const MICROMOL_PER_MOL = 1e6;
/** Below a hundredth of a nanomole per litre a species says nothing to a plant. */
const TRACE_MICROMOL_L = 1e-5;

/** Every species of the step in µmol/L, largest first. */
export function SpeciesAccount({ rows }: { rows: readonly LedgerRow[] }) {
  const written = rows
    .map(({ key, before, equilibrium }) => ({
      key,
      before: before * MICROMOL_PER_MOL,
      equilibrium: equilibrium * MICROMOL_PER_MOL,
    }))
    .filter(({ before, equilibrium }) => Math.max(before, equilibrium) >= TRACE_MICROMOL_L)
    .sort((a, b) => Math.max(b.before, b.equilibrium) - Math.max(a.before, a.equilibrium));
  return (
    <details className="border-b border-rule">
      <summary className="flex min-h-touch items-center py-2 font-semibold text-verdigris">
        ▸ Species, {written.length} of them, before and at equilibrium
      </summary>
      <div
        className="overflow-x-auto pb-4"
        tabIndex={0}
        role="region"
        aria-label="Ledger of species"
      >
        <table className="w-full min-w-136">
          <LedgerHead first="Species, µmol/L" />
          <tbody>
            {written.map(({ key, before, equilibrium }) => (
              <LedgerLine
                key={key}
                label={formatSpecies(key)}
                unit=""
                before={before}
                equilibrium={equilibrium}
                decimals={sharedDecimals(before, equilibrium)}
              />
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
