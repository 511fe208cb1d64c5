import {
  betaWeight,
  inverseIncompleteBeta,
  regularisedIncompleteBeta,
  weightScale,
} from './incompleteBeta.ts';

/** Beta distribution between two limits. */
export interface Beta {
  readonly kind: 'beta';
  readonly low: number;
  readonly high: number;
  readonly alpha: number;
  readonly beta: number;
}

/** Shapes beyond these are refused: the distribution would be a spike, or nothing but its two limits. */
const LEAST_SHAPE = 0.05;
const LARGEST_SHAPE = 1e5;

export function makeBeta(input: {
  readonly low: number;
  readonly high: number;
  readonly alpha: number;
  readonly beta: number;
}): Beta | string {
  const { low, high, alpha, beta } = input;
  if (!(Number.isFinite(low) && Number.isFinite(high))) return 'low and high must be finite numbers';
  if (!(low < high)) return 'low must be below high';
  const fits = (shape: number) => shape >= LEAST_SHAPE && shape <= LARGEST_SHAPE;
  if (!(fits(alpha) && fits(beta))) return `alpha and beta must be from ${LEAST_SHAPE} to ${LARGEST_SHAPE}`;
  return { kind: 'beta', low, high, alpha, beta };
}

/** From mean and deviation: α = m (m (1 − m)/v − 1), β = (1 − m)(…), with m and v on the range from 0 to 1. */
export function makeBetaFromMoments(input: {
  readonly low: number;
  readonly high: number;
  readonly mean: number;
  readonly deviation: number;
}): Beta | string {
  const { low, high, mean, deviation } = input;
  if (!(low < high)) return 'low must be below high';
  if (!(mean > low && mean < high)) return 'the mean must lie between low and high';
  if (!(deviation > 0)) return 'the deviation must be above 0';
  const share = (mean - low) / (high - low);
  const variance = (deviation / (high - low)) * (deviation / (high - low));
  const sum = (share * (1 - share)) / variance - 1;
  if (!(sum > 0)) return 'the deviation is too large for the mean and the limits';
  return makeBeta({ low, high, alpha: share * sum, beta: (1 - share) * sum });
}

export function betaQuantile({ low, high, alpha, beta }: Beta, p: number): number {
  const share = inverseIncompleteBeta(p, alpha, beta);
  return share < 0.5 ? low + (high - low) * share : high - (high - low) * (1 - share);
}

export function betaCumulative({ low, high, alpha, beta }: Beta, x: number): number {
  return regularisedIncompleteBeta(Math.max(0, Math.min(1, (x - low) / (high - low))), alpha, beta);
}

export function betaDensity({ low, high, alpha, beta }: Beta, x: number): number {
  const share = (x - low) / (high - low);
  const left = (high - x) / (high - low);
  if (!(share > 0 && left > 0)) return 0;
  return betaWeight(share, left, alpha, beta, weightScale(alpha, beta)) / (share * left * (high - low));
}

export function betaMoments({ low, high, alpha, beta }: Beta): {
  readonly mean: number;
  readonly deviation: number;
} {
  const sum = alpha + beta;
  return {
    mean: low + ((high - low) * alpha) / sum,
    deviation: (high - low) * Math.sqrt((alpha * beta) / (sum * sum * (sum + 1))),
  };
}
