import { inputClass } from '@/components/forms/input-class';
import { Button } from '@/components/ui/button';
import { AUDIT_WORDS, type AuditQuery } from '@/lib/audit/schema';

/** By kind, person and day; a plain form, so the address holds the filter and it works without scripts. */
export function AuditFilterForm({
  action,
  filter,
  people,
}: {
  action: string;
  filter: AuditQuery;
  people: readonly { readonly id: string; readonly name: string }[];
}) {
  return (
    <form
      action={action}
      className="screen-only mb-5 grid items-end gap-3 sm:grid-cols-2 lg:grid-cols-[2fr_2fr_1fr_1fr_auto]"
    >
      <label>
        <span className="block text-sm font-semibold">Kind of change</span>
        <select name="action" defaultValue={filter.action ?? ''} className={inputClass(false)}>
          <option value="">Any</option>
          {Object.entries(AUDIT_WORDS).map(([key, words]) => (
            <option key={key} value={key}>
              {words}
            </option>
          ))}
        </select>
      </label>
      <label>
        <span className="block text-sm font-semibold">Person</span>
        <select name="person" defaultValue={filter.person ?? ''} className={inputClass(false)}>
          <option value="">Anyone</option>
          {people.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </select>
      </label>
      <label>
        <span className="block text-sm font-semibold">From (UTC day)</span>
        <input type="date" name="from" defaultValue={filter.from} className={inputClass(false)} />
      </label>
      <label>
        <span className="block text-sm font-semibold">To</span>
        <input type="date" name="to" defaultValue={filter.to} className={inputClass(false)} />
      </label>
      <Button type="submit">Filter</Button>
    </form>
  );
}
