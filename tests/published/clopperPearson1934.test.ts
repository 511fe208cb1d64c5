import { describe, expect, it } from 'vitest';
import { inverseIncompleteBeta } from '../../engine/marginals/incompleteBeta.ts';

/**
 * Clopper, C.J. & Pearson, E.S. (1934) The use of confidence or fiducial limits illustrated in the case of the
 * binomial, Biometrika 26. Figures computed from its definition with another library's beta quantiles (scipy
 * 1.17.1, beta.ppf); tolerance 1e-10 relative, that of the list. Two-sided, 95 %.
 */
const INTERVALS: readonly (readonly [above: number, of: number, low: number, high: number])[] = [
  [0, 100, 0, 0.03621669264517641],
  [0, 1000, 0, 0.003682083896865671],
  [1, 1000, 2.531748749129404e-5, 0.005558924279826672],
  [10, 1000, 0.004805510691049308, 0.01831324305511245],
  [50, 1000, 0.03733539760466178, 0.06539048791549364],
  [5, 100, 0.016431879182052155, 0.11283491110546275],
  [100, 10_000, 0.008143596567611065, 0.012149504886061608],
  [500, 1000, 0.46854917297179194, 0.531450827028208],
];

describe('Clopper & Pearson (1934), 95 % limits by the beta quantiles that the bands are made of', () => {
  it.each(INTERVALS)('of %i in %i', (above, of, low, high) => {
    const found = [
      above === 0 ? 0 : inverseIncompleteBeta(0.025, above, of - above + 1),
      inverseIncompleteBeta(0.975, above + 1, of - above),
    ];
    expect(Math.abs(found[0] - low)).toBeLessThanOrEqual(1e-10 * Math.max(low, 1e-3));
    expect(Math.abs(found[1] - high)).toBeLessThanOrEqual(1e-10 * high);
  });

  // upper one-sided 95 % limit for none of N: 1 − 0.05^(1/N)
  it.each([
    [100, 0.029513049607039932],
    [300, 0.00993608194445772],
    [1000, 0.0029912495450953314],
    [10_000, 0.00029952835977664627],
  ])('upper one-sided limit for none of %i', (of, expected) => {
    expect(Math.abs(inverseIncompleteBeta(0.95, 1, of) / expected - 1)).toBeLessThan(1e-10);
  });
});
