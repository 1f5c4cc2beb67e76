import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const STATUSES = ['met', 'n.a.', 'open'];
const text = readFileSync('docs/asvs.md', 'utf8');
const cellsOf = (line: string): string[] =>
  line
    .split('|')
    .slice(1, -1)
    .map((cell) => cell.trim());

const rows = text
  .split('\n')
  .filter((line) => /^\| V\d/.test(line))
  .map((line) => {
    const [id = '', level = '', asks = '', status = '', shownBy = '', ...rest] = cellsOf(line);
    return { id, level, asks, status, shownBy, rest };
  });
const ofLevel = (level: string) => rows.filter((row) => row.level === level);

/** How many requirements each chapter of ASVS 5.0.0 has at level 1 and at level 2. */
const CHAPTERS: readonly (readonly [number, number])[] = [
  [8, 19],
  [4, 7],
  [8, 11],
  [2, 8],
  [4, 5],
  [13, 22],
  [6, 12],
  [4, 3],
  [4, 3],
  [5, 24],
  [3, 11],
  [3, 6],
  [1, 12],
  [2, 7],
  [3, 10],
  [0, 16],
  [0, 7],
];

/** Files and folders of the project that a row names. */
const pathsIn = (shownBy: string): string[] =>
  [...shownBy.matchAll(/`([^`]+)`/g)]
    .map(([, code = '']) => code)
    .filter((code) => /^(?:tests|lib|app|db|components|docker-free-scripts)\//.test(code));

describe('docs/asvs.md', () => {
  it('has every requirement of level 1 and level 2, once', () => {
    expect(ofLevel('1')).toHaveLength(70);
    expect(ofLevel('2')).toHaveLength(183);
    expect(new Set(rows.map(({ id }) => id)).size).toBe(253);
    const counted = CHAPTERS.map((_counts, i) =>
      ['1', '2'].map(
        (level) => ofLevel(level).filter(({ id }) => id.startsWith(`V${i + 1}.`)).length,
      ),
    );
    expect(counted).toEqual(CHAPTERS);
  });

  it('says of each what it asks, where it stands and why', () => {
    const odd = rows.filter(
      ({ id, asks, status, shownBy, rest }) =>
        !/^V\d+\.\d+\.\d+$/.test(id) ||
        asks === '' ||
        shownBy === '' ||
        rest.length > 0 ||
        !STATUSES.includes(status),
    );
    expect(odd).toEqual([]);
  });

  it('calls nothing met without a test, a file or a section that shows it', () => {
    const unshown = rows.filter(
      ({ status, shownBy }) =>
        status === 'met' &&
        !/\(#[a-z-]+\)/.test(shownBy) &&
        !pathsIn(shownBy).some((path) => existsSync(path)),
    );
    expect(unshown.map(({ id, shownBy }) => `${id}: ${shownBy}`)).toEqual([]);
  });

  it('names only what is there', () => {
    const missing = rows.flatMap(({ id, shownBy }) =>
      pathsIn(shownBy)
        .filter((path) => !existsSync(path))
        .map((path) => `${id} names ${path}`),
    );
    expect(missing).toEqual([]);
    const headings = new Set(
      [...text.matchAll(/^#+ (.+)$/gm)].map(([, words = '']) =>
        words
          .toLowerCase()
          .replaceAll(/[^a-z0-9 -]/g, '')
          .replaceAll(' ', '-'),
      ),
    );
    const lost = [...text.matchAll(/\(#([^)]+)\)/g)].filter(([, to = '']) => !headings.has(to));
    expect(lost.map(([link]) => link)).toEqual([]);
  });

  it('counts at the top what its tables hold, and lists what is open', () => {
    for (const level of ['1', '2']) {
      const counts = STATUSES.map(
        (status) => ofLevel(level).filter((row) => row.status === status).length,
      );
      const line = text.split('\n').find((candidate) => candidate.startsWith(`| ${level} `)) ?? '';
      expect(cellsOf(line).map(Number)).toEqual([Number(level), ...counts, ofLevel(level).length]);
      const list =
        new RegExp(`^Open at level ${level}: ([^a-z]+)\\.\\n\\n`, 'm').exec(text)?.[1] ?? '';
      const open = ofLevel(level).filter(({ status }) => status === 'open');
      expect(list.split(/,\s+/)).toEqual(open.map(({ id }) => id));
    }
  });
});
