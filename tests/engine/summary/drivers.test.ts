import fc from 'fast-check';
import { sampleCorrelation, sampleRankCorrelation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { randomStream } from '../../../engine/random/randomStream.ts';
import { drivers, rankedInput, rankedInputs } from '../../../engine/summary/drivers.ts';
import { ranks } from '../../../engine/summary/ranks.ts';

const draw = (name: string, count: number) => {
  const stream = randomStream(11, name);
  return Float64Array.from({ length: count }, () => stream.next());
};
const driversOf = (inputs: readonly Float64Array[], result: Float64Array) =>
  drivers(rankedInputs(inputs.map((values, i) => rankedInput(i, values))), result);

/** Ranks by their definition: those below, and half of the ties. */
const slowRanks = (values: readonly number[]) =>
  values.map(
    (value) =>
      values.filter((other) => other < value).length +
      0.5 * (values.filter((other) => other === value).length + 1),
  );

/** Coefficients of a linear regression of standardised columns, by Gaussian elimination with the largest pivot. */
function slowRegression(columns: readonly (readonly number[])[], result: readonly number[]): number[] {
  const rows = columns.map((a) => [
    ...columns.map((b) => sampleCorrelation([...a], [...b])),
    sampleCorrelation([...a], [...result]),
  ]);
  const size = rows.length;
  for (let j = 0; j < size; j += 1) {
    const largest = rows.slice(j).reduce((best, row) => (Math.abs(row[j]) > Math.abs(best[j]) ? row : best));
    rows.splice(rows.indexOf(largest), 1);
    rows.splice(j, 0, largest);
    rows.forEach((row, i) => {
      if (i === j) return;
      const times = row[j] / largest[j];
      rows[i] = row.map((value, k) => value - times * largest[k]);
    });
  }
  return rows.map((row, j) => row[size] / row[j]);
}

describe('ranks', () => {
  it('give ties the mean of their places', () => {
    expect([...ranks(Float64Array.of(5, 1, 5, 3, 5))]).toEqual([4, 1, 4, 2, 4]);
  });

  it('are those of the definition, ties and infinities among them', () => {
    const value = fc.oneof(fc.integer({ min: 0, max: 9 }), fc.constantFrom(-0, Infinity, -Infinity, 0.5));
    fc.assert(
      fc.property(fc.array(value, { maxLength: 60 }), (values) => {
        expect([...ranks(Float64Array.from(values))]).toEqual(slowRanks(values));
      }),
      { seed: 20, numRuns: 200 },
    );
  });
});

describe('drivers', () => {
  const [x, y, idle] = [draw('x', 2000), draw('y', 2000), draw('idle', 2000)];
  const result = x.map((value, i) => 3 * value + y[i] * y[i]);

  it('have the rank correlations of another library where there are no ties', () => {
    const found = driversOf([x, y, idle], result);
    [x, y, idle].forEach((values, i) => {
      expect(found[i].rankCorrelation).toBeCloseTo(sampleRankCorrelation([...values], [...result]), 12);
    });
  });

  it('have with ties the linear correlation of mean ranks, of input and result', () => {
    const steps = x.slice(0, 400).map((value) => Math.floor(6 * value));
    const tied = result.slice(0, 400).map((value) => Math.min(2.5, Math.round(4 * value) / 4));
    const [found] = driversOf([steps], tied);
    const expected = sampleCorrelation(slowRanks([...steps]), slowRanks([...tied]));
    expect(found.rankCorrelation).toBeCloseTo(expected, 12);
  });

  it('have the coefficients of a regression of ranks by elimination, with correlated inputs', () => {
    const both = x.map((value, i) => value + 0.4 * y[i]);
    const against = y.map((value, i) => idle[i] - 0.8 * value);
    const inputs = [both, x, against, y].map((values) => values.slice(0, 500));
    const found = driversOf(inputs, result.slice(0, 500));
    const expected = slowRegression(
      inputs.map((values) => [...ranks(values)]),
      [...ranks(result.slice(0, 500))],
    );
    found.forEach(({ rankRegression }, i) => expect(rankRegression).toBeCloseTo(expected[i], 9));
  });

  it('give no coefficient to a copy of an earlier input, and leave the others theirs', () => {
    const [first, copy, turned, other] = driversOf([x, x, x.map((value) => -value), y], result);
    const [alone, beside] = driversOf([x, y], result);
    expect([copy.rankRegression, turned.rankRegression]).toEqual([NaN, NaN]);
    expect(first.rankRegression).toBe(alone.rankRegression);
    expect(other.rankRegression).toBe(beside.rankRegression);
    expect(copy.rankCorrelation).toBe(first.rankCorrelation);
  });

  it('give nothing to an input, or a result, that does not vary', () => {
    const still = new Float64Array(2000).fill(0.1);
    const nothing = { rankCorrelation: NaN, rankRegression: NaN, firstOrderShare: NaN };
    expect(driversOf([still, x], result)[0]).toEqual({ input: 0, ...nothing });
    expect(driversOf([still, x], result)[1].rankRegression).toBeCloseTo(
      driversOf([x], result)[0].rankCorrelation,
      12,
    );
    expect(driversOf([x], still)[0]).toEqual({ input: 0, ...nothing });
  });

  it('rank a date that is not reached last, and give no share of a variance that is infinite', () => {
    const dates = result.map((value) => (value > 3 ? Infinity : value));
    const cut = result.map((value) => Math.min(value, 3.5)).map((value) => (value > 3 ? 9 : value));
    const [found] = driversOf([x], dates);
    expect(found.rankCorrelation).toBe(driversOf([x], cut)[0].rankCorrelation);
    expect(found.firstOrderShare).toBeNaN();
  });
});
