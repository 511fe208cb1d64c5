import type { Model } from '../engine/project/model.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import type { CentralFindings } from '../engine/study.ts';
import type { Estimate, Summary } from '../engine/summary/summary.ts';

/**
 * Every message to a worker, each a call that comes back once. A worker does one thing at a time; what it
 * keeps belongs to the run whose number it was given last.
 */
export interface StudyService {
  /** One replicate; its arrays are transferred. */
  replicate(model: Model, replicate: number): Realisations;
  /** The central realisation. */
  central(model: Model): CentralFindings;
  /** Keeps a replicate of a run for its summary; a new run forgets the replicates of the one before. */
  keep(run: number, realisations: Realisations): void;
  /** Chance of passing each limit by the replicates kept. */
  chances(run: number, model: Model): Estimate[];
  /** Summary of the replicates kept. */
  summary(run: number, model: Model, central: CentralFindings | null): Summary;
}

/** How far a run has come. */
export interface StudyProgress {
  readonly replicatesDone: number;
  readonly replicates: number;
  /** A summary of the replicates so far, now and then; null in between. */
  readonly summary: Summary | null;
  /** Chance of passing each limit so far, with its band; null where it was not asked for. */
  readonly chances: readonly Estimate[] | null;
}

/** How a run ended: each ends once, in one of these. */
export type StudyEnd =
  | { readonly kind: 'done'; readonly summary: Summary }
  | { readonly kind: 'cancelled' }
  /** A newer run took its place. */
  | { readonly kind: 'replaced' }
  | { readonly kind: 'fault'; readonly message: string };
