import { releaseProxy, wrap } from 'comlink';
import type { StudyService } from './protocol.ts';
import type { WorkerHandle } from './workerHandle.ts';

/** Starts a web worker. */
export function browserWorker(): WorkerHandle {
  const worker = new Worker(new URL('./study.worker.ts', import.meta.url), { type: 'module' });
  const remote = wrap<StudyService>(worker);
  let tell: (why: string) => void = () => undefined;
  const died = new Promise<string>((resolve) => {
    tell = resolve;
    worker.addEventListener('error', (event) => resolve(event.message || 'a worker could not go on'));
    worker.addEventListener('messageerror', () => resolve('a message of a worker could not be read'));
  });
  return {
    remote,
    died,
    terminate() {
      tell('the worker was ended');
      remote[releaseProxy]();
      worker.terminate();
    },
  };
}

/** Workers that make use of the machine: one a core, two where the browser does not tell. */
export function usualBrowserWorkers(): number {
  return Math.max(1, navigator.hardwareConcurrency || 2);
}
