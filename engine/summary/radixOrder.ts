const DIGIT_BITS = 11;
const BUCKETS = 2048;
const DIGIT = BUCKETS - 1;
/** Digits of half a key of 64 bits. */
const DIGITS = 3;
const SIGN = 0x80000000;
/** Place of the half of a number that holds the end of its digits: 0 where the smaller byte comes first. */
const LOW_HALF = new Uint8Array(Uint32Array.of(1).buffer)[0] === 1 ? 0 : 1;

/**
 * Places of the values from the smallest to the largest, equal ones (−0 and 0 too) in the order in which they
 * stand, NaN last, whatever the values are: a radix sort of the bits of the numbers, whose order as whole
 * numbers is that of the values once those of negative ones are turned over.
 *
 * Source: Knuth (1998), The Art of Computer Programming 3, section 5.2.5, algorithm R; the turning over of the
 * bits is common practice.
 */
export function radixOrder(values: Float64Array): Int32Array {
  const count = values.length;
  const low = new Uint32Array(count);
  const high = new Uint32Array(count);
  fillKeys(values, low, high);
  let order = new Int32Array(count);
  for (let i = 0; i < count; i += 1) order[i] = i;
  let spare = new Int32Array(count);
  const starts = new Int32Array(BUCKETS);
  for (const half of [low, high]) {
    for (let digit = 0; digit < DIGITS; digit += 1) {
      if (!sortByDigit(half, digit * DIGIT_BITS, order, spare, starts)) continue;
      [order, spare] = [spare, order];
    }
  }
  return order;
}

/** Deals the places in `from` out to `to` by one digit of their keys; not so where all share it, which sorts nothing. */
function sortByDigit(
  keys: Uint32Array,
  shift: number,
  from: Int32Array,
  to: Int32Array,
  starts: Int32Array,
): boolean {
  const count = keys.length;
  starts.fill(0);
  for (let i = 0; i < count; i += 1) starts[(keys[i] >>> shift) & DIGIT] += 1;
  if (count === 0 || starts[(keys[0] >>> shift) & DIGIT] === count) return false;
  let start = 0;
  for (let bucket = 0; bucket < BUCKETS; bucket += 1) {
    const own = starts[bucket];
    starts[bucket] = start;
    start += own;
  }
  for (let i = 0; i < count; i += 1) {
    const place = from[i];
    const bucket = (keys[place] >>> shift) & DIGIT;
    to[starts[bucket]] = place;
    starts[bucket] += 1;
  }
  return true;
}

/** Halves of the bits of the values, turned so that they rise with them. */
function fillKeys(values: Float64Array, low: Uint32Array, high: Uint32Array): void {
  const plain = new Float64Array(values.length);
  // −0 + 0 is 0
  for (let i = 0; i < values.length; i += 1) plain[i] = values[i] + 0;
  const bits = new Uint32Array(plain.buffer);
  for (let i = 0; i < values.length; i += 1) {
    const upper = bits[2 * i + 1 - LOW_HALF];
    const turned = (upper & SIGN) !== 0 ? -1 : 0;
    const isNumber = !Number.isNaN(values[i]);
    low[i] = isNumber ? bits[2 * i + LOW_HALF] ^ turned : -1;
    high[i] = isNumber ? upper ^ (turned | SIGN) : -1;
  }
}
