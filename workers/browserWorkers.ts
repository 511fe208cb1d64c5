import { wrap } from 'comlink';
import type { StudyService } from './protocol.ts';
import { WorkerHandle } from './workerHandle.ts';

/** Starts a web worker. */
export function browserWorker(): WorkerHandle {
  const worker = new Worker(new URL('./study.worker.ts', import.meta.url), { type: 'module' });
  const handle = new WorkerHandle(wrap<StudyService>(worker), () => worker.terminate());
  worker.addEventListener('error', (event) => handle.died(event.message || 'a worker could not go on'));
  worker.addEventListener('messageerror', () => handle.died('a message of a worker could not be read'));
  return handle;
}

/** Workers that make use of the machine: one a core, two where the browser does not tell. */
export function usualBrowserWorkers(): number {
  return Math.max(1, navigator.hardwareConcurrency || 2);
}
