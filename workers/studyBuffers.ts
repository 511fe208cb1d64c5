import type { Realisations } from '../engine/settlement/realisations.ts';

/** The buffers of all arrays of a replicate, each once. */
export function buffersOf(realisations: Realisations): ArrayBuffer[] {
  const arrays = Object.values(realisations).flatMap((value: unknown) =>
    value instanceof Float64Array ? [value] : Array.isArray(value) ? (value as Float64Array[]) : [],
  );
  return [...new Set(arrays.map((array) => array.buffer as ArrayBuffer))];
}
