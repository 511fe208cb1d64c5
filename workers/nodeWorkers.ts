import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { releaseProxy, wrap } from 'comlink';
import nodeEndpoint from 'comlink/dist/esm/node-adapter.mjs';
import type { StudyService } from './protocol.ts';
import type { MakeWorker, WorkerHandle } from './workerHandle.ts';

/** Makes worker threads from the built file of study.node. */
export function nodeWorkers(file: URL): MakeWorker {
  return (): WorkerHandle => {
    const worker = new Worker(file);
    const remote = wrap<StudyService>(nodeEndpoint(worker));
    let tell: (why: string) => void = () => undefined;
    const died = new Promise<string>((resolve) => {
      tell = resolve;
      worker.on('error', (error) => resolve(error.message));
      worker.on('messageerror', () => resolve('a message of a worker could not be read'));
      worker.on('exit', (code) => resolve(`a worker ended with ${code}`));
    });
    return {
      remote,
      died,
      terminate() {
        tell('the worker was ended');
        remote[releaseProxy]();
        void worker.terminate();
      },
    };
  };
}

export function usualNodeWorkers(): number {
  return availableParallelism();
}
