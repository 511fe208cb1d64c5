import { mean } from './mean.ts';

/** Realisations in a bin, at least, and bins at most. */
const LEAST_IN_BIN = 20;
const MOST_BINS = 32;

/** Bins of equal count over the values of an input. */
export interface EqualBins {
  /** The bin of each realisation. */
  readonly binOf: Uint8Array;
  /** Realisations in each bin; fewer than two bins where there are too few realisations. */
  readonly counts: readonly number[];
}

/** @param order places of the realisations from the smallest value of the input to the largest */
export function equalBins(order: Int32Array): EqualBins {
  const count = order.length;
  const bins = Math.min(MOST_BINS, Math.floor(count / LEAST_IN_BIN));
  const binOf = new Uint8Array(count);
  const counts: number[] = [];
  for (let bin = 0; bin < bins; bin += 1) {
    const from = Math.floor((bin * count) / bins);
    const to = Math.floor(((bin + 1) * count) / bins);
    for (let i = from; i < to; i += 1) binOf[order[i]] = bin;
    counts.push(to - from);
  }
  return { binOf, counts };
}

/** A result less its mean, and the sum of its squares. */
export interface Deviations {
  readonly apart: Float64Array;
  /** NaN where the result does not vary beyond rounding, or is not finite. */
  readonly squares: number;
}

export function deviationsOf(values: Float64Array): Deviations {
  const count = values.length;
  const middle = mean(values);
  const apart = values.map((value) => value - middle);
  let squares = 0;
  for (let i = 0; i < count; i += 1) squares += apart[i] * apart[i];
  // a result that varies by no more than rounding does not vary
  const rounding = 1e-24 * middle * middle * count;
  return { apart, squares: squares > rounding && squares < Infinity ? squares : NaN };
}

/**
 * First-order share of the variance, Var(E[y | x])/Var(y), from bins of equal count over x: with B bins of N
 * values, 1 − (N − 1)/(N − B) · (squares within bins)/(squares in all), which has no bias where x does nothing.
 *
 * Source: given-data estimator of Plischke, Borgonovo & Smith (2013); the correction is that of the adjusted
 * correlation ratio (Kelley 1935, from memory).
 *
 * @returns may be slightly negative; NaN where the result does not vary or is not finite, or with fewer than 40
 *   realisations
 */
export function firstOrderShare({ binOf, counts }: EqualBins, { apart, squares }: Deviations): number {
  const bins = counts.length;
  if (bins < 2) return NaN;
  const sums = new Float64Array(bins);
  for (let i = 0; i < apart.length; i += 1) sums[binOf[i]] += apart[i];
  let between = 0;
  for (let bin = 0; bin < bins; bin += 1) between += (sums[bin] * sums[bin]) / counts[bin];
  const count = apart.length;
  return 1 - (((count - 1) / (count - bins)) * (squares - between)) / squares;
}
