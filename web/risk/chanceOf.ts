import type { LimitSummary } from '../../engine/summary/summary.ts';
import type { Chance } from '../words/chanceText.ts';

/** The chance of passing a limit with what stands behind it, for the words. */
export function chanceOf({ chance, above, of }: LimitSummary): Chance {
  return { value: chance.value, low: chance.low, high: chance.high, above, of };
}
