import type { Model } from '../engine/project/model.ts';
import type { DrawnGround } from '../engine/sampling/drawnGround.ts';
import { realise, WORKING_RESOLUTION } from '../engine/settlement/realise.ts';

/**
 * For each realisation and settling point of a drawn ground, the largest difference of the settlement at any
 * history time between the working grid and one with `times` as many cells and steps, as a share of the final
 * settlement (the largest up to the horizon). Columns that settle less than 1 mm are left out.
 */
export function gridDeviations(model: Model, ground: DrawnGround, times: number): number[] {
  const working = realise(model, ground);
  const finer = realise(model, ground, {
    cells: times * WORKING_RESOLUTION.cells,
    steps: times * WORKING_RESOLUTION.steps,
  });
  const dates = working.historyTimes.length;
  const deviations: number[] = [];
  model.points.forEach((point, p) => {
    if (point.fixed) return;
    for (let r = 0; r < ground.count; r += 1) {
      let final = 0;
      let largest = 0;
      for (let t = 0; t < dates; t += 1) {
        const at = (p * dates + t) * ground.count + r;
        final = Math.max(final, finer.settlement[at]);
        largest = Math.max(largest, Math.abs(working.settlement[at] - finer.settlement[at]));
      }
      if (final > 0.001) deviations.push(largest / final);
    }
  });
  return deviations;
}
