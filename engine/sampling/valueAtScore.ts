import { exp } from '../elementary.ts';
import { quantile, type Marginal } from '../marginals/marginal.ts';
import type { Normal } from '../marginals/normal.ts';
import { normalCumulative, normalQuantile } from '../marginals/standardNormal.ts';

/**
 * Value of a marginal at a standard normal score: F⁻¹(Φ(z)). For a lognormal that is exp(λ + ζ z), for a
 * normal μ + σ z, without the way over the probability, which would lose the upper tail.
 *
 * @param z score, finite
 */
export function valueAtScore(marginal: Marginal, z: number): number {
  switch (marginal.kind) {
    case 'lognormal':
      return exp(marginal.logMean + marginal.logDeviation * z);
    case 'normal':
      return normalAtScore(marginal, z);
    default:
      return quantile(marginal, normalCumulative(z));
  }
}

/** Of a cut normal from the nearer end, so that no probability is rounded to 1. */
function normalAtScore({ mean, deviation, low, high }: Normal, z: number): number {
  if (low === -Infinity && high === Infinity) return mean + deviation * z;
  const sign = z > 0 ? -1 : 1;
  const [a, b] = [(low - mean) / deviation, (high - mean) / deviation];
  const [near, far] =
    sign === 1 ? [normalCumulative(a), normalCumulative(b)] : [normalCumulative(-b), normalCumulative(-a)];
  const score = sign * normalQuantile(near + normalCumulative(sign * z) * (far - near));
  return Math.min(high, Math.max(low, mean + deviation * score));
}

/** Scores at which F⁻¹(Φ(z)) has a bend or a step, rising: the mode of a triangle, the rows of a table. */
export function scoreBreaks(marginal: Marginal): number[] {
  if (marginal.kind === 'triangular') {
    return insideScores([(marginal.mode - marginal.low) / (marginal.high - marginal.low)]);
  }
  return marginal.kind === 'table' ? insideScores(marginal.cumulative) : [];
}

function insideScores(probabilities: readonly number[]): number[] {
  return probabilities.filter((p) => p > 0 && p < 1).map(normalQuantile);
}
