import { median } from '../marginals/marginal.ts';
import type { UncertainNumber } from './uncertainNumber.ts';

/** The value of a number in the central realisation: the median of its marginal as entered, in the number's unit. */
export function centralValue(number: UncertainNumber): number {
  return median(number.marginal);
}
