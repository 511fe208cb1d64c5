/**
 * Values of inverse distribution functions, means and deviations that follow from the definitions: computed with
 * mpmath to 50 digits, and by scipy 1.17.1 to 1e-14 of the value. Tolerance 1e-12 of the value, and at 1 − 1e-6 what
 * rounding that to a double does.
 */
import { describe, it, expect } from 'vitest';
import { makeLognormal } from '../../engine/marginals/lognormal.ts';
import { density, deviation, mean, quantile, type Marginal } from '../../engine/marginals/marginal.ts';
import { makeNormal } from '../../engine/marginals/normal.ts';
import { makePert } from '../../engine/marginals/pert.ts';
import { makeTriangular } from '../../engine/marginals/triangular.ts';
import { makeUniform } from '../../engine/marginals/uniform.ts';

const PROBABILITIES = [1e-6, 1e-3, 0.05, 0.5, 0.95, 0.999, 1 - 1e-6];

interface Printed {
  readonly name: string;
  readonly marginal: Marginal | string;
  /** At the probabilities above. */
  readonly values: readonly number[];
  readonly mean: number;
  readonly deviation: number;
}

const TABLE: readonly Printed[] = [
  {
    name: 'a normal of mean 0 and deviation 1',
    marginal: makeNormal({ mean: 0, deviation: 1 }),
    values: [
      -4.7534243088229, -3.09023230616781, -1.64485362695147, 0.0, 1.64485362695147, 3.09023230616781,
      4.7534243088229,
    ],
    mean: 0.0,
    deviation: 1.0,
  },
  {
    name: 'a normal of mean 10 and deviation 2',
    marginal: makeNormal({ mean: 10, deviation: 2 }),
    values: [
      0.493151382354202, 3.81953538766437, 6.71029274609705, 10.0, 13.2897072539029, 16.1804646123356,
      19.5068486176458,
    ],
    mean: 10.0,
    deviation: 2.0,
  },
  {
    name: 'a lognormal of mean 1 and coefficient of variation 0.3',
    marginal: makeLognormal({ mean: 1, deviation: 0.3 }),
    values: [
      0.237282019222222, 0.386641019062099, 0.590992056413592, 0.957826285221151, 1.55235790854439,
      2.37282426703205, 3.86641683035134,
    ],
    mean: 1.0,
    deviation: 0.3000000000000001,
  },
  {
    name: 'a lognormal whose logarithm is standard normal',
    marginal: { kind: 'lognormal', logMean: 0, logDeviation: 1 },
    values: [
      0.00862211979347149, 0.0454913852476535, 0.193040816698737, 1.0, 5.18025160223302, 21.9821839795828,
      115.980759251012,
    ],
    mean: 1.6487212707001282,
    deviation: 2.1611974158950877,
  },
  {
    name: 'a PERT of 1, 2 and 5',
    marginal: makePert({ low: 1, mode: 2, high: 5 }),
    values: [
      1.00126531128557, 1.04040715153495, 1.30576156564932, 2.25524068182279, 3.62963327200455,
      4.51194468155409, 4.91504712719779,
    ],
    mean: 2.333333333333333,
    deviation: 0.7126966450997984,
  },
  {
    name: 'a triangle of 1, 2 and 5',
    marginal: makeTriangular({ low: 1, mode: 2, high: 5 }),
    values: [
      1.002, 1.06324555320337, 1.44721359549996, 2.55051025721682, 4.22540333075852, 4.89045548849897,
      4.99653589838486,
    ],
    mean: 2.666666666666667,
    deviation: 0.8498365855987975,
  },
  {
    name: 'a normal of mean 1 and deviation 0.3, cut at 0.5 and 2',
    marginal: makeNormal({ mean: 1, deviation: 0.3, low: 0.5, high: 2 }),
    values: [
      0.500002870326822, 0.502847746875912, 0.607498663367653, 1.01781804326157, 1.49931450303667,
      1.89792703708604, 1.9998150523266,
    ],
    mean: 1.0308689400982447,
    deviation: 0.26996935380779774,
  },
  {
    name: 'a uniform from 0 to 1',
    marginal: makeUniform({ low: 0, high: 1 }),
    values: [1.0e-6, 0.001, 0.05, 0.5, 0.95, 0.999, 0.999999],
    mean: 0.5,
    deviation: 0.28867513459481287,
  },
];

const relative = (got: number, wanted: number) =>
  Math.abs(got - wanted) / (wanted === 0 ? 1 : Math.abs(wanted));

describe.each(TABLE)('$name', ({ marginal, values, mean: wantedMean, deviation: wantedDeviation }) => {
  if (typeof marginal === 'string') throw new Error(marginal);
  PROBABILITIES.forEach((p, i) => {
    it(`is ${values[i]} at a probability of ${p}`, () => {
      // 1 − 1e-6 is no double: its rounding, up to 2⁻⁵⁴, moves the value by that over the density
      const byRounding = 2 ** -54 / density(marginal, values[i]) / Math.abs(values[i] || 1);
      expect(relative(quantile(marginal, p), values[i])).toBeLessThan(1e-12 + (p > 0.999 ? byRounding : 0));
    });
  });

  it(`has the mean ${wantedMean}`, () => {
    expect(relative(mean(marginal), wantedMean)).toBeLessThan(1e-12);
  });

  it(`has the deviation ${wantedDeviation}`, () => {
    expect(relative(deviation(marginal), wantedDeviation)).toBeLessThan(1e-12);
  });
});
