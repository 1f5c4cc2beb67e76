import { beforeAll, describe, expect, inject, it } from 'vitest';
import type { Series } from '@/lib/trends/schema';
import { sessionCookie, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
let cookie: string;

beforeAll(async () => {
  cookie = await sessionCookie(baseUrl, signInOf(inject('signIns'), 'operator'));
});

const dayBefore = (days: number) =>
  new Date(Date.now() - days * 86_400_000).toISOString().slice(0, 10);

const ask = (query: Record<string, string>) =>
  fetch(
    `${baseUrl}/api/v1/calverdine/plants/quarrel-hill/series?${new URLSearchParams(query).toString()}`,
    { headers: { cookie } },
  );

const read = async (query: Record<string, string>): Promise<Series> => {
  const answer = await ask(query);
  expect(answer.status).toBe(200);
  return (await answer.json()) as Series;
};

const TWO_YEARS = { from: dayBefore(730), to: dayBefore(0) };

describe('a series of the demo', () => {
  it('is full on first start: two years of finished pH with its target', async () => {
    const series = await read({ point: 'finished', quantity: 'pH', ...TWO_YEARS });
    expect(series.count).toBeGreaterThan(650);
    expect(series.target?.lowest).toBeLessThan(series.target?.highest ?? 0);
    expect(series.summary?.median).toBeGreaterThan(7);
    expect(series.points.map(({ at }) => at)).toEqual(series.points.map(({ at }) => at).toSorted());
  });

  it('has the engine’s indices beside what was measured', async () => {
    const raw = await read({ point: 'raw', quantity: 'calciteIndex', ...TWO_YEARS });
    expect(raw.count).toBeGreaterThan(650);
    expect(raw.summary?.highest).toBeLessThan(-1);
  });

  it('stays within the asked days', async () => {
    const span = { from: dayBefore(40), to: dayBefore(31) };
    const series = await read({ point: 'raw', quantity: 'pH', ...span });
    expect(series.count).toBeGreaterThan(5);
    expect(series.points.every(({ at }) => at.slice(0, 10) >= dayBefore(41))).toBe(true);
    expect(series.points.every(({ at }) => at.slice(0, 10) <= span.to)).toBe(true);
  });

  it.each([
    [{ point: 'raw', quantity: 'gold', ...TWO_YEARS }, 422, /quantity/],
    [{ point: 'raw', quantity: 'pH', from: '2026-31-01', to: '2026-02-01' }, 422, /from/],
    [{ point: 'raw', quantity: 'pH', from: '2026-02-02', to: '2026-02-01' }, 422, /to/],
    [{ point: 'raw', quantity: 'pH' }, 422, /from/],
    [{ point: 'nowhere', quantity: 'pH', ...TWO_YEARS }, 404, /no such sampling point/],
  ])('answers %j with %d and a sentence', async (query, status, message) => {
    const answer = await ask(query);
    expect(answer.status).toBe(status);
    const { error } = (await answer.json()) as { error: { message: string } };
    expect(error.message).toMatch(message);
  });
});
