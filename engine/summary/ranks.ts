import { mean } from './mean.ts';
import { risingOrder } from './risingOrder.ts';

/**
 * Ranks from 1 of the values, ties at the mean of their ranks.
 *
 * @param order places of the values from the smallest to the largest
 */
export function ranks(values: Float64Array, order: Int32Array = risingOrder(values)): Float64Array {
  const ranked = new Float64Array(values.length);
  let start = 0;
  while (start < order.length) {
    let end = start + 1;
    while (end < order.length && values[order[end]] === values[order[start]]) end += 1;
    const mean = 0.5 * (start + 1 + end);
    for (let i = start; i < end; i += 1) ranked[order[i]] = mean;
    start = end;
  }
  return ranked;
}

/** Values less their mean, over their standard deviation; all NaN where they do not vary. */
export function standardised(values: Float64Array): Float64Array {
  const count = values.length;
  const middle = mean(values);
  let squares = 0;
  for (let i = 0; i < count; i += 1) squares += (values[i] - middle) * (values[i] - middle);
  const scale = squares > 0 ? 1 / Math.sqrt(squares / count) : NaN;
  return values.map((value) => (value - middle) * scale);
}

/** Mean product of two standardised columns: their linear correlation. */
export function correlation(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i += 1) sum += a[i] * b[i];
  return sum / a.length;
}
