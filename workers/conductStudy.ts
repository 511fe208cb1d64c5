import { transfer } from 'comlink';
import type { Model } from '../engine/project/model.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import type { CentralFindings } from '../engine/study.ts';
import type { StudyEnd, StudyProgress } from './protocol.ts';
import { SummarisingWorker } from './summarisingWorker.ts';
import { WorkerDied, type WorkerHandle } from './workerHandle.ts';
import { buffersOf } from './studyBuffers.ts';

/** What a run is asked for. */
export interface StudyRequest {
  readonly model: Model;
  /** Numbers of the replicates, each once, in the order in which they are dealt out. */
  readonly replicates: readonly number[];
  /** Replicates that are there already, by number; the others are run. */
  readonly given?: ReadonlyMap<number, Realisations>;
  readonly onProgress?: (progress: StudyProgress) => void;
  /**
   * Gets each replicate that is run as it comes in, before it goes to the summary; must not keep or change it. After
   * a death the same replicate may come again, with the same bytes.
   */
  readonly onReplicate?: (realisations: Realisations) => void;
  /** What is told on the way: summaries now and then, the chances alone, or nothing but the count. */
  readonly onTheWay?: 'summaries' | 'chances' | 'nothing';
}

/** What a run may do with the workers of its pool. */
export interface Hands {
  readonly take: () => WorkerHandle;
  readonly giveBack: (worker: WorkerHandle) => void;
  /** Ends a worker. */
  readonly drop: (worker: WorkerHandle) => void;
  readonly isOver: () => boolean;
}

/** Times that one piece of work may lose its worker before the run is given up. */
const MOST_DEATHS = 3;

type Job = number | 'central';

/**
 * Deals replicates out over workers and pools what comes back in one more worker, which makes the summaries. A
 * worker that dies is replaced and its work done again: its replicate, or all that it had pooled.
 *
 * @param run its number, higher than that of the run before
 * @param size workers at once, without the one that pools
 * @throws what a worker threw, or that workers died MOST_DEATHS times at the same work
 */
export async function conductStudy(
  run: number,
  request: StudyRequest,
  size: number,
  hands: Hands,
): Promise<StudyEnd> {
  const { model, replicates, given } = request;
  const deaths = new Map<Job | 'pooling', number>();
  const countDeath = (work: Job | 'pooling', why: string) => {
    const died = (deaths.get(work) ?? 0) + 1;
    deaths.set(work, died);
    if (died < MOST_DEATHS) return;
    const what = typeof work === 'number' ? `replicate ${work}` : 'the same work';
    throw new Error(`A worker died ${died} times at ${what}: ${why}.`);
  };
  let central: CentralFindings | null = null;
  // the first answer is wanted at once, the central realisation soon after
  const queue: Job[] = [...replicates.slice(0, size), 'central', ...replicates.slice(size)];
  const makeSummariser = () => new SummarisingWorker(run, request, hands, () => central);
  let summariser = makeSummariser();

  const runJob = async (worker: WorkerHandle, job: Job): Promise<void> => {
    if (job === 'central') {
      central = await worker.ask((remote) => remote.central(model));
      return;
    }
    const known = given?.get(job);
    if (known !== undefined) {
      summariser.keep(known);
      return;
    }
    const realisations = await worker.ask((remote) => remote.replicate(model, job));
    if (hands.isOver()) return;
    request.onReplicate?.(realisations);
    summariser.keep(transfer(realisations, buffersOf(realisations)));
  };

  const workThrough = async (): Promise<void> => {
    let worker = hands.take();
    while (queue.length > 0 && !hands.isOver() && !summariser.hasFailed) {
      const job = queue.shift() as Job;
      try {
        await runJob(worker, job);
      } catch (error) {
        if (!(error instanceof WorkerDied)) throw error;
        if (hands.isOver()) return;
        hands.drop(worker);
        countDeath(job, error.message);
        queue.unshift(job);
        worker = hands.take();
      }
    }
    hands.giveBack(worker);
  };

  while (!hands.isOver()) {
    const workers = Math.min(size, queue.length);
    await Promise.all(Array.from({ length: workers }, workThrough));
    try {
      const summary = await summariser.final();
      summariser.end();
      return { kind: 'done', summary };
    } catch (error) {
      if (!(error instanceof WorkerDied)) throw error;
      if (hands.isOver()) break;
      // with it went all that it had pooled
      summariser.end();
      countDeath('pooling', error.message);
      queue.splice(0, queue.length, ...replicates, ...(central === null ? ['central' as const] : []));
      summariser = makeSummariser();
    }
  }
  return { kind: 'cancelled' };
}
