import fc from 'fast-check';
import { quantile } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { exceedance } from '../../../engine/summary/exceedance.ts';
import { percentileSorted, percentileWithBand } from '../../../engine/summary/percentile.ts';

const sorted = (values: readonly number[]) => Float64Array.from(values).sort();
const replicates = fc.array(fc.array(fc.integer({ min: 0, max: 60 }), { minLength: 5, maxLength: 40 }), {
  minLength: 1,
  maxLength: 12,
});

describe('the exceedance curve', () => {
  it('is at each of its values the counted share of realisations above it', () => {
    fc.assert(
      fc.property(replicates, (own) => {
        const all = own.flat();
        const curve = exceedance(sorted(all), own.map(sorted));
        curve.values.forEach((value, i) => {
          expect(curve.shares[i]).toBeCloseTo(all.filter((other) => other > value).length / all.length, 12);
        });
        expect(curve.values[0]).toBe(Math.min(...all));
        expect(curve.values[curve.values.length - 1]).toBe(Math.max(...all));
      }),
      { seed: 5, numRuns: 200 },
    );
  });

  it('keeps at most 300 points of many, rising, both extremes among them', () => {
    const own = Array.from({ length: 20 }, (_, r) =>
      sorted(Array.from({ length: 500 }, (_, i) => ((i * 7919 + r * 104729) % 99991) / 7)),
    );
    const all = sorted(own.flatMap((column) => [...column]));
    const { values, shares, unresolvedAbove } = exceedance(all, own);
    expect(values.length).toBeLessThanOrEqual(300);
    expect(values.every((value, i) => i === 0 || value > values[i - 1])).toBe(true);
    expect(shares.every((share, i) => i === 0 || share <= shares[i - 1])).toBe(true);
    expect([values[0], values[values.length - 1]]).toEqual([all[0], all[all.length - 1]]);
    // the curve falls at each of its values: just before this one ten lie above, from it on fewer
    expect(all.filter((value) => value > unresolvedAbove)).toHaveLength(9);
    expect(all.filter((value) => value >= unresolvedAbove)).toHaveLength(10);
  });

  it('is unresolved from the least value above which fewer than ten lie, however they are tied', () => {
    fc.assert(
      fc.property(replicates, (own) => {
        const all = own.flat();
        const { unresolvedAbove } = exceedance(sorted(all), own.map(sorted));
        const fewAbove = all.filter((value) => all.filter((other) => other > value).length < 10);
        expect(unresolvedAbove).toBe(Math.min(...fewAbove));
      }),
      { seed: 6, numRuns: 200 },
    );
  });

  it('keeps the shares of the finite values where dates are not reached', () => {
    const own = [sorted([1, 2, Infinity, Infinity])];
    const curve = exceedance(own[0], own);
    expect(curve.values).toEqual([1, 2, Infinity]);
    expect(curve.shares).toEqual([0.75, 0.5, 0]);
  });
});

describe('a percentile', () => {
  it('is the one of position (N − 1) p, checked by the definition', () => {
    const values = sorted([3, 1, 4, 1, 5, 9, 2, 6]);
    expect(percentileSorted(values, 0)).toBe(1);
    expect(percentileSorted(values, 1)).toBe(9);
    // position 3.5 between 3 and 4
    expect(percentileSorted(values, 0.5)).toBe(3.5);
    expect(percentileSorted(values, 0.5)).toBe(quantile([...values], 0.5));
    // position 1.75 between 1 and 2
    expect(percentileSorted(values, 0.25)).toBeCloseTo(1.75, 14);
  });

  it('stays infinite where a date is not reached', () => {
    const values = sorted([1, 2, Infinity, Infinity]);
    expect(percentileSorted(values, 0.9)).toBe(Infinity);
    expect(percentileWithBand(values, [values], 0.9)).toEqual({ value: Infinity, low: NaN, high: NaN });
  });
});
