import { describe, expect, it } from 'vitest';
import { lognormalCumulative, makeLognormal } from '../../engine/marginals/lognormal.ts';
import { normalQuantile } from '../../engine/marginals/standardNormal.ts';

/**
 * Duncan, J.M. (2000) Factors of safety and reliability in geotechnical engineering, Journal of Geotechnical and
 * Geoenvironmental Engineering 126(4): the chance that a lognormal factor of safety lies below 1. Values from
 * memory: the retaining wall (1.50, 17 %) has about 1 %, the underwater slope (1.17, 16 %) about 18 %. The longer
 * figures follow from β = ln(F/√(1 + V²))/√ln(1 + V²), pf = Φ(−β); tolerance: their printed digits, six of the
 * chance and six decimals of β.
 */
const chanceOfFailure = (mean: number, variation: number) => {
  const factor = makeLognormal({ mean, deviation: variation * mean });
  if (typeof factor === 'string') throw new Error(factor);
  return lognormalCumulative(factor, 1);
};

describe('Duncan (2000), chance that a lognormal factor of safety is below 1', () => {
  it.each([
    [1.5, 0.17, 0.0102306, 2.317783],
    [1.17, 0.16, 0.181936, 0.908012],
    [1.5, 0.1, 2.97377e-5, 4.014883],
    [1.3, 0.1, 0.00493563, 2.580307],
    [2, 0.3, 0.0134008, 2.214394],
  ])('with a mean of %f and a coefficient of variation of %f', (mean, variation, expected, index) => {
    const chance = chanceOfFailure(mean, variation);
    expect(Math.abs(chance / expected - 1)).toBeLessThan(5e-6);
    expect(Math.abs(-normalQuantile(chance) - index)).toBeLessThan(1e-6);
  });

  it.each([
    [1.5, 0.17, 0.01],
    [1.17, 0.16, 0.18],
  ])('with a mean of %f and a coefficient of variation of %f, as printed', (mean, variation, printed) => {
    expect(Math.abs(chanceOfFailure(mean, variation) - printed)).toBeLessThan(0.005);
  });
});
