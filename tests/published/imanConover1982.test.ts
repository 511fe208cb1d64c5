/**
 * Iman & Conover (1982), A distribution-free approach to inducing rank correlation among input variables,
 * Communications in Statistics B11(3):311–334: the worked example of Mildenhall (2005), Correlation and
 * aggregate loss distributions with an emphasis on the Iman–Conover method, Casualty Actuarial Society working
 * party. It takes the wanted correlation for that of the scores and starts from scores shuffled by itself.
 * The source says that the rank correlation of the result equals the wanted one; it does so for the scores
 * only (the Spearman correlations below are recomputed from the printed result). Its root mean square of the
 * scores, 0.868674836252965, is off in the ninth digit; recomputed 0.868674839212417.
 */
import { describe, it, expect } from 'vitest';
import { sampleCorrelation, sampleRankCorrelation } from 'simple-statistics';
import { lowerFactor } from '../../engine/sampling/lowerFactor.ts';
import { normalScores } from '../../engine/sampling/normalScores.ts';
import { pairedScores } from '../../engine/sampling/pairedScores.ts';
import { imposeRankCorrelation, rearranged } from '../../engine/sampling/rankCorrelation.ts';

/** Printed values, each column in rising order. */
const X = [
  [123567, 44770, 15934, 13273],
  [126109, 45191, 16839, 15406],
  [138713, 47453, 17233, 16706],
  [139016, 47941, 17265, 16891],
  [152213, 49345, 17620, 18821],
  [153224, 49420, 17859, 19569],
  [153407, 50686, 20804, 20166],
  [155716, 52931, 21110, 20796],
  [155780, 54010, 22728, 20968],
  [161678, 57346, 24072, 21178],
  [161805, 57685, 25198, 23236],
  [167447, 57698, 25393, 23375],
  [170737, 58380, 30357, 24019],
  [171592, 60948, 30779, 24785],
  [178881, 66972, 32634, 25000],
  [181678, 68053, 33117, 26754],
  [184381, 70592, 35248, 27079],
  [206940, 72243, 36656, 30136],
  [217092, 86685, 38483, 30757],
  [240935, 87138, 39483, 35108],
];

/** Wanted correlation. */
const WANTED = [
  [1.0, 0.8, 0.4, 0.0],
  [0.8, 1.0, 0.3, -0.2],
  [0.4, 0.3, 1.0, 0.1],
  [0.0, -0.2, 0.1, 1.0],
];

/** Scores as shuffled in the source. */
const SHUFFLED = [
  [-1.92062, 1.22896, -1.0086, -0.49584],
  [-1.50709, -1.50709, -1.50709, 0.82015],
  [-1.22896, 1.92062, 0.82015, -0.65151],
  [-1.0086, -0.20723, 1.0086, -1.0086],
  [-0.82015, 0.82015, 0.34878, 1.92062],
  [-0.65151, -1.22896, -0.65151, 0.20723],
  [-0.49584, -0.65151, 1.22896, -0.34878],
  [-0.34878, -0.49584, -0.49584, -0.06874],
  [-0.20723, -1.0086, 0.20723, 0.65151],
  [-0.06874, 0.49584, 0.06874, -1.22896],
  [0.06874, -0.34878, -1.22896, 0.49584],
  [0.20723, 0.34878, 0.65151, 0.34878],
  [0.34878, -0.06874, -0.20723, 1.22896],
  [0.49584, -1.92062, -0.82015, -0.20723],
  [0.65151, 0.20723, 1.92062, -1.92062],
  [0.82015, 1.0086, 1.50709, 1.50709],
  [1.0086, -0.82015, -1.92062, 1.0086],
  [1.22896, 1.50709, 0.49584, -1.50709],
  [1.50709, 0.06874, -0.06874, 0.06874],
  [1.92062, 0.65151, -0.34878, -0.82015],
];

/** Printed factor of the wanted correlation, upper-triangular. */
const FACTOR_UPPER = [
  [1.0, 0.8, 0.4, 0.0],
  [0.0, 0.6, -0.0333, -0.3333],
  [0.0, 0.0, 0.9159, 0.097],
  [0.0, 0.0, 0.0, 0.9378],
];

/** Printed scores with the wanted correlation. */
const PAIRED = [
  [-1.92062, -0.74213, -2.28105, -1.33232],
  [-1.50709, -2.06697, -1.30678, 0.54577],
  [-1.22896, 0.20646, -0.51141, -0.94465],
  [-1.0086, -0.9019, 0.80546, -0.65873],
  [-0.82015, -0.13949, -0.31782, 1.7696],
  [-0.65151, -1.24043, -0.27999, 0.23988],
  [-0.49584, -0.77356, 1.42145, 0.23611],
  [-0.34878, -0.5667, -0.38117, -0.14744],
  [-0.20723, -0.7656, 0.64214, 0.97494],
  [-0.06875, 0.24487, -0.19673, -1.33695],
  [0.06875, -0.15653, -1.06954, 0.14015],
  [0.20723, 0.36925, 0.56694, 0.51206],
  [0.34878, 0.22754, -0.06362, 1.19551],
  [0.49584, -0.77154, 0.26828, 0.03168],
  [0.65151, 0.62666, 2.08987, -1.21744],
  [0.82015, 1.23804, 1.32493, 1.8568],
  [1.0086, 0.28474, -1.23688, 0.59246],
  [1.22896, 1.8526, 0.17411, -1.62428],
  [1.50709, 1.20294, 0.39517, 0.13931],
  [1.92062, 1.87175, -0.04335, -0.97245],
];

/** Printed result. */
const REARRANGED = [
  [123567, 50686, 15934, 16706],
  [126109, 44770, 16839, 25000],
  [138713, 57685, 17620, 19569],
  [139016, 47453, 35248, 20166],
  [152213, 57346, 20804, 30757],
  [153224, 45191, 21110, 24019],
  [153407, 47941, 38483, 23375],
  [155716, 52931, 17859, 20796],
  [155780, 49420, 33117, 27079],
  [161678, 58380, 22728, 15406],
  [161805, 54010, 17265, 23236],
  [167447, 66972, 32634, 24785],
  [170737, 57698, 24072, 30136],
  [171592, 49345, 30357, 20968],
  [178881, 68053, 39483, 16891],
  [181678, 72243, 36656, 35108],
  [184381, 60948, 17233, 26754],
  [206940, 86685, 25393, 13273],
  [217092, 70592, 30779, 21178],
  [240935, 87138, 25198, 18821],
];

const PEARSON = [
  [1.0, 0.8497, 0.2641, -0.1136],
  [0.8497, 1.0, 0.1885, -0.1998],
  [0.2641, 0.1885, 1.0, 0.0957],
  [-0.1136, -0.1998, 0.0957, 1.0],
];

const SPEARMAN = [
  [1.0, 0.7865, 0.388, -0.0346],
  [0.7865, 1.0, 0.2271, -0.1789],
  [0.388, 0.2271, 1.0, 0.0391],
  [-0.0346, -0.1789, 0.0391, 1.0],
];

const columnsOf = (rows: readonly (readonly number[])[]): Float64Array[] =>
  rows[0].map((_, j) => Float64Array.from(rows, (row) => row[j]));

const NAMES = ['first', 'second', 'third', 'fourth'];
const values = columnsOf(X);
const shuffled = columnsOf(SHUFFLED);
const factor = lowerFactor(WANTED);
const result = imposeRankCorrelation(
  values.map((column, j) => rearranged(column, shuffled[j])),
  factor,
);

describe('Iman & Conover 1982, worked example of Mildenhall 2005', () => {
  it('the normal scores of twenty values, brought to mean square one, are those printed', () => {
    const printed = Array.from(shuffled[0]).sort((a, b) => a - b);
    // A unit in the last printed digit: the source prints one score as −0.06874 here and as −0.06875 further on.
    normalScores(20).forEach((score, i) => expect(Math.abs(score - printed[i])).toBeLessThanOrEqual(1e-5));
  });

  it('the factor of the wanted correlation is the one printed', () => {
    factor.forEach((row, i) =>
      row.forEach((entry, j) => expect(Math.abs(entry - FACTOR_UPPER[j][i])).toBeLessThanOrEqual(1e-4)),
    );
  });

  NAMES.forEach((name, j) => {
    it(`the ${name} column of scores with the wanted correlation is the one printed`, () => {
      const printed = columnsOf(PAIRED)[j];
      pairedScores(shuffled, factor)[j].forEach((score, i) =>
        expect(Math.abs(score - printed[i])).toBeLessThanOrEqual(1e-4),
      );
    });

    it(`the ${name} column of values comes out in the printed order`, () => {
      expect(Array.from(result[j])).toEqual(Array.from(columnsOf(REARRANGED)[j]));
    });
  });

  it('the values have the printed linear correlations', () => {
    forEachPair((i, j) =>
      expect(
        Math.abs(sampleCorrelation(Array.from(result[i]), Array.from(result[j])) - PEARSON[i][j]),
      ).toBeLessThanOrEqual(0.5e-4),
    );
  });

  it('the values have the Spearman correlations recomputed from the printed result', () => {
    forEachPair((i, j) =>
      expect(
        Math.abs(sampleRankCorrelation(Array.from(result[i]), Array.from(result[j])) - SPEARMAN[i][j]),
      ).toBeLessThanOrEqual(0.5e-4),
    );
  });
});

function forEachPair(check: (i: number, j: number) => void): void {
  for (let i = 0; i < 4; i++) for (let j = 0; j < i; j++) check(i, j);
}
