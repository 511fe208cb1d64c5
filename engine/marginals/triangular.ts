/** Triangular distribution. */
export interface Triangular {
  readonly kind: 'triangular';
  readonly low: number;
  readonly mode: number;
  readonly high: number;
}

/** What is wrong with three numbers that must rise, in words; null when nothing is. */
export function lowModeHighFault(low: number, mode: number, high: number): string | null {
  if (![low, mode, high].every(Number.isFinite)) return 'low, best and high must be finite numbers';
  if (!(low <= mode && mode <= high)) return 'best must lie from low to high';
  return low < high ? null : 'low must be below high';
}

export function makeTriangular(input: {
  readonly low: number;
  readonly mode: number;
  readonly high: number;
}): Triangular | string {
  const { low, mode, high } = input;
  return lowModeHighFault(low, mode, high) ?? { kind: 'triangular', low, mode, high };
}

export function triangularQuantile({ low, mode, high }: Triangular, p: number): number {
  const width = high - low;
  return p * width <= mode - low
    ? Math.min(mode, low + Math.sqrt(p * width * (mode - low)))
    : Math.max(mode, high - Math.sqrt((1 - p) * width * (high - mode)));
}

export function triangularCumulative({ low, mode, high }: Triangular, x: number): number {
  if (x <= low) return 0;
  if (x >= high) return 1;
  return x <= mode
    ? ((x - low) * (x - low)) / ((high - low) * (mode - low))
    : 1 - ((high - x) * (high - x)) / ((high - low) * (high - mode));
}

export function triangularDensity({ low, mode, high }: Triangular, x: number): number {
  if (x < low || x > high) return 0;
  const peak = 2 / (high - low);
  if (x < mode) return (peak * (x - low)) / (mode - low);
  return x > mode ? (peak * (high - x)) / (high - mode) : peak;
}

export function triangularMoments({ low, mode, high }: Triangular): {
  readonly mean: number;
  readonly deviation: number;
} {
  const [left, right] = [mode - low, high - mode];
  return {
    mean: low + (2 * left + right) / 3,
    deviation: Math.sqrt((left * left + left * right + right * right) / 18),
  };
}
