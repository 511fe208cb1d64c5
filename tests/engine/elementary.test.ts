import { describe, it, expect } from 'vitest';
import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { atan, cos, exp, exp10, ln, log10, pow, sin } from '../../engine/elementary.ts';

const seed = 20;

describe('what is beyond their range', () => {
  it('exp overflows to Infinity and underflows to 0 where doubles end', () => {
    expect(exp(709.782712893384)).toBeLessThan(Infinity);
    expect(exp(709.782712893385)).toBe(Infinity);
    expect(exp(-745.1332191019411)).toBe(5e-324);
    expect(exp(-745.1332191019412)).toBe(0);
    expect([exp(Infinity), exp(-Infinity), exp(NaN), exp(0), exp(-0)]).toEqual([Infinity, 0, NaN, 1, 1]);
  });

  it('exp rounds a subnormal result once', () => {
    for (const x of [-708.5, -709.125, -712.375, -720.25, -735.5, -744.375]) {
      const exact = new Decimal(x).exp().dividedBy(new Decimal(2).pow(-1074));
      expect(Math.abs(exp(x) / 2 ** -1074 - exact.toNumber()), `${x}`).toBeLessThan(0.51);
    }
  });

  it('the logarithms are −Infinity at 0, NaN below and Infinity at Infinity', () => {
    for (const logarithm of [ln, log10]) {
      expect([logarithm(0), logarithm(-0), logarithm(-1), logarithm(NaN), logarithm(Infinity)]).toEqual([
        -Infinity,
        -Infinity,
        NaN,
        NaN,
        Infinity,
      ]);
    }
  });

  it('ln of the least double is −1074 ln 2', () => {
    expect(ln(5e-324)).toBeCloseTo(-1074 * 0.6931471805599453, 12);
  });

  it('exp10 ends where doubles end', () => {
    expect([exp10(308.3), exp10(-324), exp10(400), exp10(-400), exp10(NaN)]).toEqual([
      Infinity,
      0,
      Infinity,
      0,
      NaN,
    ]);
  });

  it('pow of 0 is 0, 1 or Infinity by the sign of the exponent', () => {
    expect([pow(0, 2.5), pow(0, 0), pow(0, -1)]).toEqual([0, 1, Infinity]);
    expect([pow(1e300, 2), pow(1e-300, 2), pow(1, 1e300), pow(7, 0)]).toEqual([Infinity, 0, 1, 1]);
  });

  it('pow refuses a negative base and what is not finite', () => {
    for (const [x, y] of [
      [-1, 2],
      [-8, 1 / 3],
      [NaN, 1],
      [1, NaN],
      [Infinity, 1],
      [2, Infinity],
    ]) {
      expect(() => pow(x, y)).toThrow(RangeError);
    }
  });

  it('atan runs to a quarter turn', () => {
    expect([atan(Infinity), atan(-Infinity), atan(1e300), atan(NaN)]).toEqual([
      Math.PI / 2,
      -Math.PI / 2,
      Math.PI / 2,
      NaN,
    ]);
  });

  it('sin and cos refuse angles beyond 100,000', () => {
    for (const x of [100_000.1, -100_000.1, NaN, Infinity]) {
      expect(() => sin(x)).toThrow(`sin: x must be from -100,000 to 100,000, got ${x}`);
      expect(() => cos(x)).toThrow(RangeError);
    }
  });
});

describe('where the answer is a short number', () => {
  it('log10 of whole powers of ten is whole', () => {
    for (let power = -307; power <= 308; power += 1) expect(log10(Number(`1e${power}`))).toBe(power);
  });

  it('exp10 is exact where ten to that power is a double', () => {
    for (let power = 0; power <= 22; power += 1) expect(exp10(power)).toBe(Number(`1e${power}`));
  });

  it('pow of small whole numbers is exact', () => {
    for (let base = 1; base <= 20; base += 1) {
      let product = 1;
      for (let power = 0; power <= 12; power += 1) {
        expect(pow(base, power)).toBe(product);
        product *= base;
      }
    }
    expect([pow(4, 0.5), pow(27, 1 / 3), pow(2, -1074)]).toEqual([2, 3, 5e-324]);
  });

  it('ln 1, sin 0, cos 0 and atan 0 are exact', () => {
    expect([ln(1), sin(0), cos(0), atan(0)]).toEqual([0, 0, 1, 0]);
  });
});

describe('laws', () => {
  const positive = fc.double({ min: 1e-300, max: 1e300, noNaN: true });

  it('ln never falls from a number to the next', () => {
    fc.assert(
      fc.property(positive, (x) => ln(x * (1 + Number.EPSILON)) >= ln(x)),
      { seed, numRuns: 5000 },
    );
  });

  it('exp and ln undo each other to the last places that the argument holds', () => {
    fc.assert(
      fc.property(fc.double({ min: -700, max: 700, noNaN: true }), (x) => {
        expect(Math.abs(ln(exp(x)) - x)).toBeLessThanOrEqual(2.3e-16 * Math.max(1, Math.abs(x)));
      }),
      { seed, numRuns: 5000 },
    );
  });

  it('sine is odd, cosine even, and their squares add to 1', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e5, max: 1e5, noNaN: true }), (x) => {
        expect(sin(-x) + sin(x)).toBe(0);
        expect(cos(-x)).toBe(cos(x));
        expect(Math.abs(sin(x) * sin(x) + cos(x) * cos(x) - 1)).toBeLessThan(4e-16);
      }),
      { seed, numRuns: 5000 },
    );
  });
});
