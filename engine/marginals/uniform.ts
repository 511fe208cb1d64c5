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
