import { transfer } from 'comlink';
import type { Realisations } from '../engine/settlement/realisations.ts';
import { centralStudy, runReplicate } from '../engine/study.ts';
import { runningChances } from '../engine/summary/runningChance.ts';
import { summarise } from '../engine/summary/summarise.ts';
import type { StudyService } from './protocol.ts';
import { buffersOf } from './studyBuffers.ts';

/** What a worker does: message, engine, transferred buffers, and nothing else. */
export function studyService(): StudyService {
  let keptRun = -1;
  let kept: Realisations[] = [];
  const replicatesOf = (run: number) => {
    if (run !== keptRun) [keptRun, kept] = [run, []];
    return kept;
  };
  return {
    replicate(model, replicate) {
      const realisations = runReplicate(model, replicate);
      return transfer(realisations, buffersOf(realisations));
    },
    central: (model) => centralStudy(model),
    keep(run, realisations) {
      replicatesOf(run).push(realisations);
    },
    chances: (run, model) => runningChances(model, replicatesOf(run)),
    summary: (run, model, central) =>
      summarise(model, replicatesOf(run), central ?? { central: [], numericalError: null, warnings: [] }),
  };
}
