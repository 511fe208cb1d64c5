import { makeTable } from '../../../engine/marginals/cumulativeTable.ts';
import { makeLognormal } from '../../../engine/marginals/lognormal.ts';
import type { Marginal } from '../../../engine/marginals/marginal.ts';
import { makeNormal } from '../../../engine/marginals/normal.ts';
import { makePert } from '../../../engine/marginals/pert.ts';
import { makeTriangular } from '../../../engine/marginals/triangular.ts';
import { makeUniform } from '../../../engine/marginals/uniform.ts';

const valid = (made: Marginal | string): Marginal => {
  if (typeof made === 'string') throw new Error(made);
  return made;
};

export const fixedMarginal = (value: number): Marginal => ({ kind: 'fixed', value });

/** Lognormal by its mean and coefficient of variation. */
export const lognormalMarginal = (mean: number, variation: number): Marginal =>
  valid(makeLognormal({ mean, deviation: mean * variation }));

export const uniformMarginal = (low: number, high: number): Marginal => valid(makeUniform({ low, high }));

export const triangularMarginal = (low: number, mode: number, high: number): Marginal =>
  valid(makeTriangular({ low, mode, high }));

export const pertMarginal = (low: number, mode: number, high: number): Marginal =>
  valid(makePert({ low, mode, high }));

export const tableMarginal = (values: readonly number[], cumulative: readonly number[]): Marginal =>
  valid(makeTable({ values, cumulative }));

export const normalMarginal = (mean: number, deviation: number, low?: number, high?: number): Marginal =>
  valid(makeNormal({ mean, deviation, low, high }));
