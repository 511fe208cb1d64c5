import { halfWidth, LEAST_REPLICATES } from './confidenceBand.ts';

/** Entries of a record of convergence at most. */
const MOST_ENTRIES = 60;

export interface ConvergenceEntry {
  readonly realisations: number;
  readonly value: number;
  readonly halfWidth: number;
}

/**
 * Mean over the replicates so far and the half-width of its band, after each from the tenth on, thinned evenly.
 *
 * @param ofReplicates a value of each replicate, such as a share or a median
 * @param counts realisations of each
 */
export function convergence(ofReplicates: ArrayLike<number>, counts: ArrayLike<number>): ConvergenceEntry[] {
  const entries: ConvergenceEntry[] = [];
  const steps = ofReplicates.length - LEAST_REPLICATES + 1;
  const stride = Math.max(1, Math.ceil(steps / MOST_ENTRIES));
  const so: number[] = [];
  let realisations = 0;
  let weighted = 0;
  for (let i = 0; i < ofReplicates.length; i += 1) {
    so.push(ofReplicates[i]);
    realisations += counts[i];
    weighted += counts[i] * ofReplicates[i];
    const isLast = i === ofReplicates.length - 1;
    if (so.length < LEAST_REPLICATES || (!isLast && (so.length - LEAST_REPLICATES) % stride !== 0)) continue;
    entries.push({ realisations, value: weighted / realisations, halfWidth: halfWidth(so) });
  }
  return entries;
}
