import type { Model } from '../project/model.ts';
import type { DrawnGround } from '../sampling/drawnGround.ts';
import { assembleColumn, type Resolution } from './assembleColumn.ts';
import { clampTally } from './clampTally.ts';
import type { Column } from './column.ts';
import { consolidationTime } from './consolidationTime.ts';
import { fillVolumes } from './fillVolumes.ts';
import { historyTimes } from './historyTimes.ts';
import { march } from './march.ts';
import type { Realisations } from './realisations.ts';
import { dateOfDegree, dateOfSettlementStillToCome, RATE_PERIOD, valueAtDate } from './settlementHistory.ts';
import { intervalsOf } from './timeGrid.ts';
import { endOfPlacing } from './track.ts';

/** Cells and steps of everyday work: the accuracy that goes with them is measured in the tests. */
export const WORKING_RESOLUTION: Resolution = { cells: 60, steps: 16 };

/** The settlements of all realisations of a drawn ground at all points of a model. */
export function realise(
  model: Model,
  ground: DrawnGround,
  resolution: Resolution = WORKING_RESOLUTION,
): Realisations {
  const { count } = ground;
  const times = historyTimes(model);
  const points = model.points.length;
  const stillToCome = model.limits.filter((limit) => limit.result === 'settlement_still_to_come');
  const results = {
    replicate: ground.replicate,
    count,
    historyTimes: times,
    settlement: new Float64Array(points * times.length * count),
    secondaryAfterHandover: new Float64Array(points * count),
    rateAtHandover: new Float64Array(points * count),
    timeToLimit: new Float64Array(stillToCome.length * count).fill(times[0]),
    timeToDegree: new Float64Array(model.results.degreeOfConsolidation === null ? 0 : points * count).fill(
      times[0],
    ),
    topUp: new Float64Array(points * count),
    fillVolume: new Float64Array(2 * count),
    inputs: ground.inputs.map((input) => input.values),
  };
  const clamped = clampTally();
  for (let point = 0; point < points; point += 1) {
    if (model.points[point].fixed) continue;
    const columns: Column[] = [];
    const realisationOf: number[] = [];
    for (let r = 0; r < count; r += 1) {
      const column = assembleColumn(model, ground, point, r, resolution);
      if (column === null) continue;
      columns.push(column);
      realisationOf.push(r);
    }
    const grids = columns.map((column) => intervalsOf(column, resolution.steps, consolidationTime(column)));
    march(columns, grids).forEach((track, index) => {
      const column = columns[index];
      const r = realisationOf[index];
      clamped.add(r, column, track);
      for (let t = 0; t < times.length; t += 1) {
        results.settlement[(point * times.length + t) * count + r] = valueAtDate(
          track,
          track.settlement,
          times[t],
        );
      }
      const at = point * count + r;
      const { handover, horizon } = model;
      results.secondaryAfterHandover[at] =
        valueAtDate(track, track.secondary, horizon) - valueAtDate(track, track.secondary, handover);
      results.rateAtHandover[at] =
        (valueAtDate(track, track.settlement, handover + RATE_PERIOD) -
          valueAtDate(track, track.settlement, handover)) /
        RATE_PERIOD;
      results.topUp[at] = track.toppedUp;
      stillToCome.forEach((limit, place) => {
        if (limit.point !== point) return;
        results.timeToLimit[place * count + r] = dateOfSettlementStillToCome(track, horizon, limit.value);
      });
      if (model.results.degreeOfConsolidation !== null) {
        results.timeToDegree[at] = dateOfDegree(track, column.degree, endOfPlacing(column), horizon);
      }
    });
  }
  for (let r = 0; r < count; r += 1) {
    const [placed, toppedUp] = fillVolumes(model, ground, r, results.topUp);
    results.fillVolume[r] = placed;
    results.fillVolume[count + r] = toppedUp;
  }
  return { ...results, counts: clamped.counts(ground.cutAtLimits) };
}
