import { describe, it, expect } from 'vitest';
import { mean, quantile, type Marginal } from '../../../engine/marginals/marginal.ts';
import { normalCumulative } from '../../../engine/marginals/standardNormal.ts';
import { meanAtSpread } from '../../../engine/sampling/meanAtSpread.ts';
import { meanKeepingRatio } from '../../../engine/sampling/meanKeepingRatio.ts';
import {
  lognormalMarginal,
  normalMarginal,
  pertMarginal,
  tableMarginal,
  triangularMarginal,
  uniformMarginal,
} from './inventedMarginals.ts';

const VARIANCES = [0.05, 0.3, 0.8, 0.99];

const STEP = 5e-4;

/** ∫ F⁻¹(Φ(s t)) φ(t) dt as an obvious sum; a step of F⁻¹ may lie anywhere in one of its cells. */
function slowMean(marginal: Marginal, variance: number): number {
  const step = STEP;
  const furthest = 8;
  let sum = 0;
  for (let t = -furthest + step / 2; t < furthest; t += step) {
    sum += quantile(marginal, normalCumulative(Math.sqrt(variance) * t)) * Math.exp((-t * t) / 2);
  }
  return (sum * step) / Math.sqrt(2 * Math.PI);
}

const BOUNDED: readonly (readonly [string, Marginal])[] = [
  ['a skewed triangle', triangularMarginal(1, 1.2, 4)],
  ['a skewed PERT', pertMarginal(1, 1.1, 4)],
  ['a normal cut at one end', normalMarginal(1, 0.8, 0.2)],
  ['a table with a step', tableMarginal([0.5, 0.7, 1, 3], [0, 0.3, 0.3, 1])],
  ['a table with a bend', tableMarginal([0.5, 0.7, 1, 3], [0, 0.3, 0.6, 1])],
];

describe('meanKeepingRatio', () => {
  it('of a lognormal makes the average a lognormal of the same mean', () => {
    const marginal = lognormalMarginal(0.3, 0.4);
    for (const variance of VARIANCES) {
      // Mean of exp(μ + σ z) at variance s²: exp(μ + σ² s²/2), from the definition.
      expect(meanKeepingRatio(marginal, variance) * slowMean(marginal, variance)).toBeCloseTo(0.3, 8);
    }
  });

  for (const [name, marginal] of BOUNDED) {
    it(`of ${name} brings the mean back, by an obvious sum`, () => {
      for (const variance of VARIANCES) {
        const kept = meanKeepingRatio(marginal, variance) * slowMean(marginal, variance);
        // A step of 0.3 costs the obvious sum up to half a cell of it, under a density of at most 0.4.
        const ofTheSum = name === 'a table with a step' ? (0.3 * 0.4 * STEP) / 2 : 1e-7;
        expect(Math.abs(kept / mean(marginal) - 1)).toBeLessThan(ofTheSum);
      }
    });
  }

  it('is 1 for a symmetric marginal, for an uncut normal, and where the variance is not reduced', () => {
    expect(meanKeepingRatio(uniformMarginal(2, 5), 0.4)).toBeCloseTo(1, 14);
    expect(meanKeepingRatio(triangularMarginal(2, 3, 4), 0.4)).toBeCloseTo(1, 14);
    expect(meanKeepingRatio(normalMarginal(2, 0.5), 0.4)).toBeCloseTo(1, 14);
    expect(meanKeepingRatio(triangularMarginal(1, 1.2, 4), 1)).toBe(1);
  });

  it('carries the median to the mean where all variance is averaged out', () => {
    const marginal = lognormalMarginal(0.3, 0.4);
    expect(meanKeepingRatio(marginal, 0) * quantile(marginal, 0.5)).toBeCloseTo(0.3, 14);
    const triangle = triangularMarginal(1, 1.2, 4);
    expect(meanKeepingRatio(triangle, 0) * quantile(triangle, 0.5)).toBeCloseTo(mean(triangle), 14);
  });

  it('refuses a variance above 1 or not a number, and a marginal of mean 0', () => {
    const marginal = uniformMarginal(1, 2);
    for (const variance of [1.01, -0.1, NaN]) {
      expect(() => meanKeepingRatio(marginal, variance)).toThrow(RangeError);
    }
    expect(() => meanKeepingRatio(triangularMarginal(-3, 1, 2), 0.5)).toThrow(RangeError);
  });
});

describe('meanAtSpread', () => {
  it('at full variance is the mean of the marginal to twelve digits', () => {
    for (const [, marginal] of BOUNDED) {
      expect(Math.abs(meanAtSpread(marginal, 1) / mean(marginal) - 1)).toBeLessThan(1e-12);
    }
  });
});
