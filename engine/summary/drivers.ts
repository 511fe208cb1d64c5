import { correlation, ranks, standardised } from './ranks.ts';
import type { Driver } from './summary.ts';

/** An input as drivers see it: its place in `Model.inputs` and its standardised ranks, with the order of its values. */
export interface RankedInput {
  readonly input: number;
  readonly scores: Float64Array;
  readonly order: Int32Array;
}

/** Share of an input's variance that the others must leave for it to have a coefficient of its own. */
const LEAST_OWN_VARIANCE = 1e-6;
/** Realisations in a bin of the first-order share, at least, and bins at most. */
const LEAST_IN_BIN = 20;
const MOST_BINS = 32;

export function rankedInput(input: number, values: Float64Array): RankedInput {
  const ranked = ranks(values);
  const order = Int32Array.from(values, (_, i) => i).sort((a, b) => ranked[a] - ranked[b] || a - b);
  return { input, scores: standardised(ranked), order };
}

/**
 * What drives a result: for each input Spearman's rank correlation, the standardised coefficient of the
 * regression of ranks on all inputs, and the first-order share of the variance. With correlated inputs the
 * shares need not add to 1. NaN where an input or the result does not vary.
 *
 * @param values the result in all realisations
 */
export function drivers(inputs: readonly RankedInput[], values: Float64Array): Driver[] {
  const scores = standardised(ranks(values));
  const correlations = inputs.map(({ scores: own }) => correlation(own, scores));
  const regression = rankRegression(inputs, correlations);
  return inputs.map(({ input, order }, i) => ({
    input,
    rankCorrelation: correlations[i],
    rankRegression: regression[i],
    firstOrderShare: firstOrderShare(order, values),
  }));
}

/** Coefficients of the regression: the normal equations by Cholesky; NaN for an input that copies earlier ones. */
function rankRegression(inputs: readonly RankedInput[], correlations: readonly number[]): number[] {
  const kept: number[] = [];
  const factor: number[][] = [];
  inputs.forEach(({ scores }, i) => {
    if (Number.isNaN(correlations[i])) return;
    const row: number[] = [];
    kept.forEach((other, j) => {
      let rest = correlation(scores, inputs[other].scores);
      for (let k = 0; k < j; k += 1) rest -= row[k] * factor[j][k];
      row.push(rest / factor[j][j]);
    });
    const own = 1 - row.reduce((sum, value) => sum + value * value, 0);
    if (own < LEAST_OWN_VARIANCE) return;
    factor.push([...row, Math.sqrt(own)]);
    kept.push(i);
  });
  const forward: number[] = [];
  kept.forEach((i, j) => {
    let rest = correlations[i];
    for (let k = 0; k < j; k += 1) rest -= factor[j][k] * forward[k];
    forward.push(rest / factor[j][j]);
  });
  const solved = new Array<number>(kept.length).fill(0);
  for (let j = kept.length - 1; j >= 0; j -= 1) {
    let rest = forward[j];
    for (let k = j + 1; k < kept.length; k += 1) rest -= factor[k][j] * solved[k];
    solved[j] = rest / factor[j][j];
  }
  const coefficients = inputs.map(() => NaN);
  kept.forEach((i, j) => {
    coefficients[i] = solved[j];
  });
  return coefficients;
}

/**
 * First-order share of the variance, Var(E[y | x])/Var(y), from bins of equal count over x: with B bins of N
 * values, 1 − (N − 1)/(N − B) · (squares within bins)/(squares in all), which has no bias where x does nothing.
 *
 * Source: given-data estimator of Plischke, Borgonovo & Smith (2013); the correction is that of the adjusted
 * correlation ratio.
 *
 * @param order realisations in the order of the input's values
 * @returns may be slightly negative; NaN where the result does not vary or is not finite
 */
export function firstOrderShare(order: Int32Array, values: Float64Array): number {
  const count = values.length;
  const bins = Math.min(MOST_BINS, Math.floor(count / LEAST_IN_BIN));
  if (bins < 2) return NaN;
  let mean = 0;
  for (let i = 0; i < count; i += 1) mean += values[i] / count;
  // a result that varies by no more than rounding does not vary
  const rounding = 1e-24 * mean * mean * count;
  let total = 0;
  let between = 0;
  for (let bin = 0; bin < bins; bin += 1) {
    const from = Math.floor((bin * count) / bins);
    const to = Math.floor(((bin + 1) * count) / bins);
    let sum = 0;
    for (let i = from; i < to; i += 1) {
      const apart = values[order[i]] - mean;
      sum += apart;
      total += apart * apart;
    }
    between += (sum * sum) / (to - from);
  }
  return total > rounding ? 1 - (((count - 1) / (count - bins)) * (total - between)) / total : NaN;
}
