import type { Model } from '../../engine/project/model.ts';
import type { Summary } from '../../engine/summary/summary.ts';
import type { StudyProgress } from '../../workers/protocol.ts';
import { replicatesOf, startBrowserStudy } from './startBrowserStudy.ts';

/** How the study on screen stands. */
export type StudyState = 'idle' | 'running' | 'done' | 'cancelled' | 'fault';

/**
 * The study of the project on screen. One runs at a time; a new one replaces it, and whatever an older one
 * still reports is thrown away by the number of its run.
 */
export class CurrentStudy {
  summary = $state.raw<Summary | null>(null);
  state = $state<StudyState>('idle');
  replicatesDone = $state(0);
  replicates = $state(0);
  faultSentence = $state('');

  #run = 0;
  #cancel: (() => void) | null = null;

  /** Starts a study of the model; the former answer stays until the first of the new one. */
  async start(model: Model): Promise<void> {
    this.#cancel?.();
    this.#run += 1;
    const run = this.#run;
    this.state = 'running';
    this.replicatesDone = 0;
    this.replicates = replicatesOf(model);
    this.faultSentence = '';
    const study = startBrowserStudy(model, (progress) => {
      if (run === this.#run) this.#take(progress);
    });
    this.#cancel = study.cancel;
    const end = await study.result;
    if (run !== this.#run) return;
    this.#cancel = null;
    if (end.kind === 'done') {
      this.summary = end.summary;
      this.state = 'done';
    } else if (end.kind === 'fault') {
      this.state = 'fault';
      this.faultSentence = end.message;
    } else {
      this.state = 'cancelled';
    }
  }

  /** Ends the study; what it has answered so far stays, with the count of realisations behind it. */
  cancel(): void {
    this.#cancel?.();
  }

  /** The answer of another project is taken off the screen. */
  forget(): void {
    this.summary = null;
  }

  /** Whether the answer was made from these inputs. */
  belongsTo(model: Model | null): boolean {
    return this.summary !== null && model !== null && this.summary.model.digest === model.digest;
  }

  #take(progress: StudyProgress): void {
    this.replicatesDone = progress.replicatesDone;
    this.replicates = progress.replicates;
    if (progress.summary) this.summary = progress.summary;
  }
}
