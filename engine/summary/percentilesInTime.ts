import type { Model } from '../project/model.ts';
import type { Realisations } from '../settlement/realisations.ts';
import { mean } from './mean.ts';
import { percentileWithBand } from './percentile.ts';
import { sortedColumn } from './sortedColumn.ts';
import type { TimeBands } from './summary.ts';

/**
 * Percentiles of a point's settlement at each history time, each with its band, and the mean.
 *
 * @param replicates one or more, in rising order
 */
export function percentilesInTime(
  model: Model,
  replicates: readonly Realisations[],
  point: number,
): TimeBands {
  const times = [...replicates[0].historyTimes];
  const counts = replicates.map(({ count }) => count);
  const bands = model.results.percentiles.map((percent) => ({
    percent,
    values: [] as number[],
    low: [] as number[],
    high: [] as number[],
  }));
  const means: number[] = [];
  const pooled = new Float64Array(counts.reduce((total, count) => total + count, 0));
  times.forEach((_, time) => {
    let offset = 0;
    for (const { settlement, count } of replicates) {
      const start = (point * times.length + time) * count;
      pooled.set(settlement.subarray(start, start + count), offset);
      offset += count;
    }
    means.push(mean(pooled));
    const { sorted, ofReplicates } = sortedColumn(pooled, counts);
    for (const band of bands) {
      const { value, low, high } = percentileWithBand(sorted, ofReplicates, band.percent / 100);
      band.values.push(value);
      band.low.push(low);
      band.high.push(high);
    }
  });
  return { point, times, bands, mean: means };
}
