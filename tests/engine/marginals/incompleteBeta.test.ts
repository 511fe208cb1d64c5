import { describe, it, expect } from 'vitest';
import fc from 'fast-check';
import gammaln from '@stdlib/math-base-special-gammaln';
import betaCdf from '@stdlib/stats-base-dists-beta-cdf';
import betaQuantile from '@stdlib/stats-base-dists-beta-quantile';
import {
  inverseIncompleteBeta,
  regularisedIncompleteBeta,
} from '../../../engine/marginals/incompleteBeta.ts';
import { logGamma } from '../../../engine/marginals/logGamma.ts';

const seed = 626;
const shape = fc.double({ min: Math.log(0.05), max: Math.log(500), noNaN: true }).map(Math.exp);

describe('logGamma', () => {
  it('agrees with @stdlib to 1e-14 of the largest term of Stirling’s formula', () => {
    fc.assert(
      fc.property(fc.double({ min: -12, max: 14, noNaN: true }), (power) => {
        const x = Math.exp(power);
        const largest = Math.max(1, x, Math.abs((x - 0.5) * Math.log(x)));
        expect(Math.abs(logGamma(x) - gammaln(x))).toBeLessThan(1e-14 * largest);
      }),
      { seed, numRuns: 3000 },
    );
  });

  it('is the logarithm of a factorial', () => {
    let logFactorial = 0;
    for (let n = 1; n <= 170; n += 1) {
      expect(logGamma(n)).toBeCloseTo(logFactorial, 11);
      logFactorial += Math.log(n);
    }
    for (const x of [0, -1, NaN]) expect(() => logGamma(x)).toThrow(RangeError);
  });
});

describe('regularisedIncompleteBeta', () => {
  it('agrees with @stdlib to 1e-12 for shapes from 0.05 to 500', () => {
    fc.assert(
      fc.property(shape, shape, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, x) => {
        expect(Math.abs(regularisedIncompleteBeta(x, a, b) - betaCdf(x, a, b))).toBeLessThan(1e-12);
      }),
      { seed, numRuns: 3000 },
    );
  });

  it('agrees with @stdlib to 1e-12 of its value in the lower tail', () => {
    fc.assert(
      fc.property(shape, shape, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, u) => {
        const x = (a / (a + b)) * u;
        const wanted = betaCdf(x, a, b);
        fc.pre(x > 1e-300 && wanted > 1e-250);
        expect(Math.abs(regularisedIncompleteBeta(x, a, b) / wanted - 1)).toBeLessThan(1e-12);
      }),
      { seed, numRuns: 3000 },
    );
  });

  it('is the sum of the binomial probabilities of at least k of n', () => {
    for (const [k, n, p] of [
      [1, 1, 0.3],
      [3, 10, 0.25],
      [40, 60, 0.6],
      [5, 150, 0.03],
    ]) {
      let term = (1 - p) ** n;
      let below = 0;
      for (let i = 0; i < k; i += 1) {
        below += term;
        term *= ((n - i) * p) / ((i + 1) * (1 - p));
      }
      expect(regularisedIncompleteBeta(p, k, n - k + 1)).toBeCloseTo(1 - below, 13);
    }
  });

  it('is x^a for b of 1 and ends at 0 and 1', () => {
    for (const x of [1e-9, 0.2, 0.5, 0.97]) {
      expect(regularisedIncompleteBeta(x, 3, 1) / x ** 3).toBeCloseTo(1, 13);
      expect(regularisedIncompleteBeta(x, 1, 3)).toBeCloseTo(1 - (1 - x) ** 3, 13);
    }
    expect([regularisedIncompleteBeta(0, 2, 3), regularisedIncompleteBeta(1, 2, 3)]).toEqual([0, 1]);
    expect(() => regularisedIncompleteBeta(0.5, 0, 1)).toThrow(RangeError);
    expect(() => regularisedIncompleteBeta(1.5, 1, 1)).toThrow(RangeError);
    expect(() => regularisedIncompleteBeta(NaN, 1, 1)).toThrow(RangeError);
  });
});

describe('inverseIncompleteBeta', () => {
  it('agrees with @stdlib to 1e-11 of its value for shapes from 0.5 to 500', () => {
    const larger = shape.filter((value) => value >= 0.5);
    fc.assert(
      fc.property(larger, larger, fc.double({ min: 1e-9, max: 1 - 1e-9, noNaN: true }), (a, b, p) => {
        const wanted = betaQuantile(p, a, b);
        expect(Math.abs(inverseIncompleteBeta(p, a, b) - wanted)).toBeLessThan(1e-11 * wanted);
      }),
      { seed, numRuns: 1500 },
    );
  });

  it('is undone by the function itself, to what rounding x leaves', () => {
    fc.assert(
      fc.property(shape, shape, fc.double({ min: 1e-12, max: 1, noNaN: true }), (a, b, p) => {
        const x = inverseIncompleteBeta(p, a, b);
        const step = x * 1e-15;
        const [from, to] = [Math.max(0, x - step), Math.min(1, x + step)];
        const slack = 1e-13 * p;
        expect(regularisedIncompleteBeta(from, a, b)).toBeLessThanOrEqual(p + slack);
        expect(regularisedIncompleteBeta(to, a, b)).toBeGreaterThanOrEqual(p - slack);
      }),
      { seed, numRuns: 3000 },
    );
  });

  it('holds for a million realisations: the upper limit for none of n is 1 − α^(1/n)', () => {
    for (const n of [1, 100, 10_000, 1_000_000]) {
      const wanted = -Math.expm1(Math.log(0.05) / n);
      // the solution is found as 1 − x, which is rounded to 1e-16
      expect(Math.abs(inverseIncompleteBeta(0.95, 1, n) / wanted - 1)).toBeLessThan(1e-12 + 3e-16 / wanted);
    }
    const half = inverseIncompleteBeta(0.5, 500_000, 500_000);
    expect(half).toBeCloseTo(0.5, 12);
  });

  it('reaches far into a tail that hugs 0', () => {
    // I ≈ x^a / (a B(a, b)) there; for b = 1 exactly x^a
    expect(inverseIncompleteBeta(1e-10, 0.05, 1) / 1e-200).toBeCloseTo(1, 10);
    expect(inverseIncompleteBeta(1e-12, 400, 1)).toBeCloseTo(10 ** (-12 / 400), 13);
  });

  it('refuses what is not a probability or a shape', () => {
    expect([inverseIncompleteBeta(0, 2, 3), inverseIncompleteBeta(1, 2, 3)]).toEqual([0, 1]);
    for (const [p, a, b] of [
      [NaN, 1, 1],
      [1.1, 1, 1],
      [0.5, 0, 1],
      [0.5, 1, NaN],
    ]) {
      expect(() => inverseIncompleteBeta(p, a, b)).toThrow(RangeError);
    }
  });
});
