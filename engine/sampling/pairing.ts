import type { Model } from '../project/model.ts';
import { sin } from '../elementary.ts';
import { lowerFactor } from './lowerFactor.ts';

/** The correlated inputs in the order in which they are paired, and how they hang together. */
export interface Pairing {
  /** Places in `Model.inputs`, in the order of first appearance in `Model.correlations`. */
  readonly inputs: readonly number[];
  /** Rows of the lower-triangular Cholesky factor of the correlation matrix of their normal scores. */
  readonly factor: readonly Float64Array[];
}

/**
 * Pairing of a model's correlated inputs: normal scores of a rank correlation ρ have the linear correlation
 * 2 sin(πρ/6); pairs that are not named are uncorrelated. An input that appears last comes last, and leaves
 * the rows of the others as they were.
 *
 * @throws RangeError when the matrix is not positive definite, which the checker has refused
 * Source: Pearson (1907) for 2 sin(πρ/6).
 */
export function pairingOf(model: Pick<Model, 'correlations'>): Pairing {
  const inputs = [...new Set(model.correlations.flatMap(({ first, second }) => [first, second]))];
  const matrix = inputs.map((_, i) => Float64Array.from(inputs, (_, j) => (i === j ? 1 : 0)));
  for (const { first, second, rank } of model.correlations) {
    const [i, j] = [inputs.indexOf(first), inputs.indexOf(second)];
    matrix[i][j] = matrix[j][i] = 2 * sin((Math.PI * rank) / 6);
  }
  return { inputs, factor: lowerFactor(matrix) };
}
