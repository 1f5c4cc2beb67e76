'use client';

import type { UseFormRegisterReturn } from 'react-hook-form';
import { FieldProblem } from './field-problem';
import { inputClass } from './input-class';
import { Formula } from '@/components/ui/formula';
import { formatNumber } from '@/lib/format';
import { checkResult, unusualRemark, type WrittenResult } from '@/lib/samples/check-result';
import type { EntryField } from '@/lib/samples/entry-sheet';
import { fromCanonical, QUANTITIES } from '@/lib/samples/quantities';

const QUALIFIER_OPTIONS = [
  { value: '', label: '=', words: 'as measured' },
  { value: '<', label: '<', words: 'less than' },
  { value: '>', label: '>', words: 'more than' },
  { value: 'nd', label: 'n.d.', words: 'not detected, limit' },
  { value: 'e', label: 'est.', words: 'estimated' },
] as const;

/** One line of the sheet: unit in the label, qualifier apart, last value and usual range beside, echo beneath. */
export function ResultField({
  field,
  written,
  textField,
  qualifierField,
  problem,
}: {
  field: EntryField;
  written: WrittenResult;
  textField: UseFormRegisterReturn;
  qualifierField: UseFormRegisterReturn;
  problem?: string;
}) {
  const { quantity, label, unit } = field;
  const id = `result-${quantity}`;
  const hasUnit = unit !== label;
  return (
    <div className="grid items-start gap-x-4 gap-y-1 py-2.5 sm:grid-cols-[minmax(10rem,1fr)_16rem_minmax(9rem,1fr)]">
      <label htmlFor={id} className="self-center leading-snug">
        <span className="font-semibold">{label}</span>
        {hasUnit ? (
          <>
            {', '}
            <span className="text-sm whitespace-nowrap text-ink-soft">
              <Formula>{unit}</Formula>
            </span>
          </>
        ) : null}
      </label>
      <div>
        <div className="flex">
          <input
            {...textField}
            id={id}
            type="text"
            inputMode={quantity === 'temperature' ? 'text' : 'decimal'}
            autoComplete="off"
            spellCheck={false}
            aria-invalid={problem !== undefined}
            aria-describedby={`${id}-aside${problem === undefined ? '' : ` ${id}-problem`}`}
            className={`figure ${inputClass(problem !== undefined)} text-right`}
          />
          <select
            {...qualifierField}
            aria-label={`${label}, qualifier`}
            className="min-h-touch w-16 shrink-0 border border-l-0 border-rule-strong bg-chalk px-1 text-sm"
          >
            {QUALIFIER_OPTIONS.map((option) => (
              <option key={option.value} value={option.value} aria-label={option.words}>
                {option.label}
              </option>
            ))}
          </select>
        </div>
        <FieldProblem id={`${id}-problem`}>{problem}</FieldProblem>
        {problem === undefined ? <Echo field={field} written={written} /> : null}
      </div>
      <p id={`${id}-aside`} className="self-center text-sm text-ink-soft">
        <Aside field={field} />
      </p>
    </div>
  );
}

function Aside({ field: { last, usualLow, usualHigh, decimals } }: { field: EntryField }) {
  const usual =
    usualLow === null || usualHigh === null
      ? null
      : `${formatNumber(usualLow, decimals)} to ${formatNumber(usualHigh, decimals)}`;
  return (
    <>
      {last === null ? (
        'not measured yet'
      ) : (
        <>
          last <span className="figure">{last.text}</span>, {last.age}
        </>
      )}
      {usual === null ? null : (
        <>
          <br />
          usual <span className="figure">{usual}</span>
        </>
      )}
    </>
  );
}

/** What was understood, where that is not plain from what was typed, and whether it is unusual. */
function Echo({ field, written }: { field: EntryField; written: WrittenResult }) {
  const checked = checkResult(written);
  if (checked.kind !== 'value') return null;
  const inField = fromCanonical(field.quantity, checked.value, field.unit);
  const remark = checked.qualifier === '' ? unusualRemark(inField, field) : null;
  const [canonical] = QUANTITIES[field.quantity].units;
  const parts = [
    ...(checked.qualifier === ''
      ? []
      : [QUALIFIER_OPTIONS.find(({ value }) => value === checked.qualifier)?.words]),
    ...(canonical.label === field.unit
      ? []
      : [
          `= ${formatNumber(checked.value, QUANTITIES[field.quantity].decimals)} ${canonical.label}`,
        ]),
  ];
  if (parts.length === 0 && remark === null) return null;
  return (
    <p className="mt-1 text-sm">
      {parts.length === 0 ? null : (
        <span className="text-ink-soft">
          <Formula>{parts.join(', ')}</Formula>
        </span>
      )}
      {remark === null ? null : (
        <span className="block text-ochre">
          <strong>Watch:</strong> {remark}. Kept as typed.
        </span>
      )}
    </p>
  );
}
