import { readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { REALISATIONS_IN_REPLICATE } from '../engine/project/replicateSize.ts';
import { readReplicates, type ReplicateFile } from './replicateFile.ts';

/**
 * Reads runs over ranges of replicates and puts them together.
 *
 * @param folders that the runs wrote, in any order
 * @param out where the result is to go, which must not be one of them
 * @returns all replicates of the study, or one sentence that says why they do not join
 */
export function joinReplicates(folders: readonly string[], out: string): ReplicateFile | string {
  if (folders.some((folder) => resolve(folder) === resolve(out)))
    return `${out} is one of the runs to join; name another folder for the result`;
  const files: ReplicateFile[] = [];
  for (const folder of folders) {
    const file = readFolder(folder);
    if (typeof file === 'string') return file;
    files.push(file);
  }
  const [first] = files;
  for (const [i, file] of files.entries()) {
    if (file.engineVersion !== first.engineVersion) return differ(folders, i, 'versions of the engine');
    if (file.digest !== first.digest) return differ(folders, i, 'models');
    if (file.seed !== first.seed) return differ(folders, i, 'seeds');
    if (file.realisations !== first.realisations) return differ(folders, i, 'numbers of realisations in all');
  }
  const replicates = files.flatMap((file) => file.replicates).sort((a, b) => a.replicate - b.replicate);
  const wanted = first.realisations / REALISATIONS_IN_REPLICATE;
  for (let i = 0; i < replicates.length; i += 1) {
    if (i > 0 && replicates[i].replicate === replicates[i - 1].replicate) {
      return `replicate ${replicates[i].replicate} is in two of the runs`;
    }
  }
  const missing = Array.from({ length: wanted }, (_, i) => i).find((i) => replicates[i]?.replicate !== i);
  if (missing !== undefined) return `replicate ${missing} of ${wanted} is in none of the runs`;
  return { ...first, replicates };
}

function readFolder(folder: string): ReplicateFile | string {
  const path = join(folder, 'replicates.bin');
  try {
    return readReplicates(readFileSync(path)) ?? `${path} is damaged, or no file of replicates`;
  } catch {
    return `${path} cannot be read; runs to join are made with --replicates`;
  }
}

function differ(folders: readonly string[], i: number, what: string): string {
  return `${folders[0]} and ${folders[i]} are of different ${what}`;
}
