/** Which numbers may stand in a place. */
export interface NumberRange {
  readonly low: number;
  /** Whether `low` itself may stand there. */
  readonly lowIncluded: boolean;
  readonly high: number;
  /** `high` itself may not stand there; it may unless this is so. */
  readonly highExcluded?: true;
}

/** From low to high, both included. */
export function fromTo(low: number, high: number): NumberRange {
  return { low, lowIncluded: true, high };
}

/** Above low, below high. */
export function betweenBoth(low: number, high: number): NumberRange {
  return { low, lowIncluded: false, high, highExcluded: true };
}

/** Above low, up to high. */
export function aboveUpTo(low: number, high: number): NumberRange {
  return { low, lowIncluded: false, high };
}

export function isBelowRange(range: NumberRange, value: number): boolean {
  return !(range.lowIncluded ? value >= range.low : value > range.low);
}

export function isInRange(range: NumberRange, value: number): boolean {
  return !isBelowRange(range, value) && (range.highExcluded ? value < range.high : value <= range.high);
}

/** A range in words: 'above 0, at most 20'. */
export function rangeInWords({ low, lowIncluded, high, highExcluded }: NumberRange): string {
  if (highExcluded) return `above ${low}, below ${high}`;
  return lowIncluded ? `from ${low} to ${high}` : `above ${low}, at most ${high}`;
}
