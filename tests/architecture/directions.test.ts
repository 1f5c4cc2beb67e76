import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { importsOf, sourceFiles, type Import } from './imports';

const files = sourceFiles();
const graph = new Map(files.map((file) => [file, importsOf(file)]));
const inside = (folder: string) => (file: string) => file.startsWith(`${folder}/`);

/** All imports from files of `from` that `isForbidden`, as `file → target` lines. */
function violations(
  from: (file: string) => boolean,
  isForbidden: (imported: Import, file: string) => boolean,
): string[] {
  return files
    .filter(from)
    .flatMap((file) =>
      (graph.get(file) ?? [])
        .filter((imported) => isForbidden(imported, file))
        .map(({ target }) => `${file} → ${target}`),
    );
}

/** Every file reached at run time from `start`, through imports that are not erased. */
function reached(start: string): Set<string> {
  const seen = new Set<string>();
  const queue = [start];
  for (let file = queue.pop(); file !== undefined; file = queue.pop()) {
    if (seen.has(file)) continue;
    seen.add(file);
    for (const imported of graph.get(file) ?? []) {
      if (!imported.isTypeOnly && !isServerAction(imported.target)) queue.push(imported.target);
    }
  }
  return seen;
}

const firstLine = (file: string): string => readFileSync(file, 'utf8').split('\n', 1)[0] ?? '';
const isClient = (file: string): boolean => firstLine(file).includes("'use client'");
/** An action reaches the browser as a reference only. */
const isServerAction = (file: string): boolean =>
  graph.has(file) && firstLine(file).includes("'use server'");

const isPackage =
  (...names: string[]) =>
  ({ isPackage, target }: Import): boolean =>
    isPackage && names.some((name) => target === name || target.startsWith(`${name}/`));

describe('import directions', () => {
  it('sees the whole product', () => {
    expect(files.length).toBeGreaterThan(80);
  });

  it('the engine imports only itself', () => {
    expect(
      violations(
        inside('lib/engine'),
        ({ target, isPackage }) => isPackage || !inside('lib/engine')(target),
      ),
    ).toEqual([]);
  });

  it('the engine’s numeric room imports nothing outside itself', () => {
    expect(
      violations(
        inside('lib/engine/numeric'),
        ({ target }) => !inside('lib/engine/numeric')(target),
      ),
    ).toEqual([]);
  });

  it('others reach the engine through its index, the command line through its batch; the bench measures its inner parts', () => {
    expect(
      violations(
        (file) => !inside('lib/engine')(file) && !inside('docker-free-scripts/bench')(file),
        ({ target }, file) =>
          inside('lib/engine')(target) &&
          target !== 'lib/engine/index.ts' &&
          !(inside('lib/engine/batch')(target) && file.startsWith('docker-free-scripts/engine')),
      ),
    ).toEqual([]);
  });

  it('only db imports knex and pg; the scripts make roles and databases before there is a schema', () => {
    expect(
      violations(
        (file) => !inside('db')(file) && file !== 'docker-free-scripts/setup/databases.mjs',
        isPackage('knex', 'pg'),
      ),
    ).toEqual([]);
  });

  it('db imports from lib only env and errors, and types', () => {
    expect(
      violations(
        inside('db'),
        ({ target, isPackage, isTypeOnly }) =>
          !isPackage &&
          !inside('db')(target) &&
          !isTypeOnly &&
          !['lib/env.ts', 'lib/errors.ts'].includes(target),
      ),
    ).toEqual([]);
  });

  it('app goes through lib: no database, no SDK', () => {
    expect(
      violations(
        inside('app'),
        (imported) =>
          isPackage('knex', 'pg', 'stripe', 'nodemailer')(imported) ||
          (inside('db')(imported.target) && !imported.isTypeOnly),
      ),
    ).toEqual([]);
  });

  it('components know neither routes nor the database', () => {
    expect(
      violations(
        inside('components'),
        ({ target, isTypeOnly }) => inside('app')(target) || (inside('db')(target) && !isTypeOnly),
      ),
    ).toEqual([]);
  });

  it('lib and db know neither routes nor components; nobody imports app', () => {
    expect(
      violations(
        (file) => !inside('app')(file),
        ({ target }) => inside('app')(target),
      ),
    ).toEqual([]);
    expect(
      violations(
        (file) => inside('lib')(file) || inside('db')(file) || inside('docker-free-scripts')(file),
        ({ target }) => inside('components')(target),
      ),
    ).toEqual([]);
  });

  it('nodemailer is known to lib/mail alone', () => {
    expect(violations((file) => file !== 'lib/mail/transport.ts', isPackage('nodemailer'))).toEqual(
      [],
    );
  });

  it('chart.js is drawn only in components/charts', () => {
    expect(
      violations(
        (file) => !inside('components/charts')(file),
        isPackage('chart.js', 'react-chartjs-2'),
      ),
    ).toEqual([]);
  });

  it('what the browser loads never reaches the database or server-only code', () => {
    const leaks = files
      .filter(isClient)
      .flatMap((file) =>
        [...reached(file)]
          .filter(
            (target) => inside('db')(target) || target === 'server-only' || target === 'lib/env.ts',
          )
          .map((target) => `${file} ⇢ ${target}`),
      );
    expect(leaks).toEqual([]);
  });

  it('domains import only from their left: organisations, people, plants, feed, samples, plans, then the rest', () => {
    const ORDER = [
      ['organisations'],
      ['people'],
      ['tokens'],
      ['plants'],
      ['feed', 'samples'],
      ['plans', 'targets'],
      ['bench', 'trends', 'imports', 'today', 'demo'],
      ['reports', 'public-api'],
    ];
    const rank = (file: string) =>
      ORDER.findIndex((names) => names.some((name) => inside(`lib/${name}`)(file)));
    expect(
      violations(
        (file) => rank(file) >= 0,
        ({ target }, file) =>
          rank(target) >= 0 &&
          rank(target) >= rank(file) &&
          target.split('/')[1] !== file.split('/')[1],
      ),
    ).toEqual([]);
  });
});

describe('the house', () => {
  it('has the top level that was agreed, and nothing that nobody expects', () => {
    const agreed = [
      'README.md',
      'DEVELOPERS.md',
      'app',
      'components',
      'lib',
      'db',
      'public',
      'tests',
      'docker-free-scripts',
      'package.json',
      'package-lock.json',
      'tsconfig.json',
      'knexfile.ts',
      'tailwind.config.ts',
      'next.config.ts',
      'postcss.config.mjs',
      'eslint.config.mjs',
      'vitest.config.ts',
      'proxy.ts',
      'instrumentation.ts',
      'next-env.d.ts',
      'node_modules',
      'docs',
      'screenshots',
    ];
    const visible = readdirSync('.').filter((name) => !name.startsWith('.'));
    expect(visible.filter((name) => !agreed.includes(name))).toEqual([]);
  });

  it('names files in kebab case', () => {
    const odd = files.filter((file) => {
      const name = file.split('/').at(-1) ?? '';
      return !/^(?:\d{14}_[a-z_]+|[a-z0-9]+(?:-[a-z0-9]+)*)(?:\.[a-z]+)+$/.test(name);
    });
    expect(odd).toEqual([]);
  });
});
