import { createHash } from 'node:crypto';
import type { Realisations } from '../engine/settlement/realisations.ts';

/**
 * What joining needs: the project, and its replicates with every byte. One file: a line of JSON that says what
 * follows, then the numbers of all arrays as 64-bit floats, least significant byte first, then the SHA-256 of all
 * before it, so that a file damaged on its way is noticed.
 */
export interface ReplicateFile {
  readonly format: 'slow-ground-replicates';
  readonly engineVersion: string;
  readonly digest: string;
  readonly seed: number;
  /** Realisations of the whole study that the range belongs to. */
  readonly realisations: number;
  /** Text of the project file. */
  readonly project: string;
  readonly replicates: readonly Realisations[];
}

const HASH_BYTES = 32;

const ARRAYS = [
  'historyTimes',
  'settlement',
  'secondaryAfterHandover',
  'rateAtHandover',
  'timeToLimit',
  'timeToDegree',
  'topUp',
  'fillVolume',
] as const;

interface StoredReplicate {
  readonly replicate: number;
  readonly count: number;
  readonly counts: Realisations['counts'];
  readonly lengths: readonly number[];
}

/** The pieces of the file, one after the other, so that a large one is never held twice. */
export function* writtenReplicates(file: ReplicateFile): Generator<Uint8Array> {
  const hash = createHash('sha256');
  for (const piece of unsignedPieces(file)) {
    hash.update(piece);
    yield piece;
  }
  yield hash.digest();
}

function* unsignedPieces({ replicates, ...head }: ReplicateFile): Generator<Uint8Array> {
  const stored = replicates.map((each): StoredReplicate => ({
    replicate: each.replicate,
    count: each.count,
    counts: each.counts,
    lengths: arraysOf(each).map((array) => array.length),
  }));
  yield new TextEncoder().encode(`${JSON.stringify({ ...head, replicates: stored })}\n`);
  for (const each of replicates) {
    for (const array of arraysOf(each)) yield littleEndian(array);
  }
}

function arraysOf(realisations: Realisations): Float64Array[] {
  return [...ARRAYS.map((name) => realisations[name]), ...realisations.inputs];
}

function littleEndian(array: Float64Array): Uint8Array {
  const bytes = new Uint8Array(array.length * 8);
  const view = new DataView(bytes.buffer);
  array.forEach((value, i) => view.setFloat64(8 * i, value, true));
  return bytes;
}

/** Reads such a file; null where it is damaged, cut short, or something else. */
export function readReplicates(file: Uint8Array): ReplicateFile | null {
  if (file.length < HASH_BYTES) return null;
  const bytes = file.subarray(0, file.length - HASH_BYTES);
  const hash = createHash('sha256').update(bytes).digest();
  if (!hash.equals(file.subarray(bytes.length))) return null;
  const lineEnd = bytes.indexOf(0x0a);
  if (lineEnd < 0) return null;
  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(bytes.subarray(0, lineEnd));
    const head = JSON.parse(text) as Omit<ReplicateFile, 'replicates'> & { replicates: StoredReplicate[] };
    if (head.format !== 'slow-ground-replicates') return null;
    const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
    let offset = lineEnd + 1;
    const take = (length: number) => {
      const array = new Float64Array(length);
      for (let i = 0; i < length; i += 1) array[i] = view.getFloat64(offset + 8 * i, true);
      offset += 8 * length;
      return array;
    };
    const replicates = head.replicates.map(({ replicate, count, counts, lengths }): Realisations => {
      const arrays = lengths.map(take);
      const named = Object.fromEntries(ARRAYS.map((name, i) => [name, arrays[i]]));
      return {
        replicate,
        count,
        counts,
        ...named,
        inputs: arrays.slice(ARRAYS.length),
      } as unknown as Realisations;
    });
    return offset === bytes.length ? { ...head, replicates } : null;
  } catch {
    return null;
  }
}
