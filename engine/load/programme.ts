/** When a load acts: it is put in evenly from `start` to `end` and taken out evenly over the removal. Years. */
export interface ActingPeriod {
  readonly start: number;
  readonly end: number;
  /** Infinity when it stays. */
  readonly removalStart: number;
  readonly removalEnd: number;
}

/**
 * Share of a load that acts just before a date (`side` −1) or just after it (`side` 1); the two differ only
 * where it is put on or taken off at once.
 */
export function actingShare(period: ActingPeriod, date: number, side: -1 | 1): number {
  return (
    rampShare(period.start, period.end, date, side) -
    rampShare(period.removalStart, period.removalEnd, date, side)
  );
}

function rampShare(start: number, end: number, date: number, side: -1 | 1): number {
  if (date < start || (date === start && side < 0)) return 0;
  if (date > end || (date === end && (side > 0 || end > start))) return 1;
  return end > start ? (date - start) / (end - start) : 0;
}

/** The dates at which the rate of loading changes. */
export function changesOf(period: ActingPeriod): number[] {
  return [period.start, period.end, period.removalStart, period.removalEnd].filter(Number.isFinite);
}
