import { normalScores } from './normalScores.ts';
import { pairedScores } from './pairedScores.ts';

/**
 * Rearranges the columns so that the correlation of their normal scores is the wanted one, by the
 * restricted pairing of Iman & Conover: each column keeps its own values, only their order changes.
 *
 *     R* = R Q'⁻¹ P',   R'R/n = Q Q',   P P' = wanted correlation of the scores
 *
 * R holds the normal scores Φ⁻¹(rank/(n + 1)) of the columns as drawn, so the first column stays as it is;
 * Q and P are lower-triangular, so a column depends on those before it alone, and a column added at the
 * end leaves all others as they were.
 *
 * @param columns columns of one replicate, all of the same length, drawn independently
 * @param factor rows of the lower-triangular Cholesky factor P, one for each column
 * @returns new columns in the same order
 * @throws RangeError when there are not as many rows as columns, or a column differs in length
 * Source: Iman & Conover (1982), Communications in Statistics B11(3):311–334.
 */
export function imposeRankCorrelation(
  columns: readonly Float64Array[],
  factor: readonly ArrayLike<number>[],
): Float64Array[] {
  if (columns.length === 0) return [];
  const scoreOfRank = normalScores(columns[0].length);
  const scores = columns.map((column) => Float64Array.from(ranks(column), (rank) => scoreOfRank[rank]));
  return pairedScores(scores, factor).map((paired, j) => rearranged(columns[j], paired));
}

/** The column's values in the order of the scores: the smallest where the smallest score is. */
export function rearranged(column: Float64Array, scores: Float64Array): Float64Array {
  const rising = Float64Array.from(column).sort();
  return Float64Array.from(ranks(scores), (rank) => rising[rank]);
}

/** Ranks from 0; equal values rank in their order. */
function ranks(column: Float64Array): Uint32Array {
  const rising = Float64Array.from(column).sort();
  const taken = new Uint8Array(column.length);
  const rank = new Uint32Array(column.length);
  for (let i = 0; i < column.length; i++) {
    let place = firstNotBelow(rising, column[i]);
    while (taken[place] === 1) place += 1;
    taken[place] = 1;
    rank[i] = place;
  }
  return rank;
}

/** First place in rising values that does not lie below one of them. */
function firstNotBelow(rising: Float64Array, value: number): number {
  let from = 0;
  let to = rising.length;
  while (from < to) {
    const middle = (from + to) >> 1;
    if (rising[middle] < value) from = middle + 1;
    else to = middle;
  }
  return from;
}
