import { describe, it, expect } from 'vitest';
import { sampleRankCorrelation } from 'simple-statistics';
import { latinHypercube } from '../../../engine/sampling/latinHypercube.ts';
import { lowerFactor } from '../../../engine/sampling/lowerFactor.ts';
import { normalScores } from '../../../engine/sampling/normalScores.ts';
import { pairedScores } from '../../../engine/sampling/pairedScores.ts';
import { imposeRankCorrelation, rearranged } from '../../../engine/sampling/rankCorrelation.ts';
import { randomStream } from '../../../engine/random/randomStream.ts';

const WANTED = [
  [1, 0.8, 0.4, 0],
  [0.8, 1, 0.3, -0.2],
  [0.4, 0.3, 1, 0.1],
  [0, -0.2, 0.1, 1],
];

const hypercube = (inputs: number, count: number, replicate = 0): Float64Array[] =>
  Array.from({ length: inputs }, (_, j) => latinHypercube(randomStream(7, 'column', j, replicate), count));

const scoresOf = (columns: readonly Float64Array[]): Float64Array[] => {
  const scores = normalScores(columns[0].length);
  return columns.map((column) => column.map((p) => scores[Math.floor(p * column.length)]));
};

const dot = (a: ArrayLike<number>, b: ArrayLike<number>): number => {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i] * b[i];
  return sum;
};

describe('pairedScores', () => {
  it('gives scores whose sample correlation is the wanted one to the last digits', () => {
    const paired = pairedScores(scoresOf(hypercube(4, 100)), lowerFactor(WANTED));
    for (let i = 0; i < 4; i++) {
      for (let j = 0; j < 4; j++) expect(dot(paired[i], paired[j]) / 100).toBeCloseTo(WANTED[i][j], 12);
    }
  });

  it('is R Q′⁻¹ P′ with Q the Cholesky factor of the sample correlation', () => {
    const scores = scoresOf(hypercube(4, 100));
    const target = lowerFactor(WANTED);
    const sample = lowerFactor(scores.map((a) => scores.map((b) => dot(a, b) / 100)));
    const paired = pairedScores(scores, target);
    for (let r = 0; r < 100; r++) {
      // Row of R Q'⁻¹ by forward substitution in Q t = row.
      const row: number[] = [];
      for (let j = 0; j < 4; j++) {
        let rest = scores[j][r];
        for (let k = 0; k < j; k++) rest -= sample[j][k] * row[k];
        row.push(rest / sample[j][j]);
      }
      for (let j = 0; j < 4; j++) {
        expect(paired[j][r]).toBeCloseTo(dot(target[j], row.slice(0, j + 1)), 12);
      }
    }
  });

  it('stays finite, and keeps the earlier correlations, with more inputs than realisations', () => {
    const inputs = 130;
    const matrix = Array.from({ length: inputs }, (_, i) =>
      Array.from({ length: inputs }, (_, j) => (i === j ? 1 : Math.abs(i - j) === 1 ? 0.4 : 0)),
    );
    const paired = pairedScores(scoresOf(hypercube(inputs, 100)), lowerFactor(matrix));
    paired.forEach((column) => column.forEach((score) => expect(Number.isFinite(score)).toBe(true)));
    for (let j = 1; j < 50; j++) expect(dot(paired[j], paired[j - 1]) / 100).toBeCloseTo(0.4, 10);
    // Past that, what is left to chance: five standard errors of a correlation of 100 pairs.
    for (let j = 50; j < inputs; j++) {
      expect(Math.abs(dot(paired[j], paired[j - 1]) / 100 - 0.4)).toBeLessThan(5 / Math.sqrt(99));
    }
  });

  it('refuses a factor of another size', () => {
    expect(() => pairedScores(scoresOf(hypercube(3, 20)), lowerFactor(WANTED))).toThrow(RangeError);
  });
});

describe('rearranged', () => {
  it('puts the smallest value where the smallest score is, and equal scores in their order', () => {
    expect(rearranged(Float64Array.of(5, 3, 9, 4), Float64Array.of(0, 2, -1, 0))).toEqual(
      Float64Array.of(4, 9, 3, 5),
    );
  });
});

describe('imposeRankCorrelation', () => {
  const columns = hypercube(4, 100);
  const paired = imposeRankCorrelation(columns, lowerFactor(WANTED));

  it('only rearranges a column, so that it keeps one value in each stratum', () => {
    paired.forEach((column, j) => expect(Array.from(column).sort()).toEqual(Array.from(columns[j]).sort()));
  });

  it('leaves the first column as it is', () => {
    expect(paired[0]).toEqual(columns[0]);
  });

  it('leaves the earlier columns as they are when one is added at the end', () => {
    const three = imposeRankCorrelation(
      columns.slice(0, 3),
      lowerFactor(WANTED.slice(0, 3).map((row) => row.slice(0, 3))),
    );
    three.forEach((column, j) => expect(column).toEqual(paired[j]));
  });

  it('does not change the columns that it is given', () => {
    expect(columns).toEqual(hypercube(4, 100));
  });

  it('leaves uncorrelated columns the share of chance rank correlation that theory gives', () => {
    // Spearman's correlation follows the scores' with a correlation of 3/π at independence, so of its variance
    // 1/(n − 1) there stays the share 1 − 9/π²; five standard errors of a mean square of 400.
    const replicates = 400;
    const identity = [[1], [0, 1]];
    let sum = 0;
    for (let replicate = 0; replicate < replicates; replicate++) {
      const [a, b] = imposeRankCorrelation(hypercube(2, 100, replicate), identity);
      sum += sampleRankCorrelation(Array.from(a), Array.from(b)) ** 2;
    }
    const share = (sum / replicates) * 99;
    expect(Math.abs(share / (1 - 9 / Math.PI ** 2) - 1)).toBeLessThan(5 * Math.sqrt(2 / replicates));
  });
});
