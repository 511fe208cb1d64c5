import { conductStudy, type StudyRequest } from './conductStudy.ts';
import type { StudyEnd } from './protocol.ts';
import type { MakeWorker, WorkerHandle } from './workerHandle.ts';

export interface StudyRun {
  /** Resolves once, and never rejects. */
  readonly end: Promise<StudyEnd>;
  readonly cancel: () => void;
}

/**
 * Workers for one run at a time: a newer one replaces it. Ending a run ends its workers, which is the quickest way
 * to stop what they are doing; others start when they are needed.
 */
export class WorkerPool {
  readonly #make: MakeWorker;
  readonly #size: number;
  #idle: WorkerHandle[] = [];
  #runs = 0;
  #endCurrent: ((end: StudyEnd) => void) | null = null;

  /** @param size workers that run replicates, 1 or more; one more pools what they give */
  constructor(make: MakeWorker, size: number) {
    if (!(Number.isInteger(size) && size >= 1))
      throw new RangeError(`WorkerPool: size must be 1 or more, got ${size}`);
    this.#make = make;
    this.#size = size;
  }

  start(request: StudyRequest): StudyRun {
    this.#endCurrent?.({ kind: 'replaced' });
    this.#runs += 1;
    let finish: (end: StudyEnd) => void = () => undefined;
    const ended = new Promise<StudyEnd>((resolve) => (finish = resolve));
    const busy = new Set<WorkerHandle>();
    let isOver = false;
    const end = (how: StudyEnd) => {
      if (isOver) return;
      isOver = true;
      if (this.#endCurrent === end) this.#endCurrent = null;
      // at work on what nobody wants any more
      for (const worker of busy) worker.end();
      finish(how);
    };
    this.#endCurrent = end;
    const hands = {
      take: () => {
        const worker = this.#idleOne() ?? this.#make();
        busy.add(worker);
        return worker;
      },
      giveBack: (worker: WorkerHandle) => {
        if (!isOver && busy.delete(worker)) this.#idle.push(worker);
      },
      drop: (worker: WorkerHandle) => {
        busy.delete(worker);
        worker.end();
      },
      isOver: () => isOver,
    };
    const fault = (error: unknown) =>
      end({ kind: 'fault', message: error instanceof Error ? error.message : String(error) });
    void conductStudy(this.#runs, request, this.#size, hands).then(end, fault);
    return { end: ended, cancel: () => end({ kind: 'cancelled' }) };
  }

  /** Ends the run and all workers. */
  dispose(): void {
    this.#endCurrent?.({ kind: 'cancelled' });
    for (const worker of this.#idle) worker.end();
    this.#idle = [];
  }

  /** A worker that waits, and has not died while it waited. */
  #idleOne(): WorkerHandle | undefined {
    for (;;) {
      const worker = this.#idle.pop();
      if (worker === undefined || !worker.isDead) return worker;
      worker.end();
    }
  }
}
