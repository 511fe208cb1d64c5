import { describe, it, expect } from 'vitest';
import fc from 'fast-check';
import cdf from '@stdlib/stats-base-dists-normal-cdf';
import quantile from '@stdlib/stats-base-dists-normal-quantile';
import { normalCumulative, normalDensity, normalQuantile } from '../../../engine/marginals/standardNormal.ts';

const seed = 241;
const apart = (got: number, wanted: number) => Math.abs(got - wanted) / Math.abs(wanted);

describe('the standard normal distribution', () => {
  it('Φ agrees with @stdlib to 1e-14 of its value from −6 to 8', () => {
    fc.assert(
      fc.property(fc.double({ min: -6, max: 8, noNaN: true }), (z) => {
        expect(apart(normalCumulative(z), cdf(z, 0, 1))).toBeLessThan(1e-14);
      }),
      { seed, numRuns: 3000 },
    );
  });

  // further out @stdlib's own error grows (1e-12 at 4e-7, all digits by 1e-20); the tests below go there
  it('Φ⁻¹ agrees with @stdlib to 1e-13 from 1e-4 to 1 − 1e-4', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-4, max: 1 - 1e-4, noNaN: true }), (p) => {
        const wanted = quantile(p, 0, 1);
        expect(Math.abs(normalQuantile(p) - wanted)).toBeLessThan(1e-13 * Math.max(1, Math.abs(wanted)));
      }),
      { seed, numRuns: 3000 },
    );
  });

  it('Φ far down the tail meets its asymptotic series φ(z)/|z| (1 − 1/z² + 3/z⁴ − …)', () => {
    for (const z of [-12, -20, -30, -37]) {
      const inverse = 1 / (z * z);
      let [term, total] = [1, 1];
      for (let k = 1; k <= 40; k += 1) {
        term *= -(2 * k - 1) * inverse;
        total += term;
      }
      expect(apart(normalCumulative(z), (normalDensity(z) / -z) * total)).toBeLessThan(2e-15);
    }
  });

  it('Φ(Φ⁻¹(p)) is p as closely as 1e-15 of z allows, down to 1e-300', () => {
    for (let power = -300; power < -1; power += 1) {
      const p = 10 ** power;
      const z = normalQuantile(p);
      // a small share of z moves ln Φ by about z² times that share
      expect(apart(normalCumulative(z), p)).toBeLessThan(1e-15 * (1 + z * z));
    }
  });

  it('Φ⁻¹ has no bend backwards where its formulas meet', () => {
    for (const p of [0.075, 0.925, Math.exp(-25), 1 - Math.exp(-25)]) {
      for (let step = -20; step < 20; step += 1) {
        const [below, above] = [p * (1 + step * 1e-15), p * (1 + (step + 1) * 1e-15)];
        expect(normalQuantile(above) - normalQuantile(below)).toBeGreaterThanOrEqual(-1e-15);
      }
    }
  });

  it('ends at its limits', () => {
    expect([normalQuantile(0), normalQuantile(1), normalQuantile(0.5)]).toEqual([-Infinity, Infinity, 0]);
    expect([normalCumulative(-Infinity), normalCumulative(Infinity), normalCumulative(0)]).toEqual([
      0, 1, 0.5,
    ]);
    expect([normalDensity(Infinity), normalDensity(-1e9)]).toEqual([0, 0]);
    expect(normalCumulative(NaN)).toBeNaN();
    for (const p of [-0.1, 1.1, NaN]) expect(() => normalQuantile(p)).toThrow(RangeError);
  });

  it('is symmetric', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 5, noNaN: true }), (z) => {
        expect(normalCumulative(z) + normalCumulative(-z)).toBeCloseTo(1, 15);
        expect(normalDensity(-z)).toBe(normalDensity(z));
      }),
      { seed },
    );
  });
});
