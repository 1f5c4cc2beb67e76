'use client';

import { differenceInCalendarDays, parseISO } from 'date-fns';
import { useId } from 'react';
import { inputClass } from '@/components/forms/input-class';
import { TextField } from '@/components/forms/text-field';
import { Formula } from '@/components/ui/formula';
import type { SeriesKey } from '@/lib/samples/describe';
import { MOST_PANELS, SPANS, type TrendChoices } from '@/lib/trends/choices';
import { firstDayOf, type TrendChange, type TrendPoint } from './use-trend-state';

/** Point, span and quantities. */
export function TrendControls({
  choices,
  point,
  quantities,
  from,
  to,
  onChoose,
}: {
  choices: TrendChoices;
  point: TrendPoint;
  quantities: readonly SeriesKey[];
  from: string;
  to: string;
  onChoose: (change: TrendChange) => void;
}) {
  const pointId = useId();
  const span = differenceInCalendarDays(parseISO(to), parseISO(from)) + 1;
  const toggle = (key: SeriesKey, isOn: boolean) =>
    onChoose({
      quantity: isOn ? [...quantities, key] : quantities.filter((other) => other !== key),
    });
  return (
    <div className="screen-only grid gap-4 border-y border-rule py-4">
      <div className="flex flex-wrap items-end gap-x-6 gap-y-4">
        <div className="w-48">
          <label htmlFor={pointId} className="block font-semibold">
            Sampling point
          </label>
          <select
            id={pointId}
            value={point.slug}
            onChange={(event) => onChoose({ point: event.target.value, quantity: undefined })}
            className={`mt-1 ${inputClass(false)}`}
          >
            {choices.points.map(({ slug, name }) => (
              <option key={slug} value={slug}>
                {name}
              </option>
            ))}
          </select>
        </div>
        <fieldset>
          <legend className="font-semibold">Span</legend>
          <div className="mt-1 flex flex-wrap">
            {SPANS.map(({ days, label }) => (
              <label
                key={days}
                className={`-ml-px flex min-h-touch cursor-pointer items-center border border-rule-strong px-3 first:ml-0 focus-within:outline-3 focus-within:outline-verdigris ${
                  span === days && to === choices.today
                    ? 'bg-verdigris-wash font-semibold'
                    : 'text-ink-soft hover:bg-chalk-shade'
                }`}
              >
                <input
                  type="radio"
                  name="span"
                  className="sr-only"
                  checked={span === days && to === choices.today}
                  onChange={() =>
                    onChoose({ from: firstDayOf(days, choices.today), to: choices.today })
                  }
                />
                {label}
              </label>
            ))}
          </div>
        </fieldset>
        <div className="flex flex-wrap gap-3">
          <TextField
            label="From"
            type="date"
            value={from}
            max={to}
            onChange={(event) => onChoose({ from: event.target.value, to })}
          />
          <TextField
            label="To"
            type="date"
            value={to}
            min={from}
            max={choices.today}
            onChange={(event) => onChoose({ from, to: event.target.value })}
          />
        </div>
      </div>
      <details>
        <summary className="flex min-h-touch flex-wrap items-center gap-x-2">
          <strong className="text-verdigris">▸ Quantities and indices</strong>
          <span className="text-sm text-ink-soft">
            {quantities.length} of at most {MOST_PANELS} panels
          </span>
        </summary>
        <fieldset>
          <legend className="sr-only">Quantities and indices</legend>
          <div className="mt-1 grid grid-cols-1 gap-x-6 min-[24rem]:grid-cols-2 md:grid-cols-3 xl:grid-cols-5">
            {point.quantities.map(({ key, label }) => {
              const isOn = quantities.includes(key);
              return (
                <label
                  key={key}
                  className="flex min-h-touch cursor-pointer items-center gap-2 leading-tight"
                >
                  <input
                    type="checkbox"
                    checked={isOn}
                    disabled={!isOn && quantities.length >= MOST_PANELS}
                    onChange={(event) => toggle(key, event.target.checked)}
                    className="size-5 shrink-0 accent-verdigris"
                  />
                  <span>
                    <Formula>{label}</Formula>
                  </span>
                </label>
              );
            })}
          </div>
        </fieldset>
      </details>
    </div>
  );
}
