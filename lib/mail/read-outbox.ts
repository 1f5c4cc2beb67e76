import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { env } from '@/lib/env';
import { notFound } from '@/lib/errors';

const SHOWN = 50;

export interface OutboxLetter {
  readonly name: string;
  readonly to: string;
  readonly subject: string;
  readonly at: Date | null;
  readonly text: string;
}

/** What the local SMTP fake was sent, newest first. Throws `notFound` where no fake is on. */
export async function readOutbox(): Promise<OutboxLetter[]> {
  const folder = env().MARLWICK_OUTBOX;
  if (folder === undefined) throw notFound('page');
  const names = (await readdir(folder).catch(() => []))
    .filter((name) => name.endsWith('.eml'))
    .sort()
    .reverse();
  return Promise.all(
    names.slice(0, SHOWN).map(async (name) => {
      const letter = await simpleParser(await readFile(join(folder, name)));
      const to = Array.isArray(letter.to) ? letter.to : letter.to ? [letter.to] : [];
      return {
        name,
        to: to.map(({ text }) => text).join(', '),
        subject: letter.subject ?? '',
        at: letter.date ?? null,
        text: letter.text ?? '',
      };
    }),
  );
}
