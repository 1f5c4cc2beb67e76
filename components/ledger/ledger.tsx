import type { Ledger as EngineLedger, Water } from '@/lib/engine';
import { formatChange, formatNumber } from '@/lib/format';
import { writeRow } from '@/lib/plans/ledger-rows';
import { PLAN_QUANTITIES, PLAN_QUANTITY_KEYS, planQuantitiesOf } from '@/lib/plans/quantities';
import { Formula } from '@/components/ui/formula';
import { ReactionAccount } from './reaction-account';
import { SpeciesAccount } from './species-account';

/**
 * The account of one step: for each quantity and each species what there was before, the change, and what there is at
 * equilibrium; each opens to its equation, constant and source.
 */
export function Ledger({
  title,
  before,
  after,
  account,
}: {
  title: string;
  before: Water;
  after: Water;
  account: EngineLedger | null;
}) {
  const first = planQuantitiesOf(before);
  const last = planQuantitiesOf(after);
  return (
    <section aria-label={`Ledger, ${title}`}>
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Ledger of quantities">
        <table className="w-full min-w-136 border-y-2 border-ink">
          <caption className="pb-2 text-left font-head text-xl">
            Ledger{' '}
            <span className="font-text text-base text-ink-soft">
              <Formula>{title}</Formula>
            </span>
          </caption>
          <LedgerHead first="Quantity" />
          <tbody>
            {PLAN_QUANTITY_KEYS.map((key) => {
              const { label, unit, decimals } = PLAN_QUANTITIES[key];
              return (
                <LedgerLine
                  key={key}
                  label={label}
                  unit={unit}
                  before={first[key]}
                  equilibrium={last[key]}
                  decimals={decimals}
                />
              );
            })}
          </tbody>
        </table>
      </div>
      {account === null ? null : (
        <>
          <SpeciesAccount rows={account.species} />
          <ReactionAccount reactions={account.reactions} />
        </>
      )}
    </section>
  );
}

export function LedgerHead({ first }: { first: string }) {
  const figure = 'py-1.5 pr-3 pl-4 text-right text-sm font-normal text-ink-soft';
  return (
    <thead>
      <tr className="border-b border-rule-strong">
        <th scope="col" className="py-1.5 text-left text-sm font-normal text-ink-soft">
          {first}
        </th>
        <th scope="col" className={figure}>
          before
        </th>
        <th scope="col" className={`${figure} border-l border-rule`}>
          change
        </th>
        <th scope="col" className={`${figure} border-l-3 border-double border-verdigris text-ink`}>
          at equilibrium
        </th>
      </tr>
    </thead>
  );
}

export function LedgerLine({
  label,
  unit,
  before,
  equilibrium,
  decimals,
}: {
  label: string;
  unit: string;
  before: number | null;
  equilibrium: number | null;
  decimals: number;
}) {
  const row =
    before === null || equilibrium === null ? null : writeRow(before, equilibrium, decimals);
  const write = (value: number | null | undefined) =>
    value === null || value === undefined ? '–' : formatNumber(value, decimals);
  const figure = 'figure py-1 pr-3 pl-4 text-right';
  return (
    <tr className="border-b border-rule last:border-b-0 hover:bg-chalk-shade">
      <th scope="row" className="py-1 text-left font-normal">
        <Formula>{label}</Formula>
        {unit === '' ? null : (
          <>
            {' '}
            <span className="unit">
              <Formula>{unit}</Formula>
            </span>
          </>
        )}
      </th>
      <td className={figure}>{write(row?.before ?? before)}</td>
      <td className={`${figure} border-l border-rule text-ink-soft`}>
        {row === null ? '–' : formatChange(row.change, decimals)}
      </td>
      <td className={`${figure} border-l-3 border-double border-verdigris font-semibold`}>
        {write(row?.equilibrium ?? equilibrium)}
      </td>
    </tr>
  );
}
