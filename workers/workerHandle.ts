import { releaseProxy, type Remote } from 'comlink';
import type { StudyService } from './protocol.ts';

/** A worker died while it was asked something, or before. */
export class WorkerDied extends Error {}

/** A worker as the pool sees it, in the browser or in Node. */
export class WorkerHandle {
  readonly #remote: Remote<StudyService>;
  readonly #stop: () => void;
  readonly #waiting = new Set<(death: WorkerDied) => void>();
  #death: WorkerDied | null = null;
  #isEnded = false;

  /** @param stop ends the worker at once, whatever it is doing */
  constructor(remote: Remote<StudyService>, stop: () => void) {
    this.#remote = remote;
    this.#stop = stop;
  }

  get isDead(): boolean {
    return this.#death !== null;
  }

  /** The answer of the worker; rejects with WorkerDied when it dies, or is ended, before it has answered. */
  ask<T>(question: (remote: Remote<StudyService>) => Promise<T>): Promise<T> {
    return new Promise<T>((resolve, reject) => {
      if (this.#death !== null) {
        reject(this.#death);
        return;
      }
      this.#waiting.add(reject);
      const noLonger = () => this.#waiting.delete(reject);
      question(this.#remote).then(resolve, reject).finally(noLonger);
    });
  }

  /** To be called when the worker is seen to have died; every question under way is answered by that. */
  died(why: string): void {
    if (this.#death !== null) return;
    this.#death = new WorkerDied(why);
    for (const reject of this.#waiting) reject(this.#death);
    this.#waiting.clear();
  }

  /** Ends the worker at once. */
  end(): void {
    this.died('the worker was ended');
    if (this.#isEnded) return;
    this.#isEnded = true;
    this.#remote[releaseProxy]();
    this.#stop();
  }
}

export type MakeWorker = () => WorkerHandle;
