import { exp } from '../elementary.ts';
import { mean, type Marginal } from '../marginals/marginal.ts';
import { meanAtSpread } from './meanAtSpread.ts';

/**
 * Ratio by which F⁻¹(Φ(z)), z normal of a variance below 1, is multiplied so that its mean is that of the
 * marginal: an average over a layer has the mean of the field.
 *
 *     ratio = mean of F / mean of F⁻¹(Φ(z));   for a lognormal exp(ζ² (1 − variance)/2)
 *
 * @param marginal one whose values are above 0
 * @param variance of z, from 0 to 1
 * @returns the ratio, above 0; 1 at a variance of 1
 * @throws RangeError when variance is out of its range, or the ratio is not above 0 (a mean of 0, say)
 */
export function meanKeepingRatio(marginal: Marginal, variance: number): number {
  if (!(variance >= 0 && variance <= 1)) {
    throw new RangeError(`meanKeepingRatio: variance must be from 0 to 1, got ${variance}`);
  }
  if (variance === 1) return 1;
  if (marginal.kind === 'lognormal') {
    return exp((marginal.logDeviation * marginal.logDeviation * (1 - variance)) / 2);
  }
  const ratio = mean(marginal) / meanAtSpread(marginal, Math.sqrt(variance));
  if (!(ratio > 0 && ratio < Infinity)) {
    throw new RangeError(`meanKeepingRatio: marginal must have a mean above 0, got a ratio of ${ratio}`);
  }
  return ratio;
}
