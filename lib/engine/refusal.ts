import type { Refusal } from './types';

/** A refusal with a plain sentence and, where a field is at fault, its path. */
export const refuse = (reason: Refusal['reason'], message: string, path?: string): Refusal =>
  path === undefined ? { ok: false, reason, message } : { ok: false, reason, message, path };
