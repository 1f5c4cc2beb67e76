import { idFrom, type IdKind } from '@/lib/ids';
import type { Random } from './random';

/** The id of a thing by its name within the demo: the same name, the same id. */
export const demoId = (random: Random, kind: IdKind, name: string): string =>
  idFrom(kind, random.fork(`${kind} ${name}`).bytes(16));

/** A version-4 UUID from the demo's own chance (RFC 9562 section 5.4: version and variant bits). */
export function demoUuid(random: Random): string {
  const bytes = random.bytes(16);
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x40;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    hex.slice(12, 16),
    hex.slice(16, 20),
    hex.slice(20),
  ].join('-');
}
