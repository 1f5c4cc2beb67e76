import { readFileSync } from 'node:fs';

interface Manifest {
  readonly node: Readonly<
    Record<string, { readonly filename: string; readonly exportedName: string }>
  >;
}

/** The id under which the built server knows each action, by file and name. */
export function readActionIds(buildFolder: string): ReadonlyMap<string, string> {
  const manifest = JSON.parse(
    readFileSync(`${buildFolder}/server/server-reference-manifest.json`, 'utf8'),
  ) as Manifest;
  return new Map(
    Object.entries(manifest.node).map(([id, { filename, exportedName }]) => [
      `${filename} ${exportedName}`,
      id,
    ]),
  );
}

export interface ActionAnswer {
  readonly status: number;
  readonly ok: boolean | null;
  readonly message: string;
}

/** Calls an action as the browser's own code would. */
export async function callAction(
  baseUrl: string,
  path: string,
  id: string,
  args: readonly unknown[],
  headers: Readonly<Record<string, string>>,
): Promise<ActionAnswer> {
  const answer = await fetch(`${baseUrl}${path}`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      accept: 'text/x-component',
      'content-type': 'text/plain;charset=UTF-8',
      'next-action': id,
      origin: baseUrl,
      ...headers,
    },
    body: JSON.stringify(args),
  });
  const text = await answer.text();
  const line = /^\w+:(\{"ok":.*\})$/m.exec(text)?.[1];
  const result =
    line === undefined ? null : (JSON.parse(line) as { ok: boolean; message?: string });
  return {
    status: answer.status,
    ok: result?.ok ?? null,
    message: result?.message ?? '',
  };
}
