import type { UncertainNumber } from '../project/uncertainNumber.ts';
import { median } from '../marginals/marginal.ts';

/**
 * One replicate of drawn inputs: for each of `Model.inputs` a column of values, all realisations of the
 * replicate; an input that varies from place to place has one column for each point.
 */
export interface DrawnGround {
  /** Number of the replicate, from 0; −1 for the central realisation. */
  readonly replicate: number;
  /** Realisations in it. */
  readonly count: number;
  readonly points: number;
  /** In the order of `Model.inputs`. */
  readonly inputs: readonly DrawnInput[];
  /** Values that were cut at the marginal's limits after the ratio that keeps the mean. */
  readonly cutAtLimits: number;
}

export interface DrawnInput {
  readonly varies: boolean;
  /** `count` values, or, when it varies, `points` × `count` of them: value of point p in realisation r at p·count + r. */
  readonly values: Float64Array;
}

/** Value of a number of the model in one realisation at one point, in the unit of its marginal. */
export function drawnValue(
  ground: DrawnGround,
  number: UncertainNumber,
  point: number,
  realisation: number,
): number {
  if (number.index < 0) return median(number.marginal);
  const input = ground.inputs[number.index];
  return input.values[input.varies ? point * ground.count + realisation : realisation];
}
