import { normalQuantile } from '../marginals/standardNormal.ts';

/**
 * Normal scores Φ⁻¹(i/(n + 1)), i = 1 … n (van der Waerden), divided by their root mean square.
 *
 * @param count n, at least 1
 * @returns rising scores of mean 0 and mean square 1 (a single score is 0)
 */
export function normalScores(count: number): Float64Array {
  const scores = new Float64Array(count);
  for (let i = 0; i < count; i++) scores[i] = normalQuantile((i + 1) / (count + 1));
  const size = Math.sqrt(meanProduct(scores, scores));
  return size > 0 ? scores.map((score) => score / size) : scores;
}

/** Mean of the products of two columns: their correlation, when both are scores. */
export function meanProduct(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i] * b[i];
  return sum / a.length;
}
