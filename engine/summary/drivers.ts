import { deviationsOf, equalBins, firstOrderShare, type EqualBins } from './firstOrderShare.ts';
import { factoredInputs, regressionCoefficients, type FactoredInputs } from './rankRegression.ts';
import { correlation, ranks, standardised } from './ranks.ts';
import { risingOrder } from './risingOrder.ts';
import type { Driver } from './summary.ts';

/** An input as drivers see it: its place in `Model.inputs`, its standardised ranks and its bins of equal count. */
export interface RankedInput {
  readonly input: number;
  /** All NaN where the input does not vary. */
  readonly scores: Float64Array;
  readonly bins: EqualBins;
}

export function rankedInput(input: number, values: Float64Array): RankedInput {
  const order = risingOrder(values);
  return { input, scores: standardised(ranks(values, order)), bins: equalBins(order) };
}

/** Inputs with the correlations between them, ready for any number of results. */
export interface RankedInputs {
  readonly inputs: readonly RankedInput[];
  readonly factored: FactoredInputs;
}

export function rankedInputs(inputs: readonly RankedInput[]): RankedInputs {
  return { inputs, factored: factoredInputs(inputs.map(({ scores }) => scores)) };
}

/**
 * What drives a result: for each input Spearman's rank correlation, the standardised coefficient of the
 * regression of ranks on all inputs, and the first-order share of the variance. With correlated inputs the
 * shares need not add to 1. All three are NaN where the input or the result does not vary; an infinite date
 * ranks last and leaves no share of the variance.
 *
 * @param values the result in all realisations
 * @param order their places from the smallest to the largest
 */
export function drivers(
  { inputs, factored }: RankedInputs,
  values: Float64Array,
  order: Int32Array = risingOrder(values),
): Driver[] {
  const deviations = deviationsOf(values);
  const scores = standardised(ranks(values, order));
  const correlations = inputs.map(({ scores: own }) => correlation(own, scores));
  const coefficients = regressionCoefficients(factored, correlations);
  return inputs.map(({ input, bins }, i) => ({
    input,
    rankCorrelation: correlations[i],
    rankRegression: coefficients[i],
    firstOrderShare: Number.isNaN(correlations[i]) ? NaN : firstOrderShare(bins, deviations),
  }));
}
