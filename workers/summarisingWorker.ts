import type { Realisations } from '../engine/settlement/realisations.ts';
import type { CentralFindings } from '../engine/study.ts';
import type { Summary } from '../engine/summary/summary.ts';
import type { Hands, StudyRequest } from './conductStudy.ts';
import type { StudyProgress } from './protocol.ts';
import { WorkerDied, type WorkerHandle } from './workerHandle.ts';

/** Replicates after which the first summaries are made; then at each doubling. */
const FIRST_SUMMARIES = [1, 4, 10];

/** The worker that pools the replicates of one run, reports how far it has come, and makes its summaries. */
export class SummarisingWorker {
  readonly #run: number;
  readonly #request: StudyRequest;
  readonly #hands: Hands;
  readonly #central: () => CentralFindings | null;
  readonly #worker: WorkerHandle;
  /** Everything asked so far; no one of them rejects. */
  readonly #asked: Promise<void>[] = [];
  #failure: unknown = null;
  #kept = 0;
  #tellAt = 1;
  #isTelling = false;

  constructor(run: number, request: StudyRequest, hands: Hands, central: () => CentralFindings | null) {
    this.#run = run;
    this.#request = request;
    this.#hands = hands;
    this.#central = central;
    this.#worker = hands.take();
  }

  /** Whether anything went wrong; what it was is thrown by `final`. */
  get hasFailed(): boolean {
    return this.#failure !== null;
  }

  /** Pools a replicate; what goes wrong is thrown by `final`. */
  keep(realisations: Realisations): void {
    this.#note(
      this.#worker
        .ask((remote) => remote.keep(this.#run, realisations))
        .then(() => {
          this.#kept += 1;
          this.#report({});
          this.#tellOnTheWay();
        }),
    );
  }

  /**
   * The summary of all that was kept.
   *
   * @throws WorkerDied when the worker has, and with it all that it kept
   */
  async final(): Promise<Summary> {
    while (this.#asked.length > 0) await this.#asked.pop();
    if (this.#failure !== null) throw this.#failure;
    return await this.#summary();
  }

  /** Ends the worker, and so frees what it kept. */
  end(): void {
    this.#hands.drop(this.#worker);
  }

  #summary(): Promise<Summary> {
    const { model } = this.#request;
    return this.#worker.ask((remote) => remote.summary(this.#run, model, this.#central()));
  }

  #tellOnTheWay(): void {
    const { model, replicates, onTheWay = 'summaries' } = this.#request;
    if (onTheWay === 'nothing' || this.#isTelling || this.#hands.isOver()) return;
    if (this.#kept < this.#tellAt || this.#kept === replicates.length) return;
    this.#isTelling = true;
    const kept = this.#kept;
    const told =
      onTheWay === 'summaries'
        ? this.#summary().then((summary) => this.#report({ summary }))
        : this.#worker
            .ask((remote) => remote.chances(this.#run, model))
            .then((chances) => this.#report({ chances }));
    // often enough to watch, seldom enough not to hold up the rest
    this.#tellAt =
      onTheWay === 'summaries'
        ? (FIRST_SUMMARIES.find((count) => count > kept) ?? 2 * kept)
        : kept + Math.max(1, Math.floor(kept / 50));
    this.#note(told.finally(() => (this.#isTelling = false)));
  }

  #report(progress: Partial<StudyProgress>): void {
    if (this.#hands.isOver()) return;
    this.#request.onProgress?.({
      replicatesDone: this.#kept,
      replicates: this.#request.replicates.length,
      summary: null,
      chances: null,
      ...progress,
    });
  }

  #note(asked: Promise<void>): void {
    this.#asked.push(
      asked.catch((error: unknown) => {
        // a death is what matters: it is cured by doing the work again
        if (this.#failure === null || error instanceof WorkerDied) this.#failure = error;
      }),
    );
  }
}
