import { ln } from '../elementary.ts';
import { bandOfShare } from './confidenceBand.ts';
import type { ExceedanceCurve } from './summary.ts';

/** Points of a curve at most. */
const MOST_POINTS = 300;
/** Realisations that must lie above a value for the tail to be resolved. */
const RESOLVED = 10;

/**
 * Exceedance curve: share of realisations above each value, with its band. Thinned evenly in the logarithm of
 * the odds, so that both tails keep their points and extremes.
 *
 * @param sorted all values, rising
 * @param sortedReplicates those of each replicate, rising
 */
export function exceedance(sorted: Float64Array, sortedReplicates: readonly Float64Array[]): ExceedanceCurve {
  const values: number[] = [];
  const shares: number[] = [];
  const low: number[] = [];
  const high: number[] = [];
  const counts = sortedReplicates.map((own) => own.length);
  const atMost = counts.map(() => 0);
  const above = counts.map(() => 0);
  for (const index of thinned(sorted.length)) {
    const value = sorted[index];
    if (values.length > 0 && value === values[values.length - 1]) continue;
    for (let r = 0; r < counts.length; r += 1) {
      while (atMost[r] < counts[r] && sortedReplicates[r][atMost[r]] <= value) atMost[r] += 1;
      above[r] = counts[r] - atMost[r];
    }
    const band = bandOfShare(above, counts);
    values.push(value);
    shares.push(band.value);
    low.push(band.low);
    high.push(band.high);
  }
  return { values, shares, low, high, unresolvedAbove: sorted[Math.max(0, sorted.length - RESOLVED)] };
}

let keptCount = 0;
let keptPlaces: readonly number[] = [];
/** The places of the last length asked for are kept: all curves of a study have one. */
function thinned(count: number): readonly number[] {
  if (count !== keptCount) [keptCount, keptPlaces] = [count, evenInOdds(count)];
  return keptPlaces;
}

/** Places in a list of `count` values, first and last among them, even in ln(p/(1 − p)). */
function evenInOdds(count: number): number[] {
  if (count <= MOST_POINTS) return Array.from({ length: count }, (_, i) => i);
  const kept = [0];
  const oddsAt = (index: number) => ln((index + 0.5) / (count - index - 0.5));
  const first = oddsAt(0);
  const stride = (oddsAt(count - 1) - first) / (MOST_POINTS - 1);
  let next = first + stride;
  for (let index = 1; index < count - 1; index += 1) {
    const odds = oddsAt(index);
    if (odds < next) continue;
    kept.push(index);
    while (odds >= next) next += stride;
  }
  kept.push(count - 1);
  return kept;
}
