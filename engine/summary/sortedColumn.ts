import { risingOrder } from './risingOrder.ts';

/** A column of all realisations, sorted as a whole and replicate by replicate. */
export interface SortedColumn {
  /** Places of the values from the smallest to the largest. */
  readonly order: Int32Array;
  /** All values, rising. */
  readonly sorted: Float64Array;
  /** Those of each replicate, rising. */
  readonly ofReplicates: readonly Float64Array[];
}

/**
 * Sorts a column once: walking along the sorted whole and dealing each value out to its replicate leaves those
 * sorted too.
 *
 * @param values replicate after replicate
 * @param counts realisations of each replicate
 * @throws where `counts` do not add to the number of values
 */
export function sortedColumn(values: Float64Array, counts: readonly number[]): SortedColumn {
  const replicateOf = new Int32Array(values.length);
  const next = new Int32Array(counts.length);
  let start = 0;
  counts.forEach((count, replicate) => {
    next[replicate] = start;
    replicateOf.fill(replicate, start, start + count);
    start += count;
  });
  if (start !== values.length) {
    throw new RangeError(`sortedColumn: counts must add to ${values.length}, got ${start}`);
  }
  const order = risingOrder(values);
  const sorted = new Float64Array(values.length);
  const dealt = new Float64Array(values.length);
  for (let i = 0; i < order.length; i += 1) {
    const value = values[order[i]];
    sorted[i] = value;
    dealt[next[replicateOf[order[i]]]++] = value;
  }
  // `next` now stands at the end of each replicate
  return { order, sorted, ofReplicates: counts.map((count, r) => dealt.subarray(next[r] - count, next[r])) };
}
