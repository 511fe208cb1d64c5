import { describe, expect, it } from 'vitest';
import { bandOfShare, binomialInterval, halfWidth } from '../../../engine/summary/confidenceBand.ts';
import { chanceConvergence, medianConvergence } from '../../../engine/summary/convergence.ts';

const hundreds = (replicates: number) => Array.from({ length: replicates }, () => 100);

describe('the record of convergence', () => {
  it.each([10, 11, 68, 69, 70, 127, 128, 500, 10_000])(
    'of %i replicates starts with the tenth and ends with the last, in at most 60 entries',
    (replicates) => {
      const medians = Array.from({ length: replicates }, (_, i) => (i % 7) / 10);
      const record = medianConvergence(medians, hundreds(replicates));
      expect(record[0].realisations).toBe(1000);
      expect(record[record.length - 1].realisations).toBe(100 * replicates);
      expect(record.length).toBeLessThanOrEqual(60);
      const steps = record.map(({ realisations }) => realisations);
      expect(steps.every((step, i) => i === 0 || step > steps[i - 1])).toBe(true);
    },
  );

  it('is empty before ten replicates', () => {
    expect(medianConvergence([1, 2, 3], hundreds(3))).toEqual([]);
    expect(chanceConvergence([1, 2, 3], hundreds(3))).toEqual([]);
  });

  it('holds the mean and the half-width of the medians so far', () => {
    const medians = Array.from({ length: 14 }, (_, i) => i * i);
    const record = medianConvergence(medians, hundreds(14));
    expect(record).toHaveLength(5);
    // 0² + 1² + … + 11² = 506
    expect(record[2].median).toBeCloseTo(506 / 12, 12);
    expect(record[2].halfWidth).toBe(halfWidth(medians.slice(0, 12)));
  });

  it('weighs medians by the realisations behind them', () => {
    const counts = [1000, ...hundreds(9)];
    const [entry] = medianConvergence([1, 0, 0, 0, 0, 0, 0, 0, 0, 0], counts);
    expect(entry).toMatchObject({ realisations: 1900, median: 1000 / 1900 });
  });

  it('does not call a chance certain because no realisation has passed so far', () => {
    const [first, , last] = chanceConvergence(Array<number>(12).fill(0), hundreds(12));
    expect(first.halfWidth).toBe(binomialInterval(0, 1000)[1]);
    expect(last.halfWidth).toBe(binomialInterval(0, 1200)[1]);
    expect(last.halfWidth).toBeGreaterThan(0.002);
  });

  it('reaches as far as the longer side of the band of the chance', () => {
    const above = [0, 2, 1, 0, 3, 1, 0, 2, 1, 1];
    const [entry] = chanceConvergence(above, hundreds(10));
    const { value, low, high } = bandOfShare(above, hundreds(10));
    expect(entry.chance).toBe(value);
    expect(entry.halfWidth).toBe(high - value);
    expect(high - value).toBeGreaterThan(value - low);
  });
});
