import { runReplicate } from '../../engine/study.ts';
import { summarise } from '../../engine/summary/summarise.ts';
import type { Summary } from '../../engine/summary/summary.ts';
import { modelOf } from '../modelOf.ts';

/** The whole study of a project text by the engine in this process: no worker, no browser. */
export function studyInNode(text: string): Summary {
  const model = modelOf(text);
  const replicates = Array.from({ length: model.sampling.realisations / 100 }, (_, i) =>
    runReplicate(model, i),
  );
  return summarise(model, replicates, { central: [], numericalError: null, warnings: [] });
}
