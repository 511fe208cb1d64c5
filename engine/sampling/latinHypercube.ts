import type { RandomStream } from '../random/randomStream.ts';
import { shuffledIndices } from '../random/shuffledIndices.ts';

/**
 * Latin hypercube column of one input: `count` probabilities of which exactly one lies in each of the
 * strata [k/count, (k + 1)/count), in random order and at a random place in its stratum.
 *
 *     p_i = (π_i + u_i) / count,   π a random permutation of 0 … count − 1, u uniform in (0, 1)
 *
 * Columns of different inputs come from independent streams, which makes the hypercube.
 *
 * @param stream the input's own stream of this replicate
 * @param count strata, 1 or more
 * @returns `count` probabilities in (0, 1)
 * @throws RangeError when count is not a whole number of at least 1
 * Source: McKay, Beckman & Conover (1979), Technometrics 21:239–245.
 */
export function latinHypercube(stream: RandomStream, count: number): Float64Array {
  if (!(Number.isSafeInteger(count) && count >= 1)) {
    throw new RangeError(`latinHypercube: count must be a whole number of at least 1, got ${count}`);
  }
  const strata = shuffledIndices(count, stream);
  const probabilities = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    probabilities[i] = insideStratum((strata[i] + stream.next()) / count, strata[i], count);
  }
  return probabilities;
}

/** Rounding of (k + u)/count can carry a u next to 1 into the stratum above; such a value goes to the middle of its own. */
function insideStratum(probability: number, stratum: number, count: number): number {
  return Math.floor(probability * count) === stratum ? probability : (stratum + 0.5) / count;
}
