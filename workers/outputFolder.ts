import {
  mkdtempSync,
  closeSync,
  existsSync,
  openSync,
  readdirSync,
  renameSync,
  rmSync,
  writeSync,
} from 'node:fs';
import { basename, dirname, join, resolve } from 'node:path';

/** Files that this command writes; a folder that holds anything else is not touched. */
const OURS = /^(summary\.json|exceedance\.csv|settlement-with-time\.csv|realisations\.csv|replicates\.bin)$/;

/** A folder of results that appears whole or not at all. */
export interface OutputFolder {
  /** Writes a file piece by piece. */
  readonly write: (name: string, pieces: Iterable<string | Uint8Array>) => void;
  /** Puts the folder in its place. */
  readonly publish: () => void;
  /** Takes away what was written so far. */
  readonly discard: () => void;
}

/** Why results cannot be written to a path; null when they can. */
export function outputFault(out: string): string | null {
  const target = resolve(out);
  try {
    if (existsSync(target)) {
      const strange = readdirSync(target).find((name) => !OURS.test(name));
      if (strange !== undefined)
        return `${out} holds ${strange}, which this command did not write; name another folder`;
    } else if (!existsSync(dirname(target))) return `the folder that ${out} is to be made in does not exist`;
    return null;
  } catch {
    return `${out} cannot be used as a folder of results`;
  }
}

/** Starts a folder of results beside its place. */
export function outputFolder(out: string): OutputFolder {
  const target = resolve(out);
  const draft = mkdtempSync(join(dirname(target), `.${basename(target)}-`));
  chmodSync(draft, 0o755);
  return {
    write(name, pieces) {
      const file = openSync(join(draft, name), 'w');
      try {
        for (const piece of pieces) writeAll(file, typeof piece === 'string' ? Buffer.from(piece) : piece);
      } finally {
        closeSync(file);
      }
    },
    publish() {
      if (!existsSync(target)) {
        renameSync(draft, target);
        return;
      }
      const before = mkdtempSync(join(dirname(target), `.${basename(target)}-`));
      renameSync(target, join(before, 'before'));
      renameSync(draft, target);
      rmSync(before, { recursive: true, force: true });
    },
    discard() {
      rmSync(draft, { recursive: true, force: true });
    },
  };
}

function writeAll(file: number, bytes: Uint8Array): void {
  let written = 0;
  while (written < bytes.length) written += writeSync(file, bytes, written);
}
