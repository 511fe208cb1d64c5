import { radixOrder } from './radixOrder.ts';

/** Mean number of others in a value's own interval up to which sorting within intervals is quick. */
const CROWDED = 8;

/**
 * Places of the values from the smallest to the largest, equal ones (−0 and 0 too) in the order in which they
 * stand, NaN last. Values that spread over their range are dealt into as many equal intervals as there are
 * values and put in order within each; crowded or infinite ones go to `radixOrder`. Both take a time
 * proportional to their number, the first a quarter of the second's.
 *
 * Source: Knuth (1998), The Art of Computer Programming 3, section 5.2.1 (multiple list insertion).
 */
export function risingOrder(values: Float64Array): Int32Array {
  return orderByIntervals(values) ?? radixOrder(values);
}

function orderByIntervals(values: Float64Array): Int32Array | null {
  const count = values.length;
  let [least, most] = [Infinity, -Infinity];
  for (let i = 0; i < count; i += 1) {
    const value = values[i];
    // so that NaN, too, ends here
    if (!(Math.abs(value) < Infinity)) return null;
    if (value < least) least = value;
    if (value > most) most = value;
  }
  const scale = (count - 1) / (most - least);
  if (!(scale > 0 && scale < Infinity)) return null;
  // rounding keeps the order of the values, so that of their intervals does not go against it
  const intervalOf = new Int32Array(count);
  const starts = new Int32Array(count + 1);
  for (let i = 0; i < count; i += 1) {
    const interval = Math.min(count - 1, (values[i] - least) * scale) | 0;
    intervalOf[i] = interval;
    starts[interval + 1] += 1;
  }
  let company = 0;
  for (let interval = 1; interval <= count; interval += 1) {
    company += starts[interval] * starts[interval];
    starts[interval] += starts[interval - 1];
  }
  if (company > CROWDED * count) return null;
  const order = new Int32Array(count);
  for (let i = 0; i < count; i += 1) order[starts[intervalOf[i]]++] = i;
  insertInOrder(values, order);
  return order;
}

/** Puts places right that are nearly in order, equal values as they stand. */
function insertInOrder(values: Float64Array, order: Int32Array): void {
  for (let i = 1; i < order.length; i += 1) {
    const place = order[i];
    const value = values[place];
    let j = i - 1;
    while (j >= 0 && values[order[j]] > value) {
      order[j + 1] = order[j];
      j -= 1;
    }
    order[j + 1] = place;
  }
}
