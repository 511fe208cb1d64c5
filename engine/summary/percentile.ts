import { binomialInterval, FEW_BEYOND, halfWidth } from './confidenceBand.ts';
import type { Estimate } from './summary.ts';

/**
 * Percentile of sorted values by straight interpolation between order statistics, position (N − 1) p.
 *
 * @param share from 0 to 1
 */
export function percentileSorted(sorted: Float64Array, share: number): number {
  const position = (sorted.length - 1) * share;
  const left = Math.floor(position);
  const rest = position - left;
  const value = sorted[left];
  // no interpolation where there is none to do, so that Infinity stays Infinity
  return rest === 0 || sorted[left + 1] === value ? value : value + rest * (sorted[left + 1] - value);
}

/**
 * Percentile of all realisations with its 90 % band: from the replicates' own percentiles, and the wider of it
 * and the order statistics at the ends of the exact binomial interval where fewer than 50 lie beyond.
 *
 * @param sorted all values, rising
 * @param sortedReplicates those of each replicate, rising
 */
export function percentileWithBand(
  sorted: Float64Array,
  sortedReplicates: readonly Float64Array[],
  share: number,
): Estimate {
  const value = percentileSorted(sorted, share);
  const half = halfWidth(sortedReplicates.map((own) => percentileSorted(own, share)));
  if (Number.isNaN(half) || !Number.isFinite(value)) return { value, low: NaN, high: NaN };
  let [low, high] = [value - half, value + half];
  const below = Math.round(share * sorted.length);
  if (Math.min(below, sorted.length - below) < FEW_BEYOND) {
    const [shareLow, shareHigh] = binomialInterval(below, sorted.length);
    low = Math.min(low, percentileSorted(sorted, shareLow));
    high = Math.max(high, percentileSorted(sorted, shareHigh));
  }
  return { value, low, high };
}
