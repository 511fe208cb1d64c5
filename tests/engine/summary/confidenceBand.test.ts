import { describe, expect, it } from 'vitest';
import { bandOfShare, binomialInterval, halfWidth } from '../../../engine/summary/confidenceBand.ts';

/** P(X ≥ k) of the binomial distribution, by its definition. */
function chanceOfAtLeast(k: number, n: number, p: number): number {
  let sum = 0;
  let term = (1 - p) ** n;
  for (let i = 0; i <= n; i += 1) {
    if (i >= k) sum += term;
    term *= ((n - i) / (i + 1)) * (p / (1 - p));
  }
  return sum;
}

describe('the exact binomial interval', () => {
  it.each([
    [1, 50],
    [7, 100],
    [93, 100],
  ])('of %i in %i leaves 5 % beyond each end, by the sum of the binomial distribution', (k, n) => {
    const [low, high] = binomialInterval(k, n);
    expect(chanceOfAtLeast(k, n, low)).toBeCloseTo(0.05, 9);
    expect(1 - chanceOfAtLeast(k + 1, n, high)).toBeCloseTo(0.05, 9);
  });

  it.each([
    [0, 0, 'total must be 1 or more, got 0'],
    [5, 4, 'above must be from 0 to 4, got 5'],
    [NaN, 4, 'above must be from 0 to 4, got NaN'],
  ])('is refused for %f of %f', (above, total, sentence) => {
    expect(() => binomialInterval(above, total)).toThrow(sentence);
  });

  it('starts at 0 for none and ends at 1 for all', () => {
    expect(binomialInterval(0, 40)[0]).toBe(0);
    expect(binomialInterval(40, 40)[1]).toBe(1);
  });
});

describe('the half-width of a band', () => {
  it('is t · sd/√R with the printed t of 1.833 at 9 degrees of freedom', () => {
    // 0 to 9: sd = √(82.5/9) = 3.0277
    const values = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9];
    expect(halfWidth(values)).toBeCloseTo((1.8331 * 3.02765) / Math.sqrt(10), 4);
  });

  it('is not known for fewer than ten replicates', () => {
    expect(halfWidth([1, 2, 3, 4, 5, 6, 7, 8, 9])).toBeNaN();
  });
});

describe('the band of a share', () => {
  const counts = Array.from({ length: 20 }, () => 100);

  it('is that of the replicates where 50 or more lie on either side', () => {
    const above = counts.map((_, i) => 25 + (i % 11));
    const { value, low, high } = bandOfShare(above, counts);
    const half = halfWidth(above.map((count) => count / 100));
    expect(value).toBeCloseTo(above.reduce((sum, count) => sum + count) / 2000, 14);
    expect(low).toBeCloseTo(value - half, 14);
    expect(high).toBeCloseTo(value + half, 14);
  });

  it('takes in the exact binomial interval where fewer lie beyond, also where the replicates agree', () => {
    const { value, low, high } = bandOfShare(
      counts.map(() => 1),
      counts,
    );
    const [exactLow, exactHigh] = binomialInterval(20, 2000);
    expect([value, low, high]).toEqual([0.01, exactLow, exactHigh]);
  });

  it('stays from 0 to 1', () => {
    const none = bandOfShare(
      counts.map(() => 0),
      counts,
    );
    const all = bandOfShare(counts, counts);
    expect(none.low).toBe(0);
    expect(none.high).toBeGreaterThan(0);
    expect(all.high).toBe(1);
    expect(all.low).toBeLessThan(1);
  });
});
