import type { Model } from '../../engine/project/model.ts';
import { browserWorker, usualBrowserWorkers } from '../../workers/browserWorkers.ts';
import type { StudyEnd, StudyProgress } from '../../workers/protocol.ts';
import { WorkerPool } from '../../workers/workerPool.ts';

/** A study under way. */
export interface BrowserStudy {
  /** Resolves once, and never rejects. */
  readonly result: Promise<StudyEnd>;
  readonly cancel: () => void;
}

let pool: WorkerPool | null = null;

/** Starts all replicates of a model on the page's own workers; a study still under way is replaced. */
export function startBrowserStudy(model: Model, onProgress: (progress: StudyProgress) => void): BrowserStudy {
  pool ??= new WorkerPool(browserWorker, usualBrowserWorkers());
  const replicates = Array.from({ length: replicatesOf(model) }, (_, replicate) => replicate);
  const { end, cancel } = pool.start({ model, replicates, onProgress });
  return { result: end, cancel };
}

/** Realisations are asked for in hundreds, one replicate each (method statement, section 6). */
const REALISATIONS_IN_REPLICATE = 100;

/** How many replicates a model asks for. */
export function replicatesOf(model: Model): number {
  return model.sampling.realisations / REALISATIONS_IN_REPLICATE;
}
