/** A stream of random numbers. */
export interface RandomStream {
  /** The next number, uniform in (0, 1), never 0 or 1. */
  readonly next: () => number;
}

/**
 * An independent stream for each (seed, purpose…, index): the same arguments give the same numbers on every
 * machine. xoshiro128** (Blackman & Vigna 2018), its 128 bits of state a hash of all arguments, so that streams
 * of neighbouring seeds or indices have nothing in common.
 *
 * @param seed whole number from 0 to 2^53 − 1
 * @param path what the stream is for
 */
export function randomStream(seed: number, ...path: readonly (string | number)[]): RandomStream {
  if (!(Number.isSafeInteger(seed) && seed >= 0)) {
    throw new RangeError(`randomStream: seed must be a whole number of at least 0, got ${seed}`);
  }
  return xoshiro128(hashOf([seed, ...path].map((part) => `${typeof part}:${part}`).join('\u0000')));
}

/** xoshiro128** from a state of four 32-bit words that are not all 0. */
export function xoshiro128(
  state: readonly [number, number, number, number],
): RandomStream & { word: () => number } {
  let [a, b, c, d] = state;
  const word = () => {
    const scrambled = Math.imul(rotated(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = rotated(d, 11);
    return scrambled;
  };
  return {
    word,
    // 52 bits and a half: (0.5 … 2^52 − 0.5) / 2^52 is never 0 or 1
    next: () => ((word() >>> 6) * 67108864 + (word() >>> 6) + 0.5) / 4503599627370496,
  };
}

function rotated(word: number, bits: number): number {
  return (word << bits) | (word >>> (32 - bits));
}

/**
 * 128-bit hash of a text: four lanes of multiply and rotate over its UTF-16 units, then the finalizer of
 * MurmurHash3 (Appleby, public domain) on each lane with the others mixed in.
 */
export function hashOf(text: string): [number, number, number, number] {
  const lanes: [number, number, number, number] = [0x9e3779b9, 0x243f6a88, 0xb7e15162, 0x85a308d3];
  for (let i = 0; i < text.length; i += 1) {
    const unit = text.charCodeAt(i);
    for (let lane = 0; lane < 4; lane += 1) {
      lanes[lane] = Math.imul(
        rotated(lanes[lane] ^ (unit + lane * 0x10001), 13) + lanes[(lane + 1) & 3],
        MULTIPLIERS[lane],
      );
    }
  }
  for (let round = 0; round < 2; round += 1) {
    for (let lane = 0; lane < 4; lane += 1) {
      lanes[lane] = finalised(lanes[lane] ^ lanes[(lane + 3) & 3] ^ text.length);
    }
  }
  return lanes.some((lane) => lane !== 0) ? lanes : [1, 2, 3, 4];
}

const MULTIPLIERS = [0x85ebca6b, 0xc2b2ae35, 0x27d4eb2f, 0x165667b1];

function finalised(word: number): number {
  let mixed = word;
  mixed = Math.imul(mixed ^ (mixed >>> 16), 0x85ebca6b);
  mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35);
  return mixed ^ (mixed >>> 16);
}
