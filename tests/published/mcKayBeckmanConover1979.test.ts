/**
 * McKay, Beckman & Conover (1979), A comparison of three methods for selecting values of input variables in
 * the analysis of output from a computer code, Technometrics 21:239–245; Stein (1987), Large sample properties
 * of simulations using Latin hypercube sampling, Technometrics 29:143–151 (the share of variance that is
 * left); Owen (1997) (never more than n/(n − 1) of random sampling's). The variances follow from the closed
 * forms; they are met by samples, within five standard errors of a sample variance.
 */
import { describe, it, expect } from 'vitest';
import { sampleVariance } from 'simple-statistics';
import { latinHypercube } from '../../engine/sampling/latinHypercube.ts';
import { randomStream } from '../../engine/random/randomStream.ts';

const SEED = 1979;

/** n, variance of the mean of U by Latin hypercube, 1/(12 n³). */
const MEAN_OF_UNIFORM: readonly (readonly [number, number])[] = [
  [1, 0.0833333333333333],
  [5, 0.000666666666666667],
  [10, 8.33333333333333e-5],
  [50, 6.66666666666667e-7],
  [100, 8.33333333333333e-8],
];

/** n, variance of the mean of U1·U2 by Latin hypercube, by random sampling. */
const MEAN_OF_PRODUCT: readonly (readonly [number, number, number])[] = [
  [1, 0.0486111111111111, 0.0486111111111111],
  [5, 0.00204222222222222, 0.00972222222222222],
  [10, 0.000811736111111111, 0.00486111111111111],
  [50, 0.000142054422222222, 0.000972222222222222],
  [100, 7.01874298611111e-5, 0.000486111111111111],
];

const means = (count: number, studies: number, f: (u: number, v: number) => number): number[] =>
  Array.from({ length: studies }, (_, study) => {
    const u = latinHypercube(randomStream(SEED, 'u', count, study), count);
    const v = latinHypercube(randomStream(SEED, 'v', count, study), count);
    return u.reduce((sum, value, i) => sum + f(value, v[i]), 0) / count;
  });

/** Five standard errors of a sample variance, for means with a kurtosis of 3 (a product of two uniforms: 3.15). */
const relativeTolerance = (studies: number): number => 5 * Math.sqrt(2 / (studies - 1));

describe('McKay, Beckman & Conover 1979, variance of a mean', () => {
  for (const [count, variance] of MEAN_OF_UNIFORM) {
    it(`the mean of a uniform over ${count} strata has variance ${variance}`, () => {
      const studies = 4000;
      const found = sampleVariance(means(count, studies, (u) => u));
      expect(Math.abs(found / variance - 1)).toBeLessThan(relativeTolerance(studies));
    });
  }

  for (const [count, hypercube, random] of MEAN_OF_PRODUCT) {
    it(`the mean of a product of two uniforms over ${count} strata has variance ${hypercube}, random ${random}`, () => {
      const studies = 4000;
      const found = sampleVariance(means(count, studies, (u, v) => u * v));
      expect(Math.abs(found / hypercube - 1)).toBeLessThan(relativeTolerance(studies));
      expect(found).toBeLessThan(
        (1 + relativeTolerance(studies)) * random * (count / Math.max(count - 1, 1)),
      );
    });
  }
});

describe('McKay, Beckman & Conover 1979, one value in each stratum', () => {
  const count = 1000;
  const column = latinHypercube(randomStream(SEED, 'stratification'), count);

  it('a thousand probabilities fall into a thousand strata, one in each', () => {
    const strata = Array.from(column, (p) => Math.floor(p * count)).sort((a, b) => a - b);
    expect(strata).toEqual(Array.from({ length: count }, (_, i) => i));
  });

  it('the empirical distribution lies within 1/n of the uniform one everywhere', () => {
    const rising = Array.from(column).sort((a, b) => a - b);
    rising.forEach((p, i) => {
      expect(Math.abs((i + 1) / count - p)).toBeLessThanOrEqual(1 / count);
      expect(Math.abs(i / count - p)).toBeLessThanOrEqual(1 / count);
    });
  });
});
