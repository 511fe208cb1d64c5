import { describe, it, expect } from 'vitest';
import { varianceReduction } from '../../../engine/sampling/varianceReduction.ts';

describe('varianceReduction', () => {
  it('is the mean of the correlation over all pairs of depths', () => {
    for (const [thickness, scale] of [
      [0.3, 2],
      [4, 1.5],
      [10, 0.8],
    ]) {
      const cells = 2000;
      let sum = 0;
      // Pairs k cells apart: the midpoint rule over the square, its diagonal cells exact enough.
      for (let k = 0; k < cells; k++) {
        const pairs = k === 0 ? cells : 2 * (cells - k);
        sum += pairs * Math.exp((-2 * k * thickness) / (cells * scale));
      }
      expect(varianceReduction(thickness, scale)).toBeCloseTo(sum / (cells * cells), 4);
    }
  });

  it('is 1 for no thickness and falls by two thirds of T/θ at first', () => {
    expect(varianceReduction(0, 1)).toBe(1);
    expect(varianceReduction(1e-9, 1)).toBeCloseTo(1 - (2 / 3) * 1e-9, 15);
  });

  it('does not jump where the series takes over from the closed form', () => {
    const below = varianceReduction(0.5 - 1e-13, 1);
    const above = varianceReduction(0.5, 1);
    expect(Math.abs(above - below)).toBeLessThan(1e-12);
  });

  it('tends to θ/T for a great thickness', () => {
    expect(varianceReduction(1e6, 1) * 1e6).toBeCloseTo(1, 5);
  });

  it('refuses a negative thickness and a scale of 0', () => {
    expect(() => varianceReduction(-1, 1)).toThrow(RangeError);
    expect(() => varianceReduction(NaN, 1)).toThrow(RangeError);
    expect(() => varianceReduction(1, 0)).toThrow(RangeError);
    expect(() => varianceReduction(1, NaN)).toThrow(RangeError);
  });
});
