import { describe, it, expect } from 'vitest';
import fc from 'fast-check';
import { makeBeta, makeBetaFromMoments } from '../../../engine/marginals/beta.ts';
import { makeTable } from '../../../engine/marginals/cumulativeTable.ts';
import { makeFixed } from '../../../engine/marginals/fixed.ts';
import { makeLognormal, makeLognormalFromMedian } from '../../../engine/marginals/lognormal.ts';
import {
  cumulative,
  density,
  deviation,
  isUncertain,
  limits,
  mean,
  median,
  quantile,
  type Marginal,
} from '../../../engine/marginals/marginal.ts';
import { makeNormal } from '../../../engine/marginals/normal.ts';
import { makePert } from '../../../engine/marginals/pert.ts';
import { makeTriangular } from '../../../engine/marginals/triangular.ts';
import { makeUniform } from '../../../engine/marginals/uniform.ts';

const seed = 31;

const valid = <T extends Marginal>(made: T | string): T => {
  if (typeof made === 'string') throw new Error(made);
  return made;
};

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const width = number(-3, 3).map((power) => 10 ** power);
const lowModeHigh = fc
  .tuple(number(-100, 100), width, number(0, 1))
  .map(([low, wide, at]) => ({ low, mode: low + at * wide, high: low + wide }));

/** Any distribution of each kind but the fixed number. */
const families: Readonly<Record<string, fc.Arbitrary<Marginal>>> = {
  normal: fc.tuple(number(-50, 50), width).map(([m, d]) => valid(makeNormal({ mean: m, deviation: d }))),
  'normal, cut': fc
    .tuple(number(-50, 50), width, number(-2.5, 2.4), number(0.1, 4))
    .map(([m, d, from, wide]) =>
      valid(makeNormal({ mean: m, deviation: d, low: m + from * d, high: m + (from + wide) * d })),
    ),
  'normal, cut below': fc
    .tuple(number(-50, 50), width, number(-4, 3))
    .map(([m, d, from]) => valid(makeNormal({ mean: m, deviation: d, low: m + from * d }))),
  lognormal: fc
    .tuple(width, number(0.01, 1.5))
    .map(([m, cov]) => valid(makeLognormal({ mean: m, deviation: m * cov }))),
  uniform: lowModeHigh.map(({ low, high }) => valid(makeUniform({ low, high }))),
  triangular: lowModeHigh.map((input) => valid(makeTriangular(input))),
  pert: lowModeHigh.map((input) => valid(makePert(input))),
  beta: fc
    .tuple(lowModeHigh, number(-1, 2), number(-1, 2))
    .map(([{ low, high }, a, b]) => valid(makeBeta({ low, high, alpha: 10 ** a, beta: 10 ** b }))),
  table: fc.array(fc.tuple(number(0.01, 5), number(0.01, 1)), { minLength: 1, maxLength: 8 }).map((steps) => {
    const values = [3];
    const shares = [0];
    for (const [step, share] of steps) {
      values.push(values[values.length - 1] + step);
      shares.push(shares[shares.length - 1] + share);
    }
    const total = shares[shares.length - 1];
    return valid(makeTable({ values, cumulative: shares.map((share) => share / total) }));
  }),
};

/** Mean and deviation by the middle rule over p, with p = u²(3 − 2u) twice over to tame the ends. */
function momentsByQuadrature(marginal: Marginal): readonly [number, number] {
  const points = 4000;
  const smooth = (u: number) => u * u * (3 - 2 * u);
  const slope = (u: number) => 6 * u * (1 - u);
  const [values, weights] = [new Float64Array(points), new Float64Array(points)];
  for (let i = 0; i < points; i += 1) {
    const u = (i + 0.5) / points;
    const p = smooth(smooth(u));
    values[i] = quantile(marginal, p);
    weights[i] = (slope(smooth(u)) * slope(u)) / points;
  }
  const average = values.reduce((sum, value, i) => sum + weights[i] * value, 0);
  const variance = values.reduce(
    (sum, value, i) => sum + weights[i] * (value - average) * (value - average),
    0,
  );
  return [average, Math.sqrt(variance)];
}

describe.each(Object.entries(families))('a %s distribution', (_, family) => {
  it('has F(F⁻¹(p)) = p to 1e-12, as far as rounding x allows', () => {
    fc.assert(
      fc.property(family, number(1e-6, 1 - 1e-6), (marginal, p) => {
        const x = quantile(marginal, p);
        // rounding x and its distance from the other limit may move it by a few last places
        const step = 1e-15 * Math.max(...[x, mean(marginal), deviation(marginal)].map(Math.abs));
        expect(cumulative(marginal, x - step)).toBeLessThan(p + 1e-12);
        expect(cumulative(marginal, x + step)).toBeGreaterThan(p - 1e-12);
      }),
      { seed, numRuns: 300 },
    );
  });

  it('has a quantile that rises with p and stays between its limits', () => {
    fc.assert(
      fc.property(family, number(0, 1), number(0, 1), (marginal, one, other) => {
        const [below, above] = [
          quantile(marginal, Math.min(one, other)),
          quantile(marginal, Math.max(one, other)),
        ];
        const { low, high } = limits(marginal);
        expect(below).toBeLessThanOrEqual(above);
        expect(below).toBeGreaterThanOrEqual(low);
        expect(above).toBeLessThanOrEqual(high);
      }),
      { seed, numRuns: 500 },
    );
  });

  it('has the mean and deviation of its quantile, by quadrature to 1e-4 of the deviation', () => {
    fc.assert(
      fc.property(family, (marginal) => {
        const [average, spread] = momentsByQuadrature(marginal);
        expect(Math.abs(mean(marginal) - average)).toBeLessThan(1e-4 * spread + 1e-14 * Math.abs(average));
        expect(Math.abs(deviation(marginal) / spread - 1)).toBeLessThan(2e-3);
      }),
      { seed, numRuns: 20 },
    );
  });

  it('has a density that is the slope of F, and none outside its limits', () => {
    fc.assert(
      fc.property(family, number(0.05, 0.95), (marginal, p) => {
        const [from, to] = [quantile(marginal, p - 1e-4), quantile(marginal, p + 1e-4)];
        fc.pre(to - from > 1e-7 * Math.abs(from));
        const slope = (cumulative(marginal, to) - cumulative(marginal, from)) / (to - from);
        const middle = density(marginal, 0.5 * (from + to));
        // a corner of a triangle or a table may lie between
        if (marginal.kind !== 'table') expect(Math.abs(middle / slope - 1)).toBeLessThan(0.01);
        const { low, high } = limits(marginal);
        if (low > -Infinity) expect(density(marginal, low - 0.1 * (to - from) - 1e-9)).toBe(0);
        if (high < Infinity) expect(density(marginal, high + 0.1 * (to - from) + 1e-9)).toBe(0);
      }),
      { seed, numRuns: 200 },
    );
  });

  it('is uncertain, and has half its probability below its median', () => {
    fc.assert(
      fc.property(family, (marginal) => {
        expect(isUncertain(marginal)).toBe(true);
        expect(median(marginal)).toBe(quantile(marginal, 0.5));
        expect(structuredClone(marginal)).toEqual(marginal);
      }),
      { seed, numRuns: 50 },
    );
  });
});

describe('a fixed number', () => {
  it('is what it is at every probability', () => {
    const marginal = valid(makeFixed({ value: 4.2 }));
    expect([0, 0.3, 1].map((p) => quantile(marginal, p))).toEqual([4.2, 4.2, 4.2]);
    expect([mean(marginal), deviation(marginal), median(marginal)]).toEqual([4.2, 0, 4.2]);
    expect([cumulative(marginal, 4.1), cumulative(marginal, 4.2)]).toEqual([0, 1]);
    expect(limits(marginal)).toEqual({ low: 4.2, high: 4.2 });
    expect(isUncertain(marginal)).toBe(false);
  });
});

describe('limits and moments', () => {
  it('are exactly those entered', () => {
    fc.assert(
      fc.property(lowModeHigh, ({ low, mode, high }) => {
        for (const made of [
          makeUniform({ low, high }),
          makeTriangular({ low, mode, high }),
          makePert({ low, mode, high }),
          makeBeta({ low, high, alpha: 2, beta: 3 }),
          makeNormal({ mean: mode, deviation: high - low, low, high }),
          makeTable({ values: [low, high], cumulative: [0, 1] }),
        ]) {
          const found = limits(valid(made));
          expect(found.low === low && found.high === high).toBe(true);
        }
      }),
      { seed },
    );
    expect(limits(valid(makeNormal({ mean: 1, deviation: 1 })))).toEqual({ low: -Infinity, high: Infinity });
    expect(limits(valid(makeLognormal({ mean: 1, deviation: 1 })))).toEqual({ low: 0, high: Infinity });
  });

  it('of a lognormal and a beta are those entered, to 1e-13', () => {
    fc.assert(
      fc.property(number(0.001, 1000), number(1e-6, 3), (m, cov) => {
        const marginal = valid(makeLognormal({ mean: m, deviation: m * cov }));
        expect(Math.abs(mean(marginal) / m - 1)).toBeLessThan(1e-13);
        expect(Math.abs(deviation(marginal) / (m * cov) - 1)).toBeLessThan(1e-13);
        const byMedian = valid(makeLognormalFromMedian({ median: m, cov }));
        expect(Math.abs(median(byMedian) / m - 1)).toBeLessThan(1e-13);
        expect(Math.abs(deviation(byMedian) / mean(byMedian) / cov - 1)).toBeLessThan(1e-13);
      }),
      { seed },
    );
    fc.assert(
      fc.property(number(0.05, 0.95), number(0.05, 0.9), (share, part) => {
        const spread = part * Math.sqrt(share * (1 - share));
        const made = makeBetaFromMoments({ low: 2, high: 7, mean: 2 + 5 * share, deviation: 5 * spread });
        fc.pre(typeof made !== 'string');
        expect(mean(valid(made))).toBeCloseTo(2 + 5 * share, 12);
        expect(deviation(valid(made))).toBeCloseTo(5 * spread, 12);
      }),
      { seed },
    );
  });

  it('of a normal cut on both sides alike keep the mean, and keep digits however narrow the cut', () => {
    const narrow = valid(makeNormal({ mean: 0, deviation: 1, low: -0.002, high: 0.002 }));
    expect(mean(narrow)).toBeCloseTo(0, 15);
    // φ is level there, so that the cut distribution is uniform but for 1e-6 of it
    expect(deviation(narrow) / (0.004 / Math.sqrt(12))).toBeCloseTo(1, 5);
    const tail = valid(makeNormal({ mean: 0, deviation: 1, low: 3 }));
    const mirrored = valid(makeNormal({ mean: 0, deviation: 1, high: -3 }));
    expect(mean(tail)).toBe(-mean(mirrored));
    expect(deviation(tail)).toBe(deviation(mirrored));
  });

  it('of a table start where its curve leaves 0 and end where it reaches 1', () => {
    const marginal = valid(makeTable({ values: [1, 2, 3, 4, 5], cumulative: [0, 0, 0.5, 1, 1] }));
    expect(limits(marginal)).toEqual({ low: 2, high: 4 });
    expect(median(marginal)).toBe(3);
    expect(mean(marginal)).toBe(3);
  });

  it('lie at the middle of a gap’s lower end where a table’s curve is level', () => {
    const marginal = valid(makeTable({ values: [0, 1, 9, 10], cumulative: [0, 0.5, 0.5, 1] }));
    expect(median(marginal)).toBe(1);
    expect(cumulative(marginal, 5)).toBe(0.5);
  });
});

describe('what is refused, in a sentence', () => {
  const wrong: readonly (readonly [string, () => Marginal | string])[] = [
    ['a fixed number that is not finite', () => makeFixed({ value: Infinity })],
    ['a normal deviation of 0', () => makeNormal({ mean: 1, deviation: 0 })],
    ['a normal deviation below 0', () => makeNormal({ mean: 1, deviation: -1 })],
    ['a normal mean that is not a number', () => makeNormal({ mean: NaN, deviation: 1 })],
    ['normal limits that are turned round', () => makeNormal({ mean: 1, deviation: 1, low: 2, high: 0 })],
    ['normal limits that are not numbers', () => makeNormal({ mean: 1, deviation: 1, low: NaN })],
    ['normal limits that leave nothing', () => makeNormal({ mean: 0, deviation: 1, low: 9, high: 10 })],
    ['a lognormal mean of 0', () => makeLognormal({ mean: 0, deviation: 1 })],
    ['a lognormal deviation of 0', () => makeLognormal({ mean: 1, deviation: 0 })],
    ['a lognormal deviation of no size', () => makeLognormal({ mean: 1, deviation: 1e-200 })],
    ['a lognormal deviation of every size', () => makeLognormal({ mean: 1e-200, deviation: 1e200 })],
    ['a lognormal median of 0', () => makeLognormalFromMedian({ median: 0, cov: 1 })],
    ['a uniform of no width', () => makeUniform({ low: 1, high: 1 })],
    ['a uniform that is turned round', () => makeUniform({ low: 2, high: 1 })],
    ['a triangle whose best lies below low', () => makeTriangular({ low: 1, mode: 0, high: 2 })],
    ['a triangle whose best lies above high', () => makeTriangular({ low: 1, mode: 3, high: 2 })],
    ['a triangle of no width', () => makeTriangular({ low: 1, mode: 1, high: 1 })],
    ['a PERT with NaN', () => makePert({ low: 1, mode: NaN, high: 2 })],
    ['a beta shape of 0', () => makeBeta({ low: 0, high: 1, alpha: 0, beta: 1 })],
    ['a beta shape of NaN', () => makeBeta({ low: 0, high: 1, alpha: 1, beta: NaN })],
    ['a beta mean at its limit', () => makeBetaFromMoments({ low: 0, high: 1, mean: 0, deviation: 0.1 })],
    ['a beta deviation too large', () => makeBetaFromMoments({ low: 0, high: 1, mean: 0.5, deviation: 0.6 })],
    [
      'a beta of infinite limits',
      () => makeBetaFromMoments({ low: -Infinity, high: 1, mean: 0, deviation: 0.6 }),
    ],
    ['a table that falls', () => makeTable({ values: [0, 1, 2, 3], cumulative: [0, 0.6, 0.5, 1] })],
    ['a table of values that do not rise', () => makeTable({ values: [0, 0, 2], cumulative: [0, 0.5, 1] })],
    ['a table that ends below 1', () => makeTable({ values: [0, 1], cumulative: [0, 0.9] })],
    ['a table that starts above 0', () => makeTable({ values: [0, 1], cumulative: [0.1, 1] })],
    ['a table of one point', () => makeTable({ values: [0], cumulative: [0] })],
    ['a table of unequal columns', () => makeTable({ values: [0, 1, 2], cumulative: [0, 1] })],
    ['a table with NaN', () => makeTable({ values: [0, NaN], cumulative: [0, 1] })],
  ];
  for (const [what, make] of wrong) {
    it(what, () => expect(make()).toMatch(/^[a-z].{10,}/));
  }

  it('a probability outside 0 to 1 is a programmer’s mistake', () => {
    const marginal = valid(makeUniform({ low: 0, high: 1 }));
    for (const p of [-0.01, 1.01, NaN]) expect(() => quantile(marginal, p)).toThrow(RangeError);
  });
});
