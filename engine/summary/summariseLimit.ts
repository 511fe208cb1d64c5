import { pow } from '../elementary.ts';
import type { Limit } from '../project/model.ts';
import { bandOfShare } from './confidenceBand.ts';
import { chanceConvergence } from './convergence.ts';
import { countAbove } from './runningChance.ts';
import type { LimitSummary } from './summary.ts';

/**
 * The chance of passing a limit, with all that is said of it.
 *
 * @param quantity place of its quantity in `Summary.quantities`
 * @param ofReplicates values of that quantity in each replicate
 */
export function summariseLimit(
  limit: Limit,
  quantity: number,
  ofReplicates: readonly Float64Array[],
): LimitSummary {
  const counts = ofReplicates.map((values) => values.length);
  const aboveOfReplicates = ofReplicates.map((values) => countAbove(values, limit));
  const above = aboveOfReplicates.reduce((sum, count) => sum + count, 0);
  const of = counts.reduce((sum, count) => sum + count, 0);
  return {
    quantity,
    chance: bandOfShare(aboveOfReplicates, counts),
    above,
    of,
    boundWhenNone: boundWhenNone(above, of),
    convergence: chanceConvergence(aboveOfReplicates, counts),
  };
}

/**
 * One-sided 95 % limit of a chance that none, or all, of N realisations showed: 1 − 0.05^(1/N), close to 3/N,
 * from above where none passes; 0.05^(1/N) from below where all do; NaN elsewhere.
 *
 * Source: Clopper & Pearson (1934); 3/N is the rule of three (Hanley & Lippman-Hand 1983).
 */
export function boundWhenNone(above: number, of: number): number {
  if (above > 0 && above < of) return NaN;
  const allLeast = pow(0.05, 1 / of);
  return above === 0 ? 1 - allLeast : allLeast;
}
