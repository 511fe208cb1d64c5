import { regularisedIncompleteBeta } from '../marginals/incompleteBeta.ts';
import { CONFIDENCE } from './confidenceBand.ts';

/**
 * Ranks of the order statistics between which a percentile lies at the given confidence, at most half of the
 * rest beyond each. With B the binomial number of N realisations below the percentile, the lower is the largest
 * l with P(B < l) ≤ (1 − c)/2 and the upper the smallest u with P(B ≥ u) ≤ (1 − c)/2; so the exact binomial
 * interval of a share (Clopper & Pearson 1934) read the other way round. P(B ≥ k) = I_p(k, N − k + 1).
 *
 * @param count N, 1 or more
 * @param share p, above 0 and below 1
 * @param confidence c, of both sides
 * @returns from 1 to N; a lower of 0 or an upper of N + 1 where no realisation bounds the percentile
 * @throws where `count` or `share` is outside its range
 *
 * Source: David & Nagaraja (2003), Order Statistics, section 7.1.
 */
export function orderStatisticRanks(
  count: number,
  share: number,
  confidence = CONFIDENCE,
): readonly [lower: number, upper: number] {
  if (!(count >= 1)) throw new RangeError(`orderStatisticRanks: count must be 1 or more, got ${count}`);
  if (!(share > 0 && share < 1)) {
    throw new RangeError(`orderStatisticRanks: share must lie between 0 and 1, got ${share}`);
  }
  const beyond = 0.5 * (1 - confidence);
  const below = (k: number) => regularisedIncompleteBeta(1 - share, count - k + 1, k);
  const atLeast = (k: number) => regularisedIncompleteBeta(share, k, count - k + 1);
  const lower = firstRank(count, (k) => below(k) > beyond) - 1;
  const upper = firstRank(count, (k) => atLeast(k) <= beyond);
  return [lower, upper];
}

/** Smallest rank from 1 to `count` with a condition that stays true once it is; `count` + 1 where none has. */
function firstRank(count: number, holds: (rank: number) => boolean): number {
  let [from, to] = [1, count + 1];
  while (from < to) {
    const middle = Math.floor(0.5 * (from + to));
    if (holds(middle)) to = middle;
    else from = middle + 1;
  }
  return from;
}
