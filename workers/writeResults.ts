import type { Realisations } from '../engine/settlement/realisations.ts';
import type { Summary } from '../engine/summary/summary.ts';
import { exceedanceCsv, realisationsCsv, settlementWithTimeCsv } from './csvFiles.ts';
import { Ending, NOT_FINISHED } from './ending.ts';
import type { Interruption } from './interruption.ts';
import { outputFolder } from './outputFolder.ts';
import { writtenReplicates } from './replicateFile.ts';
import { summaryFile } from './summaryFile.ts';

export interface Results {
  readonly summary: Summary;
  /** The replicates, rising, where each realisation is to be written. */
  readonly every: readonly Realisations[] | null;
  /** Text of the project, where the run is to be joined with others. */
  readonly toJoin: string | null;
}

/**
 * Writes all files of a run, or none.
 *
 * @throws Ending when they cannot be written, or when interrupted
 */
export async function writeResults(out: string, results: Results, interruption: Interruption): Promise<void> {
  interruption.onInterrupt = () => undefined;
  try {
    const folder = outputFolder(out);
    try {
      for (const [name, pieces] of filesOf(results)) {
        for (const piece of pieces) {
          folder.write(name, piece);
          await interruption.check();
        }
      }
      folder.publish();
    } catch (error) {
      folder.discard();
      throw error;
    }
  } catch (error) {
    if (error instanceof Ending) throw error;
    throw new Ending(
      NOT_FINISHED,
      `The results could not be written to ${out}: ${(error as Error).message}.`,
    );
  }
}

/** Files by name, piece by piece, so that a large one is never held whole. */
function* filesOf({
  summary,
  every,
  toJoin,
}: Results): Generator<readonly [string, Iterable<string | Uint8Array>]> {
  yield ['summary.json', [summaryFile(summary)]];
  yield ['exceedance.csv', [exceedanceCsv(summary)]];
  yield ['settlement-with-time.csv', [settlementWithTimeCsv(summary)]];
  if (every === null) return;
  yield ['realisations.csv', realisationsCsv(summary.model, every)];
  if (toJoin === null) return;
  const { model, provenance } = summary;
  const { engineVersion, seed } = provenance;
  const { realisations } = model.sampling;
  const head = { engineVersion, digest: model.digest, seed, realisations, project: toJoin };
  yield [
    'replicates.bin',
    writtenReplicates({ format: 'slow-ground-replicates', ...head, replicates: every }),
  ];
}
