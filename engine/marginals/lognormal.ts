import { exp, ln } from '../elementary.ts';
import { lnOnePlus } from './logGamma.ts';
import { normalCumulative, normalDensity, normalQuantile } from './standardNormal.ts';

/** Lognormal distribution: ln X is normal with mean `logMean` and deviation `logDeviation`. */
export interface Lognormal {
  readonly kind: 'lognormal';
  readonly logMean: number;
  readonly logDeviation: number;
}

/** From the mean and deviation of X itself: ζ² = ln(1 + (σ/μ)²), λ = ln μ − ζ²/2. */
export function makeLognormal(input: {
  readonly mean: number;
  readonly deviation: number;
}): Lognormal | string {
  const { mean, deviation } = input;
  if (!(mean > 0 && Number.isFinite(mean))) return 'the mean must be above 0';
  if (!(deviation > 0 && Number.isFinite(deviation))) return 'the deviation must be above 0';
  const variation = deviation / mean;
  const square = lnOnePlus(variation * variation);
  if (!(square > 0 && square < Infinity)) return 'the deviation is too small or too large beside the mean';
  return { kind: 'lognormal', logMean: ln(mean) - 0.5 * square, logDeviation: Math.sqrt(square) };
}

/** From the median and the coefficient of variation. */
export function makeLognormalFromMedian(input: {
  readonly median: number;
  readonly cov: number;
}): Lognormal | string {
  const { median, cov } = input;
  if (!(median > 0 && Number.isFinite(median))) return 'the median must be above 0';
  if (!(cov > 0 && Number.isFinite(cov))) return 'the coefficient of variation must be above 0';
  const square = lnOnePlus(cov * cov);
  if (!(square > 0 && square < Infinity)) return 'the coefficient of variation is too small or too large';
  return { kind: 'lognormal', logMean: ln(median), logDeviation: Math.sqrt(square) };
}

export function lognormalQuantile({ logMean, logDeviation }: Lognormal, p: number): number {
  return exp(logMean + logDeviation * normalQuantile(p));
}

export function lognormalCumulative({ logMean, logDeviation }: Lognormal, x: number): number {
  return x > 0 ? normalCumulative((ln(x) - logMean) / logDeviation) : 0;
}

export function lognormalDensity({ logMean, logDeviation }: Lognormal, x: number): number {
  return x > 0 ? normalDensity((ln(x) - logMean) / logDeviation) / (x * logDeviation) : 0;
}

export function lognormalMoments({ logMean, logDeviation }: Lognormal): {
  readonly mean: number;
  readonly deviation: number;
} {
  const mean = exp(logMean + 0.5 * logDeviation * logDeviation);
  return { mean, deviation: mean * Math.sqrt(expLessOne(logDeviation * logDeviation)) };
}

/** e^x − 1 without losing a small x (Kahan's correction of the rounded e^x). */
function expLessOne(x: number): number {
  const power = exp(x);
  return power === 1 ? x : power < Infinity ? ((power - 1) * x) / ln(power) : power;
}
