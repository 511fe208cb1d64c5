import {
  closeSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  openSync,
  readdirSync,
  realpathSync,
  renameSync,
  rmSync,
  rmdirSync,
  statSync,
  writeSync,
} from 'node:fs';
import { basename, dirname, join, resolve } from 'node:path';

/** Files that this command writes; a folder that holds anything else is not touched. */
const OURS = /^(summary\.json|exceedance\.csv|settlement-with-time\.csv|realisations\.csv|replicates\.bin)$/;

/** A folder of results that appears whole or not at all. */
export interface OutputFolder {
  /** Writes a piece at the end of a file. */
  readonly write: (name: string, piece: string | Uint8Array) => void;
  /** Puts the folder in its place. */
  readonly publish: () => void;
  /** Takes away what was written so far. */
  readonly discard: () => void;
}

/** Why results cannot be written to a path, in one sentence; null when they can. */
export function outputFault(out: string): string | null {
  try {
    const target = placeOf(out);
    if (existsSync(target)) {
      const strange = readdirSync(target).find((name) => !OURS.test(name));
      if (strange !== undefined)
        return `${out} holds ${strange}, which this command did not write; name another folder`;
      if (statSync(target).dev !== statSync(dirname(target)).dev || target === dirname(target))
        return `${out} is where a disk begins and cannot be replaced; name a folder inside it`;
    }
    const above = nearestFolderAbove(target);
    if (!statSync(above).isDirectory()) return `${above} is not a folder, so ${out} cannot be made in it`;
    // what may be written shows only when it is tried
    rmdirSync(mkdtempSync(join(above, `.${basename(target)}-`)));
    return null;
  } catch {
    return `${out} cannot be used as a folder of results`;
  }
}

/** Starts a folder of results, as a hidden draft on the same disk as its place. */
export function outputFolder(out: string): OutputFolder {
  const target = placeOf(out);
  const shelter = mkdtempSync(join(nearestFolderAbove(target), `.${basename(target)}-`));
  const [draft, former] = [join(shelter, 'draft'), join(shelter, 'former')];
  mkdirSync(draft);
  const discard = () => rmSync(shelter, { recursive: true, force: true });
  return {
    write(name, piece) {
      const file = openSync(join(draft, name), 'a');
      try {
        writeAll(file, typeof piece === 'string' ? Buffer.from(piece) : piece);
      } finally {
        closeSync(file);
      }
    },
    publish() {
      mkdirSync(dirname(target), { recursive: true });
      const replaces = existsSync(target);
      if (replaces) renameSync(target, former);
      try {
        renameSync(draft, target);
      } catch (error) {
        if (replaces) renameSync(former, target);
        throw error;
      }
      discard();
    },
    discard,
  };
}

/** The full path; of a folder that is there, the one that a link leads to. */
function placeOf(path: string): string {
  return existsSync(path) ? realpathSync(path) : resolve(path);
}

function nearestFolderAbove(target: string): string {
  let above = dirname(target);
  while (!existsSync(above) && above !== dirname(above)) above = dirname(above);
  return above;
}

function writeAll(file: number, bytes: Uint8Array): void {
  let written = 0;
  while (written < bytes.length) written += writeSync(file, bytes, written);
}
