export interface TimedValue {
  /** Milliseconds since 1970. */
  readonly at: number;
  readonly value: number;
}

/** Consecutive values without a pause longer than `gapMs`. */
export function segmentsOf<Value extends TimedValue>(
  values: readonly Value[],
  gapMs: number,
): Value[][] {
  const segments: Value[][] = [];
  let last: Value | undefined;
  for (const value of values) {
    if (last === undefined || value.at - last.at > gapMs) segments.push([]);
    segments.at(-1)?.push(value);
    last = value;
  }
  return segments;
}

/**
 * Thins a series (oldest first) for drawing. Of every gap-free segment the first, the last and, in each of its equal time
 * buckets, the lowest and highest value stay; so does every value that `mustKeep`. A series no longer than `limit` is
 * returned whole; what must be kept may exceed it.
 */
export function downsample<Value extends TimedValue>(
  values: readonly Value[],
  limit: number,
  gapMs: number,
  mustKeep: (value: Value) => boolean,
): Value[] {
  if (values.length <= limit) return [...values];
  const segments = segmentsOf(values, gapMs);
  // Two values a bucket, and two ends a segment.
  const buckets = Math.max(1, Math.floor((limit - 2 * segments.length) / 2));
  return segments.flatMap((segment) => {
    const share = Math.max(1, Math.floor((buckets * segment.length) / values.length));
    return thinSegment(segment, share, mustKeep);
  });
}

function thinSegment<Value extends TimedValue>(
  segment: readonly Value[],
  buckets: number,
  mustKeep: (value: Value) => boolean,
): Value[] {
  const first = segment[0];
  const last = segment.at(-1);
  if (first === undefined || last === undefined) return [];
  const width = (last.at - first.at) / buckets || 1;
  const kept = new Set<Value>([first, last]);
  let bucket = -1;
  let lowest = first;
  let highest = first;
  for (const value of segment) {
    const own = Math.min(buckets - 1, Math.floor((value.at - first.at) / width));
    if (own !== bucket) {
      if (bucket >= 0) kept.add(lowest).add(highest);
      bucket = own;
      lowest = value;
      highest = value;
    }
    if (value.value < lowest.value) lowest = value;
    if (value.value > highest.value) highest = value;
    if (mustKeep(value)) kept.add(value);
  }
  kept.add(lowest).add(highest);
  return segment.filter((value) => kept.has(value));
}
