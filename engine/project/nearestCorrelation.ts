import { atan } from '../elementary.ts';
import { correlationOfScores, isPositiveDefinite } from './correlationMatrix.ts';
import type { RankCorrelation } from './model.ts';
import { symmetricEigen } from './symmetricEigen.ts';

const MOST_INPUTS = 40;
const MOST_ROUNDS = 200;
/** Smallest eigenvalue of what is offered before it is rounded. */
const SMALLEST_EIGENVALUE = 1e-6;
const CLOSE_ENOUGH = 1e-10;

/**
 * Correlation matrix nearest to a symmetric one in the Frobenius norm: alternating projections onto the
 * matrices without small eigenvalues and onto those of unit diagonal, with Dykstra's correction (Higham
 * 2002, algorithm 3.3).
 *
 * @param matrix symmetric, its diagonal 1
 * @param least smallest eigenvalue aimed at, 0 for the nearest of all
 */
export function nearestCorrelationMatrix(
  matrix: readonly ArrayLike<number>[],
  least: number,
): Float64Array[] {
  let current = matrix.map((row) => Float64Array.from(row));
  let correction = matrix.map((row) => new Float64Array(row.length));
  for (let round = 0; round < MOST_ROUNDS; round += 1) {
    const corrected = current.map((row, i) => row.map((value, j) => value - correction[i][j]));
    const lifted = withoutSmallEigenvalues(corrected, least);
    correction = lifted.map((row, i) => row.map((value, j) => value - corrected[i][j]));
    const next = lifted.map((row, i) => row.map((value, j) => (i === j ? 1 : value)));
    const change = Math.max(
      ...next.map((row, i) => Math.max(...row.map((value, j) => Math.abs(value - current[i][j])))),
    );
    current = next;
    if (change < CLOSE_ENOUGH) break;
  }
  return current;
}

function withoutSmallEigenvalues(matrix: readonly Float64Array[], least: number): Float64Array[] {
  const { values, vectors } = symmetricEigen(matrix);
  return matrix.map((row, i) =>
    row.map((_, j) => {
      let sum = 0;
      for (let k = 0; k < values.length; k += 1)
        sum += Math.max(values[k], least) * vectors[i][k] * vectors[j][k];
      return sum;
    }),
  );
}

/**
 * Rank correlations to two decimals near to those of a list, whose scores have a positive definite matrix:
 * the nearest matrix, drawn towards no correlation in steps of a hundredth until the rounded one passes.
 *
 * @returns every pair that is not 0 to two decimals; null where there are more than 40 inputs
 */
export function nearestRankCorrelations(correlations: readonly RankCorrelation[]): RankCorrelation[] | null {
  const { inputs, matrix } = correlationOfScores(correlations);
  if (inputs.length > MOST_INPUTS) return null;
  const nearest = nearestCorrelationMatrix(matrix, SMALLEST_EIGENVALUE);
  for (let hundredths = 100; hundredths > 0; hundredths -= 1) {
    const offered = roundedRanks(inputs, nearest, hundredths / 100);
    if (isPositiveDefinite(correlationOfScores(offered).matrix)) return offered;
  }
  return null;
}

function roundedRanks(
  inputs: readonly number[],
  matrix: readonly Float64Array[],
  share: number,
): RankCorrelation[] {
  return inputs.flatMap((first, i) =>
    inputs.slice(i + 1).flatMap((second, ahead) => {
      const rank = Math.round(100 * share * rankCorrelation(matrix[i][i + 1 + ahead])) / 100;
      return rank === 0 ? [] : [{ first, second, rank }];
    }),
  );
}

/** ρ = (6/π) asin(r/2), the inverse of 2 sin(πρ/6). */
function rankCorrelation(score: number): number {
  const half = 0.5 * score;
  return (6 / Math.PI) * atan(half / Math.sqrt(1 - half * half));
}
