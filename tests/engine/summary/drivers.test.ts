import { sampleRankCorrelation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { randomStream } from '../../../engine/random/randomStream.ts';
import { drivers, firstOrderShare, rankedInput } from '../../../engine/summary/drivers.ts';
import { ranks } from '../../../engine/summary/ranks.ts';

const draw = (name: string, count: number) => {
  const stream = randomStream(11, name);
  return Float64Array.from({ length: count }, () => stream.next());
};

describe('ranks', () => {
  it('give ties the mean of their places', () => {
    expect([...ranks(Float64Array.of(5, 1, 5, 3, 5))]).toEqual([4, 1, 4, 2, 4]);
  });
});

describe('drivers', () => {
  const [x, y, idle] = [draw('x', 2000), draw('y', 2000), draw('idle', 2000)];
  const result = x.map((value, i) => 3 * value + y[i] * y[i]);
  const found = drivers(
    [x, y, idle].map((values, i) => rankedInput(i, values)),
    result,
  );

  it('have the rank correlations of another library where there are no ties', () => {
    [x, y, idle].forEach((values, i) => {
      expect(found[i].rankCorrelation).toBeCloseTo(sampleRankCorrelation([...values], [...result]), 12);
    });
  });

  it('have, for two inputs, the coefficients of the closed form (r1 − r12 r2)/(1 − r12²)', () => {
    const two = drivers([rankedInput(0, x), rankedInput(1, y)], result);
    const [r1, r2] = two.map((driver) => driver.rankCorrelation);
    const r12 = sampleRankCorrelation([...x], [...y]);
    expect(two[0].rankRegression).toBeCloseTo((r1 - r12 * r2) / (1 - r12 * r12), 10);
    expect(two[1].rankRegression).toBeCloseTo((r2 - r12 * r1) / (1 - r12 * r12), 10);
  });

  it('give no coefficient to a copy of an earlier input', () => {
    const copied = drivers([rankedInput(0, x), rankedInput(1, x)], result);
    expect(copied[1].rankRegression).toBeNaN();
    expect(copied[0].rankRegression).toBeCloseTo(copied[0].rankCorrelation, 12);
  });

  it('give nothing to an input, or a result, that does not vary', () => {
    const [still] = drivers([rankedInput(0, new Float64Array(2000).fill(2))], result);
    expect(still.rankCorrelation).toBeNaN();
    expect(firstOrderShare(rankedInput(0, x).order, new Float64Array(2000).fill(0.1))).toBeNaN();
  });

  it('have a first-order share without bias for an input that does nothing', () => {
    const shares = Array.from({ length: 60 }, (_, i) =>
      firstOrderShare(rankedInput(0, draw(`alone ${i}`, 2000)).order, draw(`result ${i}`, 2000)),
    );
    const mean = shares.reduce((sum, share) => sum + share) / shares.length;
    const deviation = Math.sqrt(
      shares.reduce((sum, share) => sum + (share - mean) ** 2, 0) / (shares.length - 1),
    );
    expect(Math.abs(mean)).toBeLessThan((3 * deviation) / Math.sqrt(shares.length));
  });
});
