import type { RandomStream } from './randomStream.ts';

/** The numbers from 0 to count − 1 in random order, every order equally likely (Fisher & Yates). */
export function shuffledIndices(count: number, stream: RandomStream): Int32Array {
  const indices = Int32Array.from({ length: count }, (_, i) => i);
  for (let last = count - 1; last > 0; last -= 1) {
    const pick = Math.floor(stream.next() * (last + 1));
    const kept = indices[last];
    indices[last] = indices[pick];
    indices[pick] = kept;
  }
  return indices;
}
