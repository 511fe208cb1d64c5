import { FEW_BEYOND, halfWidth } from './confidenceBand.ts';
import { orderStatisticRanks } from './orderStatisticRanks.ts';
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
 * and the order statistics that bound it where fewer than 50 realisations lie beyond. No band (NaN) where fewer
 * than 10 replicates stand behind it, where no realisation bounds it, or where the percentile, or that of a
 * replicate, is not finite.
 *
 * @param sorted all values, rising
 * @param sortedReplicates those of each replicate, rising
 * @param share above 0 and below 1
 */
export function percentileWithBand(
  sorted: Float64Array,
  sortedReplicates: readonly Float64Array[],
  share: number,
): Estimate {
  const value = percentileSorted(sorted, share);
  const half = halfWidth(sortedReplicates.map((own) => percentileSorted(own, share)));
  let [low, high] = [value - half, value + half];
  if (Number.isFinite(half) && Math.min(share, 1 - share) * sorted.length < FEW_BEYOND) {
    const [lower, upper] = orderStatisticRanks(sorted.length, share);
    low = lower < 1 ? NaN : Math.min(low, sorted[lower - 1]);
    high = upper > sorted.length ? NaN : Math.max(high, sorted[upper - 1]);
  }
  const isBand = Number.isFinite(low) && Number.isFinite(high);
  return isBand ? { value, low, high } : { value, low: NaN, high: NaN };
}
