import { correlation } from './ranks.ts';

/** Share of an input's variance that the others must leave for it to have a coefficient of its own. */
const LEAST_OWN_VARIANCE = 1e-6;

/** The correlation matrix of some inputs by Cholesky, without those that copy earlier ones or do not vary. */
export interface FactoredInputs {
  /** All inputs, in or out. */
  readonly inputs: number;
  /** Places of the inputs with a coefficient of their own. */
  readonly kept: readonly number[];
  /** Rows of the lower triangle, one for each of `kept`. */
  readonly factor: readonly (readonly number[])[];
}

/**
 * Factors the correlation matrix of standardised columns once for all results that are regressed on them.
 *
 * @param columns standardised; all NaN where an input does not vary
 */
export function factoredInputs(columns: readonly Float64Array[]): FactoredInputs {
  const kept: number[] = [];
  const factor: number[][] = [];
  columns.forEach((column, i) => {
    if (Number.isNaN(column[0])) return;
    const row: number[] = [];
    kept.forEach((other, j) => {
      let rest = correlation(column, columns[other]);
      for (let k = 0; k < j; k += 1) rest -= row[k] * factor[j][k];
      row.push(rest / factor[j][j]);
    });
    const own = 1 - row.reduce((sum, value) => sum + value * value, 0);
    if (!(own >= LEAST_OWN_VARIANCE)) return;
    factor.push([...row, Math.sqrt(own)]);
    kept.push(i);
  });
  return { inputs: columns.length, kept, factor };
}

/**
 * Standardised coefficients of a linear regression, R b = r with R the correlations between the inputs and r
 * those with the result.
 *
 * @param correlations of each input with the result
 * @returns one for each input; NaN for one that copies earlier ones, or does not vary
 */
export function regressionCoefficients(
  { inputs, kept, factor }: FactoredInputs,
  correlations: readonly number[],
): number[] {
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
  const coefficients = new Array<number>(inputs).fill(NaN);
  kept.forEach((i, j) => {
    coefficients[i] = solved[j];
  });
  return coefficients;
}
