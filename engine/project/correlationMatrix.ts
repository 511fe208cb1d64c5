import { sin } from '../elementary.ts';
import type { RankCorrelation } from './model.ts';

/** Smallest pivot of a matrix that is taken as positive definite, so that rounding cannot decide. */
const SMALLEST_PIVOT = 1e-9;

/** Linear correlation of normal scores whose rank correlation is ρ: 2 sin(πρ/6) (Pearson 1907). */
export function scoreCorrelation(rank: number): number {
  return 2 * sin((Math.PI * rank) / 6);
}

/** Correlation matrix of the scores of the inputs that a list of rank correlations names. */
export interface CorrelationOfScores {
  /** Places in `Model.inputs`, in the order of first appearance in the list. */
  readonly inputs: readonly number[];
  /** Rows; pairs that are not named are 0. */
  readonly matrix: readonly Float64Array[];
}

export function correlationOfScores(correlations: readonly RankCorrelation[]): CorrelationOfScores {
  const places = new Map<number, number>();
  for (const { first, second } of correlations) {
    for (const input of [first, second]) if (!places.has(input)) places.set(input, places.size);
  }
  const inputs = [...places.keys()];
  const matrix = inputs.map((_, i) => Float64Array.from(inputs, (_, j) => (i === j ? 1 : 0)));
  for (const { first, second, rank } of correlations) {
    const [i, j] = [places.get(first)!, places.get(second)!];
    matrix[i][j] = matrix[j][i] = scoreCorrelation(rank);
  }
  return { inputs, matrix };
}

/** Whether a symmetric matrix has a Cholesky factor with every pivot above 1e-9. */
export function isPositiveDefinite(matrix: readonly ArrayLike<number>[]): boolean {
  const factor: Float64Array[] = [];
  for (let i = 0; i < matrix.length; i += 1) {
    const row = new Float64Array(i + 1);
    for (let j = 0; j <= i; j += 1) {
      let rest = matrix[i][j];
      for (let k = 0; k < j; k += 1) rest -= row[k] * (j === i ? row[k] : factor[j][k]);
      if (j < i) row[j] = rest / factor[j][j];
      else if (rest > SMALLEST_PIVOT) row[i] = Math.sqrt(rest);
      else return false;
    }
    factor.push(row);
  }
  return true;
}

/**
 * Place in the list of the first correlation whose addition to those before it makes the matrix of the
 * scores lose its positive definiteness; −1 where none does.
 */
export function firstBreakingPair(correlations: readonly RankCorrelation[]): number {
  if (isPositiveDefinite(correlationOfScores(correlations).matrix)) return -1;
  for (let count = 1; count <= correlations.length; count += 1) {
    const linked = linkedTo(correlations.slice(0, count), count - 1);
    if (!isPositiveDefinite(correlationOfScores(linked).matrix)) return count - 1;
  }
  return -1;
}

/** Those of a list that hang together with one of it, by shared inputs, in the list's order. */
export function linkedTo(correlations: readonly RankCorrelation[], place: number): RankCorrelation[] {
  const linked = new Set([correlations[place].first, correlations[place].second]);
  for (let before = 0; before < linked.size;) {
    before = linked.size;
    for (const { first, second } of correlations) {
      if (linked.has(first) || linked.has(second)) linked.add(first).add(second);
    }
  }
  return correlations.filter(({ first }) => linked.has(first));
}
