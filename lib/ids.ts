const PREFIX = {
  organisation: 'org',
  person: 'per',
  plant: 'plt',
  samplingPoint: 'pnt',
  target: 'tgt',
  trainStep: 'stp',
  dosingPoint: 'dos',
  feedSetting: 'set',
  shiftNote: 'nte',
  sample: 'smp',
  plan: 'pln',
  invitation: 'inv',
  apiToken: 'tok',
  feedEntry: 'fed',
} as const;

export type IdKind = keyof typeof PREFIX;

/** A readable prefix and 128 random bits: `smp_4f…`. */
export function newId(kind: IdKind): string {
  return idFrom(kind, crypto.getRandomValues(new Uint8Array(16)));
}

/** The same form from bytes given (the demo's come from its own seeded generator). */
export function idFrom(kind: IdKind, bytes: Uint8Array): string {
  return `${PREFIX[kind]}_${Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')}`;
}
