import type { Remote } from 'comlink';
import type { StudyService } from './protocol.ts';

/** A worker as the pool sees it, in the browser or in Node. */
export interface WorkerHandle {
  readonly remote: Remote<StudyService>;
  /** Resolves, with why, when the worker has died or was ended; never rejects. */
  readonly died: Promise<string>;
  /** Ends the worker at once. */
  readonly terminate: () => void;
}

export type MakeWorker = () => WorkerHandle;
