import { meanProduct } from './normalScores.ts';

/**
 * R* = R Q'⁻¹ P' of `imposeRankCorrelation`, column by column (the forward substitution with Q is that of
 * Gram and Schmidt): its sample correlation is P P' but for rounding.
 *
 * Where the columns before it leave less than a quarter of a column's variance, which needs about three
 * quarters as many correlated inputs as realisations, the chance correlation cannot be taken out without
 * making the column a copy of the others' noise: it then goes in as drawn.
 *
 * @param scores columns of mean 0 and mean square 1
 * @param factor rows of P
 */
export function pairedScores(
  scores: readonly Float64Array[],
  factor: readonly ArrayLike<number>[],
): Float64Array[] {
  if (!(factor.length === scores.length)) {
    throw new RangeError(`pairedScores: factor must have ${scores.length} rows, got ${factor.length}`);
  }
  const independent: Float64Array[] = [];
  const basis: Float64Array[] = [];
  return scores.map((column, j) => {
    if (!(column.length === scores[0].length)) {
      throw new RangeError(
        `pairedScores: columns must be of length ${scores[0].length}, got ${column.length}`,
      );
    }
    const rest = withoutPartsAlong(column, basis);
    const left = meanProduct(rest, rest);
    const enough = left >= LEAST_VARIANCE_LEFT;
    const own = enough ? scaled(rest, 1 / Math.sqrt(left)) : column;
    if (enough) basis.push(own);
    independent.push(own);
    return combined(independent, factor[j]);
  });
}

/** Share of a column's variance below which its chance correlation stays. */
const LEAST_VARIANCE_LEFT = 0.25;

function withoutPartsAlong(column: Float64Array, basis: readonly Float64Array[]): Float64Array {
  const rest = Float64Array.from(column);
  for (const direction of basis) {
    const part = meanProduct(rest, direction);
    for (let i = 0; i < rest.length; i++) rest[i] -= part * direction[i];
  }
  return rest;
}

function combined(columns: readonly Float64Array[], weights: ArrayLike<number>): Float64Array {
  const sum = new Float64Array(columns[0].length);
  columns.forEach((column, k) => {
    const weight = weights[k];
    if (weight === 0) return;
    for (let i = 0; i < sum.length; i++) sum[i] += weight * column[i];
  });
  return sum;
}

function scaled(column: Float64Array, by: number): Float64Array {
  return column.map((value) => value * by);
}
