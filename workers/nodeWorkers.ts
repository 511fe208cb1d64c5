import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { wrap } from 'comlink';
import nodeEndpoint from 'comlink/dist/esm/node-adapter.mjs';
import type { StudyService } from './protocol.ts';
import { WorkerHandle, type MakeWorker } from './workerHandle.ts';

/**
 * Makes worker threads.
 *
 * @param file the built file of study.node
 * @param onThread is shown every thread that is made
 */
export function nodeWorkers(file: URL, onThread?: (worker: Worker) => void): MakeWorker {
  return () => {
    const worker = new Worker(file);
    onThread?.(worker);
    const handle = new WorkerHandle(wrap<StudyService>(nodeEndpoint(worker)), () => void worker.terminate());
    worker.on('error', (error) => handle.died(error.message));
    worker.on('messageerror', () => handle.died('a message of a worker could not be read'));
    worker.on('exit', (code) => handle.died(`a worker ended with ${code}`));
    return handle;
  };
}

export function usualNodeWorkers(): number {
  return availableParallelism();
}
