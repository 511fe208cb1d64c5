/** Uniform distribution from low to high. */
export interface Uniform {
  readonly kind: 'uniform';
  readonly low: number;
  readonly high: number;
}

export function makeUniform({
  low,
  high,
}: {
  readonly low: number;
  readonly high: number;
}): Uniform | string {
  if (!(Number.isFinite(low) && Number.isFinite(high))) return 'low and high must be finite numbers';
  return low < high ? { kind: 'uniform', low, high } : 'low must be below high';
}

export function uniformQuantile({ low, high }: Uniform, p: number): number {
  return p < 0.5 ? low + p * (high - low) : high - (1 - p) * (high - low);
}
