import { createReadStream } from 'node:fs';
import { checkProject } from '../engine/project/checkProject.ts';
import { faultSentence } from '../engine/project/fault.ts';
import type { Model } from '../engine/project/model.ts';
import { Ending, REFUSED } from './ending.ts';
import type { Interruption } from './interruption.ts';

/** More than the checker takes; what comes after is not read. */
const MOST_BYTES = 20_000_001;

/**
 * Text of a project file.
 *
 * @param path '-' for standard input
 * @throws Ending when it cannot be read
 */
export async function readProject(path: string, interruption: Interruption): Promise<string> {
  const stream = path === '-' ? process.stdin : createReadStream(path);
  const pieces: Uint8Array[] = [];
  let bytes = 0;
  interruption.onInterrupt = () => stream.destroy();
  try {
    for await (const piece of stream as AsyncIterable<Uint8Array>) {
      pieces.push(piece);
      bytes += piece.length;
      if (bytes >= MOST_BYTES) break;
    }
    await interruption.check();
    return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(pieces));
  } catch (error) {
    await interruption.check();
    if (error instanceof Ending) throw error;
    const name = path === '-' ? 'standard input' : path;
    throw new Ending(REFUSED, `${name}: ${whyUnread(error as NodeJS.ErrnoException, bytes)}.`);
  }
}

function whyUnread({ code }: NodeJS.ErrnoException, bytes: number): string {
  if (code === 'ENOENT') return 'there is no such file';
  if (code === 'EISDIR') return 'that is a folder';
  if (code === 'EACCES') return 'it may not be read';
  if (code === 'ERR_ENCODING_INVALID_ENCODED_DATA') {
    return bytes >= MOST_BYTES ? 'a project has at most 20 MB' : 'it is not a text in UTF-8';
  }
  return 'it cannot be read';
}

/** What the command line says instead of the file. */
export interface SamplingGiven {
  readonly realisations: number | null;
  readonly seed: number | null;
}

/**
 * The model of a project text.
 *
 * @throws Ending with every fault
 */
export function checkedModel(text: string, given: SamplingGiven): Model {
  const model = modelOrFaults(text);
  const sampling = {
    realisations: given.realisations ?? model.sampling.realisations,
    seed: given.seed ?? model.sampling.seed,
  };
  if (sampling.realisations === model.sampling.realisations && sampling.seed === model.sampling.seed)
    return model;
  // checked again, because what is remarked on may hang on it
  const project = JSON.parse(text.startsWith('\ufeff') ? text.slice(1) : text) as Record<string, unknown>;
  return modelOrFaults(JSON.stringify({ ...project, sampling }));
}

function modelOrFaults(text: string): Model {
  const checked = checkProject(text);
  if (checked.ok) return checked.model;
  const count = checked.faults.length;
  const lines = checked.faults.map(
    (each) => `  ${faultSentence(each)}${each.pointer === '' ? '' : ` [${each.pointer}]`}`,
  );
  const head = `The project was refused: ${count === 1 ? 'one fault' : `${count} faults`}.`;
  throw new Ending(REFUSED, [head, ...lines].join('\n'));
}
