import { transfer } from 'comlink';
import type { Model } from '../engine/project/model.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import type { CentralFindings } from '../engine/study.ts';
import type { StudyEnd, StudyProgress } from './protocol.ts';
import { buffersOf } from './studyBuffers.ts';
import type { MakeWorker, WorkerHandle } from './workerHandle.ts';

/** What a run is asked for. */
export interface StudyRequest {
  readonly model: Model;
  /** Numbers of the replicates, in the order in which they are dealt out. */
  readonly replicates: readonly number[];
  readonly onProgress?: (progress: StudyProgress) => void;
  /** Gets each replicate as it comes in, before it goes to the summary; must not keep or change it. */
  readonly onReplicate?: (realisations: Realisations) => void;
  /** Whether summaries are made on the way ('now and then'), or chances alone after each replicate. */
  readonly onTheWay?: 'summaries' | 'chances' | 'nothing';
}

export interface StudyRun {
  /** Resolves once, and never rejects. */
  readonly end: Promise<StudyEnd>;
  readonly cancel: () => void;
}

/** Times that one replicate may lose its worker before the run is given up. */
const MOST_DEATHS = 3;

type Job = number | 'central';

/**
 * Deals replicates out over workers and pools what comes back in one more worker, which makes the summaries. One
 * run at a time: a newer one replaces it. Ending a run ends its workers, which is the quickest way to stop what
 * they are doing; others start when they are needed. A worker that dies is replaced and its replicate done again.
 */
export class WorkerPool {
  readonly #make: MakeWorker;
  readonly #size: number;
  #idle: WorkerHandle[] = [];
  #runs = 0;
  #endCurrent: ((end: StudyEnd) => void) | null = null;

  constructor(make: MakeWorker, size: number) {
    if (!(Number.isInteger(size) && size >= 1))
      throw new RangeError(`WorkerPool: size must be 1 or more, got ${size}`);
    this.#make = make;
    this.#size = size;
  }

  start(request: StudyRequest): StudyRun {
    this.#endCurrent?.({ kind: 'replaced' });
    this.#runs += 1;
    const run = this.#runs;
    let finish: (end: StudyEnd) => void = () => undefined;
    const ended = new Promise<StudyEnd>((resolve) => (finish = resolve));
    const busy = new Set<WorkerHandle>();
    let isOver = false;
    const end = (how: StudyEnd) => {
      if (isOver) return;
      isOver = true;
      // at work on what nobody wants any more
      for (const worker of busy) worker.terminate();
      if (this.#endCurrent === end) this.#endCurrent = null;
      finish(how);
    };
    this.#endCurrent = end;
    const take = () => {
      const worker = this.#idle.pop() ?? this.#made();
      busy.add(worker);
      return worker;
    };
    const giveBack = (worker: WorkerHandle) => {
      if (isOver || !busy.delete(worker)) return;
      this.#idle.push(worker);
    };
    const drop = (worker: WorkerHandle) => {
      busy.delete(worker);
      worker.terminate();
    };
    void conduct(run, request, this.#size, { take, giveBack, drop, isOver: () => isOver }).then(
      end,
      (error: unknown) =>
        end({ kind: 'fault', message: error instanceof Error ? error.message : String(error) }),
    );
    return { end: ended, cancel: () => end({ kind: 'cancelled' }) };
  }

  /** Ends the run and all workers. */
  dispose(): void {
    this.#endCurrent?.({ kind: 'cancelled' });
    for (const worker of this.#idle) worker.terminate();
    this.#idle = [];
  }

  #made(): WorkerHandle {
    const worker = this.#make();
    // one that dies while it waits is never used again
    void worker.died.then(() => {
      this.#idle = this.#idle.filter((other) => other !== worker);
    });
    return worker;
  }
}

interface Hands {
  readonly take: () => WorkerHandle;
  readonly giveBack: (worker: WorkerHandle) => void;
  readonly drop: (worker: WorkerHandle) => void;
  readonly isOver: () => boolean;
}

/** A worker died while it was asked something. */
class WorkerDied extends Error {
  readonly worker: WorkerHandle;
  constructor(worker: WorkerHandle, why: string) {
    super(why);
    this.worker = worker;
  }
}

/** The answer of a worker, or WorkerDied. */
function answer<T>(worker: WorkerHandle, asked: Promise<T>): Promise<T> {
  return Promise.race([
    asked,
    worker.died.then((why): never => {
      throw new WorkerDied(worker, why);
    }),
  ]);
}

async function conduct(run: number, request: StudyRequest, size: number, hands: Hands): Promise<StudyEnd> {
  const { model, replicates, onTheWay = 'summaries' } = request;
  const report = (progress: Partial<StudyProgress>) =>
    request.onProgress?.({
      replicatesDone: done.size,
      replicates: replicates.length,
      summary: null,
      chances: null,
      ...progress,
    });
  const done = new Set<number>();
  const deaths = new Map<Job, number>();
  let central: CentralFindings | null = null;
  // the first answer is wanted at once, the central realisation soon after
  const queue: Job[] = [...replicates.slice(0, size), 'central', ...replicates.slice(size)];
  let summariser = hands.take();
  let summarising = Promise.resolve();
  let summaryDeaths = 0;

  /** Asks the summarising worker, after all that it was asked before; a dead one is replaced, its replicates lost. */
  const askSummariser = <T>(ask: (worker: WorkerHandle) => Promise<T>): Promise<T> => {
    const asked = summarising.then(() => answer(summariser, ask(summariser)));
    summarising = asked.then(
      () => undefined,
      () => undefined,
    );
    return asked;
  };

  const runJob = async (worker: WorkerHandle, job: Job): Promise<void> => {
    if (job === 'central') {
      central = await answer(worker, worker.remote.central(model));
      return;
    }
    const realisations = await answer(worker, worker.remote.replicate(model, job));
    if (hands.isOver()) return;
    request.onReplicate?.(realisations);
    await askSummariser((keeper) => keeper.remote.keep(run, transfer(realisations, buffersOf(realisations))));
    done.add(job);
    report({});
    await tellOnTheWay();
  };

  let nextSummary = 1;
  const tellOnTheWay = async () => {
    if (done.size === replicates.length) return;
    if (onTheWay === 'chances')
      report({ chances: await askSummariser((keeper) => keeper.remote.chances(run, model)) });
    if (onTheWay !== 'summaries' || done.size < nextSummary) return;
    nextSummary = done.size < 10 ? Math.min(10, 2 * done.size) : 2 * done.size;
    report({ summary: await askSummariser((keeper) => keeper.remote.summary(run, model, central)) });
  };

  const loseSummariser = () => {
    summaryDeaths += 1;
    if (summaryDeaths > MOST_DEATHS)
      throw new Error('the worker that pools the results died again and again');
    hands.drop(summariser);
    summariser = hands.take();
    queue.push(...done);
    done.clear();
  };

  const workThrough = async (): Promise<void> => {
    let worker = hands.take();
    while (!hands.isOver()) {
      const job = queue.shift();
      if (job === undefined) break;
      try {
        await runJob(worker, job);
      } catch (error) {
        if (!(error instanceof WorkerDied)) throw error;
        if (hands.isOver()) return;
        if (error.worker === worker) {
          hands.drop(worker);
          worker = hands.take();
          const lost = (deaths.get(job) ?? 0) + 1;
          deaths.set(job, lost);
          if (lost >= MOST_DEATHS)
            throw new Error(`a worker died ${lost} times at the same work: ${error.message}`);
        } else if (error.worker === summariser) {
          loseSummariser();
        }
        if (job === 'central' || !(done.has(job) || queue.includes(job))) queue.unshift(job);
      }
    }
    hands.giveBack(worker);
  };

  while (!hands.isOver()) {
    await Promise.all(Array.from({ length: Math.min(size, Math.max(1, queue.length)) }, workThrough));
    if (hands.isOver()) break;
    if (queue.length > 0) continue;
    try {
      const summary = await askSummariser((keeper) => keeper.remote.summary(run, model, central));
      hands.giveBack(summariser);
      return { kind: 'done', summary };
    } catch (error) {
      if (!(error instanceof WorkerDied)) throw error;
      if (!hands.isOver()) loseSummariser();
    }
  }
  return { kind: 'cancelled' };
}
