import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { openMail } from '@/docker-free-scripts/setup/mail.mjs';
import { Supervisor } from '@/docker-free-scripts/setup/supervisor.mjs';

export interface Letter {
  to: string;
  subject: string;
  text: string;
}

/** Everything the SMTP fake has kept in a folder, oldest first. */
export async function lettersIn(folder: string): Promise<Letter[]> {
  const names = readdirSync(folder)
    .filter((name) => name.endsWith('.eml'))
    .sort();
  return Promise.all(
    names.map(async (name) => {
      const letter = await simpleParser(readFileSync(join(folder, name)));
      const to = Array.isArray(letter.to) ? letter.to[0] : letter.to;
      return { to: to?.text ?? '', subject: letter.subject ?? '', text: letter.text ?? '' };
    }),
  );
}

/** The newest letter to an address, once there is one. */
export async function letterTo(folder: string, address: string, subject: RegExp): Promise<Letter> {
  for (let tries = 0; tries < 100; tries++) {
    const found = (await lettersIn(folder))
      .filter((letter) => letter.to === address && subject.test(letter.subject))
      .at(-1);
    if (found !== undefined) return found;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error(`No letter ${String(subject)} came for ${address}.`);
}

/** The secret behind the # of a letter's link. */
export const secretIn = ({ text }: Letter): string => /#([A-Za-z0-9_-]{43})/.exec(text)?.[1] ?? '';

/** A mail fake for one test file; its settings go into the environment before anything reads them. */
export async function openTestMail(): Promise<{ folder: string; close: () => Promise<void> }> {
  const folder = mkdtempSync(join(tmpdir(), 'marlwick-letters-'));
  const supervisor = new Supervisor();
  Object.assign(process.env, await openMail(supervisor, folder, `mail-${process.pid}`));
  return {
    folder,
    close: async () => {
      await supervisor.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
