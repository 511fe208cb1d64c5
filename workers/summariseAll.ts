import type { Model } from '../engine/project/model.ts';
import type { Realisations } from '../engine/settlement/realisations.ts';
import { centralStudy } from '../engine/study.ts';
import { summarise } from '../engine/summary/summarise.ts';
import type { Summary } from '../engine/summary/summary.ts';

/** The summary of replicates at hand, as a worker would make it. */
export function summariseAll(model: Model, replicates: readonly Realisations[]): Summary {
  return summarise(model, replicates, centralStudy(model));
}
