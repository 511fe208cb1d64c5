import { mean } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { halfWidth } from '../../../engine/summary/confidenceBand.ts';
import { percentilesInTime } from '../../../engine/summary/percentilesInTime.ts';
import { inventedReplicate, settlementOf, summaryModel } from './inventedRealisations.ts';

const model = summaryModel();
const replicates = Array.from({ length: 12 }, (_, r) => inventedReplicate(model, r));

describe('percentiles of a settlement with time', () => {
  it('are at each time those of all realisations by the definition, with the band of the replicates', () => {
    const { point, times, bands, mean: means } = percentilesInTime(model, replicates, 2);
    expect(point).toBe(2);
    expect(times).toEqual([...replicates[0].historyTimes]);
    expect(bands.map(({ percent }) => percent)).toEqual([5, 50, 95]);
    times.forEach((time, t) => {
      const own = replicates.map((of) => Array.from({ length: 100 }, (_, r) => settlementOf(of, 2, time, r)));
      expect(means[t]).toBeCloseTo(mean(own.flat()), 13);
      for (const { percent, values, low, high } of bands) {
        expect(values[t]).toBeCloseTo(percentileOf(own.flat(), percent / 100), 14);
        // 60 of 1,200 lie beyond the outer ones, so the replicates' spread alone makes the band
        const half = halfWidth(own.map((each) => percentileOf(each, percent / 100)));
        expect(high[t] - low[t]).toBeCloseTo(2 * half, 13);
      }
    });
  });

  it('of a fixed point are 0 and have no width', () => {
    const { bands, mean: means } = percentilesInTime(model, replicates, 0);
    expect(means.every((value) => value === 0)).toBe(true);
    for (const { values, low, high } of bands) {
      expect([...values, ...low, ...high].every((value) => value === 0)).toBe(true);
    }
  });
});

/** By its definition: straight between the two values about position (N − 1) p. */
function percentileOf(values: readonly number[], share: number): number {
  const rising = [...values].sort((a, b) => a - b);
  const position = (rising.length - 1) * share;
  const left = Math.floor(position);
  return rising[left] * (left + 1 - position) + (rising[left + 1] ?? 0) * (position - left);
}
