import { mean, sampleStandardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { normalQuantile } from '../../engine/marginals/standardNormal.ts';
import { randomStream } from '../../engine/random/randomStream.ts';
import { latinHypercube } from '../../engine/sampling/latinHypercube.ts';
import { drivers, rankedInput, rankedInputs } from '../../engine/summary/drivers.ts';

/**
 * USACE ETL 1110-2-547 (1995), Introduction to probability and reliability methods for use in geotechnical
 * engineering: a settlement S = 1000 Cc/(1 + e0) H log((σ0 + Δσ)/σ0) mm with H 5 m, e0 1.5, σ0 50 kPa, and
 * independent normals Cc (0.6, 25 %) and Δσ (40 kPa, 10 %). Its exact mean and deviation by quadrature (scipy
 * 1.17.1): 305.810751 and 80.111665 mm. A sample meets them within five standard errors of random sampling.
 * As a product of two independent factors, δ² = δ1² + δ2² + δ1² δ2² and the first-order shares of the variance are
 * δ1²/δ² and δ2²/δ², with δ = 80.111665/305.810751 and δ1 = 0.25.
 */
const EXACT_MEAN = 305.810751;
const EXACT_DEVIATION = 80.111665;
const STRATA = 100;
const REPLICATES = 100;
const COUNT = STRATA * REPLICATES;

const drawn = (name: string, middle: number, deviation: number) =>
  Float64Array.from(
    Array.from({ length: REPLICATES }, (_, r) => [
      ...latinHypercube(randomStream(547, name, r), STRATA).map(
        (p) => middle + deviation * normalQuantile(p),
      ),
    ]).flat(),
  );
const compression = drawn('compression index', 0.6, 0.15);
const load = drawn('load', 40, 4);
const settlement = compression.map(
  (index, r) => ((1000 * index * 5) / 2.5) * Math.log10((50 + load[r]) / 50),
);

describe('USACE ETL 1110-2-547 (1995), a settlement of two uncertain factors', () => {
  it('has the exact mean', () => {
    const error = Math.abs(mean([...settlement]) - EXACT_MEAN);
    expect(error).toBeLessThan((5 * EXACT_DEVIATION) / Math.sqrt(COUNT));
  });

  it('has the exact deviation', () => {
    const error = Math.abs(sampleStandardDeviation([...settlement]) - EXACT_DEVIATION);
    expect(error).toBeLessThan((5 * EXACT_DEVIATION) / Math.sqrt(2 * COUNT));
  });

  const variation = (EXACT_DEVIATION / EXACT_MEAN) ** 2;
  const ofCompression = 0.25 ** 2 / variation;
  const ofLoad = (variation - 0.25 ** 2) / (1 + 0.25 ** 2) / variation;
  const found = drivers(rankedInputs([rankedInput(0, compression), rankedInput(1, load)]), settlement);

  it.each([
    ['the compression index', 0, ofCompression],
    ['the load', 1, ofLoad],
  ])('owes %s its first-order share of the variance', (_, input, share) => {
    // 32 bins leave up to 1 % of a normal's variance within them, 10,000 points scatter by 0.01
    expect(Math.abs(found[input].firstOrderShare - share)).toBeLessThan(0.02);
  });
});
