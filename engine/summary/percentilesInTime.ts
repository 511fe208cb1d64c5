import type { Model } from '../project/model.ts';
import type { Realisations } from '../settlement/realisations.ts';
import { percentileWithBand } from './percentile.ts';
import type { TimeBands } from './summary.ts';

/** Percentiles of a point's settlement at each history time, each with its band; `replicates` in rising order. */
export function percentilesInTime(
  model: Model,
  replicates: readonly Realisations[],
  point: number,
): TimeBands {
  const { historyTimes } = replicates[0];
  const times = [...historyTimes];
  const bands = model.results.percentiles.map((percent) => ({
    percent,
    values: [] as number[],
    low: [] as number[],
    high: [] as number[],
  }));
  const mean: number[] = [];
  const count = replicates.reduce((sum, replicate) => sum + replicate.count, 0);
  const pooled = new Float64Array(count);
  times.forEach((_, time) => {
    let offset = 0;
    const own = replicates.map((replicate) => {
      const start = (point * times.length + time) * replicate.count;
      const column = replicate.settlement.slice(start, start + replicate.count);
      pooled.set(column, offset);
      offset += replicate.count;
      return column.sort();
    });
    let sum = 0;
    for (let i = 0; i < count; i += 1) sum += pooled[i];
    mean.push(sum / count);
    pooled.sort();
    for (const band of bands) {
      const { value, low, high } = percentileWithBand(pooled, own, band.percent / 100);
      band.values.push(value);
      band.low.push(low);
      band.high.push(high);
    }
  });
  return { point, times, bands, mean };
}
