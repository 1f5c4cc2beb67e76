'use client';

import { addDays, format, isValid, parseISO } from 'date-fns';
import { parseAsArrayOf, parseAsString, useQueryStates } from 'nuqs';
import type { SeriesKey } from '@/lib/samples/describe';
import { DEFAULT_SPAN_DAYS, MOST_PANELS, type TrendChoices } from '@/lib/trends/choices';

const parsers = {
  point: parseAsString,
  quantity: parseAsArrayOf(parseAsString),
  from: parseAsString,
  to: parseAsString,
};

export type TrendPoint = TrendChoices['points'][number];

export interface TrendChange {
  point?: string;
  quantity?: SeriesKey[];
  from?: string;
  to?: string;
}

const DAY = 'yyyy-MM-dd';

/** `days` ending on a day, that day included: the first of them. */
export const firstDayOf = (days: number, lastDay: string): string =>
  format(addDays(parseISO(lastDay), 1 - days), DAY);

const isDay = (text: string | null): text is string =>
  text !== null && /^\d{4}-\d{2}-\d{2}$/.test(text) && isValid(parseISO(text));

/** The trend asked for by the address; what it does not say, or says wrongly, falls back to something sensible. */
export function useTrendState(choices: TrendChoices): {
  point: TrendPoint;
  quantities: SeriesKey[];
  from: string;
  to: string;
  choose: (change: TrendChange) => void;
} {
  const [state, setState] = useQueryStates(parsers, { history: 'replace' });
  const finished = choices.points.find(({ slug }) => slug === 'finished');
  const point =
    choices.points.find(({ slug }) => slug === state.point) ?? finished ?? choices.points[0];
  if (point === undefined) throw new Error('A trend needs a sampling point.');
  const known = new Set<string>(point.quantities.map(({ key }) => key));
  const asked = state.quantity?.filter((key): key is SeriesKey => known.has(key));
  const to = isDay(state.to) ? state.to : choices.today;
  const from =
    isDay(state.from) && state.from <= to ? state.from : firstDayOf(DEFAULT_SPAN_DAYS, to);
  return {
    point,
    quantities: (asked ?? [...point.first]).slice(0, MOST_PANELS),
    from,
    to,
    choose: (change) => void setState(change),
  };
}
