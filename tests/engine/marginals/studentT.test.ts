import { describe, it, expect } from 'vitest';
import tQuantile from '@stdlib/stats-base-dists-t-quantile';
import { studentTQuantile } from '../../../engine/marginals/studentT.ts';

describe('studentTQuantile', () => {
  it('agrees with @stdlib to 1e-12', () => {
    for (const degrees of [1, 2, 2.5, 5, 9, 19, 99, 999, 9999]) {
      for (const p of [1e-6, 0.01, 0.05, 0.3, 0.49, 0.7, 0.95, 0.975, 0.999]) {
        const wanted = tQuantile(p, degrees);
        expect(Math.abs(studentTQuantile(p, degrees) / wanted - 1), `${degrees}, ${p}`).toBeLessThan(1e-12);
      }
    }
  });

  it('meets the closed forms: tan(π (p − ½)) for 1 degree, (2p − 1)/√(2p(1 − p)) for 2', () => {
    for (const p of [0.001, 0.2, 0.5, 0.6, 0.95]) {
      expect(studentTQuantile(p, 1)).toBeCloseTo(Math.tan(Math.PI * (p - 0.5)), 10);
      expect(studentTQuantile(p, 2)).toBeCloseTo((2 * p - 1) / Math.sqrt(2 * p * (1 - p)), 11);
    }
  });

  it('refuses what is not a probability or a number of degrees', () => {
    for (const [p, degrees] of [
      [0, 5],
      [1, 5],
      [NaN, 5],
      [0.5, 0],
      [0.5, NaN],
    ]) {
      expect(() => studentTQuantile(p, degrees)).toThrow(RangeError);
    }
  });
});
