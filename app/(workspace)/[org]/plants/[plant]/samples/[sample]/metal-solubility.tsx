import {
  copperOneSolubilityOf,
  copperSolubilityOf,
  leadSolubilityOf,
  type Solubility,
  type Water,
} from '@/lib/engine';
import { Figure } from '@/components/ui/figure';
import { formatSignificant } from '@/lib/format';

/** Above this the metal is no trace any more, and the model that takes it for one says nothing. */
const MOST_MG_L = 20;

/** Lead and copper as what they are: a model's equilibrium with a named solid, never a verdict on the tap. */
export function MetalSolubility({ water }: { water: Water }) {
  const metals = [
    { name: 'Lead', rows: leadSolubilityOf(water) },
    { name: 'Copper(II)', rows: copperSolubilityOf(water) },
    { name: 'Copper(I), water without oxidant', rows: copperOneSolubilityOf(water) },
  ];
  return (
    <details className="border-b border-rule">
      <summary className="flex min-h-touch items-center font-semibold text-verdigris">
        ▸ Theoretical lead and copper solubility
      </summary>
      <p className="text-sm text-ink-soft">
        What a model’s equilibrium with each named solid would hold in this water, with constants
        for 25 °C. It is no forecast of the tap and no sign of protection: sample the taps by your
        rule.
      </p>
      {metals.map(({ name, rows }) => (
        <MetalTable key={name} name={name} rows={rows} />
      ))}
    </details>
  );
}

function MetalTable({ name, rows }: { name: string; rows: readonly Solubility[] }) {
  return (
    <table className="my-2 w-full text-sm">
      <caption className="text-left font-semibold">{name}</caption>
      <tbody className="ruled">
        {rows.map(({ solid, mgL }) => (
          <tr key={solid}>
            <th scope="row" className="py-1 text-left font-normal">
              with {solid.replaceAll('-', ' ')}
            </th>
            <td className="py-1 text-right">
              {mgL > MOST_MG_L ? (
                <span className="text-ink-soft">does not hold in this water</span>
              ) : (
                <Figure unit="mg/L">{formatSignificant(mgL, 2)}</Figure>
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
