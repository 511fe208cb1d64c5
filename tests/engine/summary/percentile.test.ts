import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { halfWidth } from '../../../engine/summary/confidenceBand.ts';
import { orderStatisticRanks } from '../../../engine/summary/orderStatisticRanks.ts';
import { percentileSorted, percentileWithBand } from '../../../engine/summary/percentile.ts';

/** P(B = k) for k from 0 to n of the binomial distribution, by Pascal's rule: one trial after another. */
function binomialChances(n: number, p: number): number[] {
  let chances = [1];
  for (let trial = 0; trial < n; trial += 1) {
    chances = Array.from(
      { length: trial + 2 },
      (_, k) => (chances[k] ?? 0) * (1 - p) + (k > 0 ? chances[k - 1] * p : 0),
    );
  }
  return chances;
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

describe('the ranks that bound a percentile', () => {
  it('are the innermost that leave 5 % or less beyond each, by the sum of the binomial distribution', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 150 }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (count, share) => {
          const chances = binomialChances(count, share);
          const below = (rank: number) => sum(chances.slice(0, Math.max(0, rank)));
          const atLeast = (rank: number) => sum(chances.slice(rank));
          const [lower, upper] = orderStatisticRanks(count, share);
          if (lower > 0) expect(below(lower)).toBeLessThanOrEqual(0.05 + 1e-12);
          if (lower < count) expect(below(lower + 1)).toBeGreaterThan(0.05 - 1e-12);
          if (upper <= count) expect(atLeast(upper)).toBeLessThanOrEqual(0.05 + 1e-12);
          if (upper > 1) expect(atLeast(upper - 1)).toBeGreaterThan(0.05 - 1e-12);
        },
      ),
      { seed: 19, numRuns: 150 },
    );
  });

  it.each([
    [NaN, 0.5, 'count must be 1 or more, got NaN'],
    [0, 0.5, 'count must be 1 or more, got 0'],
    [10, 1, 'share must lie between 0 and 1, got 1'],
    [10, NaN, 'share must lie between 0 and 1, got NaN'],
  ])('are refused for a count of %f and a share of %f', (count, share, sentence) => {
    expect(() => orderStatisticRanks(count, share)).toThrow(sentence);
  });
});

describe('the band of a percentile', () => {
  // 10 replicates of 100, in each the numbers from 1 to 100 and a little more in each replicate
  const own = Array.from({ length: 10 }, (_, r) =>
    Float64Array.from({ length: 100 }, (_v, i) => i + 1 + r / 10),
  );
  const pooled = Float64Array.from(own.flatMap((each) => [...each])).sort();

  it('comes from the replicates alone where 50 or more lie beyond', () => {
    const { value, low, high } = percentileWithBand(pooled, own, 0.95);
    const half = halfWidth(own.map((each) => percentileSorted(each, 0.95)));
    expect([low, high]).toEqual([value - half, value + half]);
  });

  it('takes in the order statistics that bound it where fewer lie beyond', () => {
    const { value, low, high } = percentileWithBand(pooled, own, 0.98);
    const half = halfWidth(own.map((each) => percentileSorted(each, 0.98)));
    const [lower, upper] = orderStatisticRanks(1000, 0.98);
    expect([low, high]).toEqual([
      Math.min(value - half, pooled[lower - 1]),
      Math.max(value + half, pooled[upper - 1]),
    ]);
    expect(high - low).toBeGreaterThan(2 * half);
  });

  it('is not given where so few lie beyond that none bounds it', () => {
    // 0.999^1000 = 0.37: with that chance all of 1,000 lie below the 99.9th percentile
    const { value, low, high } = percentileWithBand(pooled, own, 0.999);
    expect(value).toBeGreaterThan(100);
    expect([low, high]).toEqual([NaN, NaN]);
  });

  it('is not given for fewer than ten replicates', () => {
    expect(percentileWithBand(pooled, own.slice(0, 9), 0.5).low).toBeNaN();
  });

  it('is not given where a replicate does not reach the percentile', () => {
    const unreached = own.map((each, r) => (r === 3 ? each.map(() => Infinity) : each));
    const all = Float64Array.from(unreached.flatMap((each) => [...each])).sort();
    const { value, low, high } = percentileWithBand(all, unreached, 0.5);
    expect(value).toBeLessThan(100);
    expect([low, high]).toEqual([NaN, NaN]);
  });
});
