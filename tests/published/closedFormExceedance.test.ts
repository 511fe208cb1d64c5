import { describe, expect, it } from 'vitest';
import { makeLognormal } from '../../engine/marginals/lognormal.ts';
import { cumulative, quantile, type Marginal } from '../../engine/marginals/marginal.ts';
import { makeNormal } from '../../engine/marginals/normal.ts';
import { randomStream } from '../../engine/random/randomStream.ts';
import { latinHypercube } from '../../engine/sampling/latinHypercube.ts';
import { exceedance } from '../../engine/summary/exceedance.ts';
import { sortedColumn } from '../../engine/summary/sortedColumn.ts';

/**
 * Chance that a settlement of mean 100 mm passes a limit, in closed form for a lognormal and a normal; figures
 * computed with scipy 1.17.1, tolerance 1e-9. At a limit of the mean the lognormal has less than one half.
 */
const CHANCES: readonly (readonly [cov: number, limit: number, lognormal: number, normal: number])[] = [
  [0.1, 100, 0.4801107318, 0.5],
  [0.1, 120, 0.03021548488, 0.02275013195],
  [0.1, 150, 1.938971376e-5, 2.866515719e-7],
  [0.1, 200, 1.292425262e-12, 7.619853024e-24],
  [0.2, 100, 0.4605607584, 0.5],
  [0.2, 120, 0.153949417, 0.1586552539],
  [0.2, 150, 0.01592100544, 0.006209665326],
  [0.2, 200, 0.0001597102527, 2.866515719e-7],
  [0.3, 100, 0.4416527609, 0.5],
  [0.3, 120, 0.2212880842, 0.2524925375],
  [0.3, 150, 0.06325893454, 0.04779035227],
  [0.3, 200, 0.006071617778, 0.0004290603332],
  [0.5, 100, 0.4066424784, 0.5],
  [0.5, 120, 0.2669204626, 0.3445782584],
  [0.5, 150, 0.1368603677, 0.1586552539],
  [0.5, 200, 0.04423362996, 0.02275013195],
];

const valid = (made: Marginal | string): Marginal => {
  if (typeof made === 'string') throw new Error(made);
  return made;
};
const lognormal = (cov: number) => valid(makeLognormal({ mean: 100, deviation: 100 * cov }));
const normal = (cov: number) => valid(makeNormal({ mean: 100, deviation: 100 * cov }));

describe('a settlement of mean 100 mm', () => {
  it.each(CHANCES)(
    'with a coefficient of variation of %f passes %f mm with a chance in closed form',
    (...row) => {
      const [cov, limit, ofLognormal, ofNormal] = row;
      expect(Math.abs(1 - cumulative(lognormal(cov), limit) - ofLognormal)).toBeLessThan(1e-9);
      expect(Math.abs(1 - cumulative(normal(cov), limit) - ofNormal)).toBeLessThan(1e-9);
    },
  );
});

describe('the exceedance curve of 20 replicates', () => {
  const REPLICATES = 20;
  const counts = Array.from({ length: REPLICATES }, () => 100);

  /** Drawn as a study draws; the shares above the limits, with their bands, read off the curve's own steps. */
  function curveOf(marginal: Marginal, name: string) {
    const replicates = counts.map((count, r) =>
      latinHypercube(randomStream(2000, name, r), count).map((p) => quantile(marginal, p)),
    );
    const values = Float64Array.from(replicates.flatMap((each) => [...each]));
    const { sorted, ofReplicates } = sortedColumn(values, counts);
    return exceedance(sorted, ofReplicates);
  }

  /**
   * Of one input alone, 100 strata leave each share within 1/100 of the chance in every replicate: at most one
   * realisation, that of the stratum which the value cuts, lies on either side.
   */
  it.each([
    ['lognormal', lognormal(0.3)],
    ['normal', normal(0.3)],
  ])('of a %s lies within a stratum of the closed form at each of its values', (name, marginal) => {
    const curve = curveOf(marginal, name);
    expect(curve.values.length).toBeGreaterThan(200);
    curve.values.forEach((value, i) => {
      expect(Math.abs(curve.shares[i] - (1 - cumulative(marginal, value)))).toBeLessThan(0.01);
    });
  });

  it('has the closed form within its band at more than eight of ten of its values', () => {
    const marginal = lognormal(0.5);
    const curve = curveOf(marginal, 'in the band');
    const within = curve.values.filter((value, i) => {
      const chance = 1 - cumulative(marginal, value);
      return curve.low[i] <= chance && chance <= curve.high[i];
    });
    // neighbouring values share their realisations, so the count scatters more than that of independent ones
    expect(within.length / curve.values.length).toBeGreaterThan(0.8);
  });
});
