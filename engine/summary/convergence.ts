import { bandOfShare, halfWidth, LEAST_REPLICATES } from './confidenceBand.ts';
import type { LimitSummary, QuantitySummary } from './summary.ts';

/** Entries of a record of convergence at most. */
const MOST_ENTRIES = 60;

/** Numbers of replicates after which the band is recorded: from the tenth on, thinned evenly, the last among them. */
function recordedAfter(replicates: number): number[] {
  const stride = Math.max(1, Math.ceil((replicates - LEAST_REPLICATES) / (MOST_ENTRIES - 1)));
  const recorded: number[] = [];
  for (let i = LEAST_REPLICATES; i < replicates; i += stride) recorded.push(i);
  return replicates >= LEAST_REPLICATES ? [...recorded, replicates] : [];
}

/**
 * Mean of the medians of the replicates so far, weighted by their realisations, and the half-width of its band.
 *
 * @param medians one of each replicate
 * @param counts realisations of each
 */
export function medianConvergence(
  medians: readonly number[],
  counts: readonly number[],
): QuantitySummary['convergence'] {
  return recordedAfter(medians.length).map((replicates) => {
    const soFar = medians.slice(0, replicates);
    const realisations = sumOf(counts.slice(0, replicates));
    const weighted = sumOf(soFar.map((median, i) => median * counts[i]));
    return { realisations, median: weighted / realisations, halfWidth: halfWidth(soFar) };
  });
}

/**
 * Chance of passing a limit by the replicates so far, and how far its band reaches to the longer side: with none
 * passing, the upper limit of the exact interval, not the 0 of replicates that agree.
 *
 * @param above realisations that pass, in each replicate
 * @param counts realisations of each
 */
export function chanceConvergence(
  above: readonly number[],
  counts: readonly number[],
): LimitSummary['convergence'] {
  return recordedAfter(above.length).map((replicates) => {
    const { value, low, high } = bandOfShare(above.slice(0, replicates), counts.slice(0, replicates));
    const realisations = sumOf(counts.slice(0, replicates));
    return { realisations, chance: value, halfWidth: Math.max(value - low, high - value) };
  });
}

function sumOf(values: readonly number[]): number {
  let sum = 0;
  for (const value of values) sum += value;
  return sum;
}
