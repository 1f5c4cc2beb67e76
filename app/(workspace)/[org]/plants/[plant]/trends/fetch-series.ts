import { paths } from '@/lib/paths';
import type { SeriesKey } from '@/lib/samples/describe';
import type { Series } from '@/lib/trends/schema';

export interface SeriesAsked {
  organisationSlug: string;
  plantSlug: string;
  point: string;
  quantity: SeriesKey;
  from: string;
  to: string;
}

/** One series from the API. Throws with the server's own sentence, or with one that says it could not be reached. */
export async function fetchSeries(
  { organisationSlug, plantSlug, ...query }: SeriesAsked,
  signal: AbortSignal,
): Promise<Series> {
  const address = `${paths.seriesApi(organisationSlug, plantSlug)}?${new URLSearchParams(query).toString()}`;
  const answer = await fetch(address, { signal }).catch((cause: unknown) => {
    throw new Error('Marlwick could not be reached. Check the connection and try again.', {
      cause,
    });
  });
  if (!answer.ok) {
    const body = (await answer.json().catch(() => null)) as { error?: { message?: string } } | null;
    throw new Error(body?.error?.message ?? 'The series could not be read.');
  }
  return (await answer.json()) as Series;
}
