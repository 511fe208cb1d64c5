import type { Model } from '../project/model.ts';
import type { Realisations } from '../settlement/realisations.ts';
import { SAME_DATE } from '../settlement/timeGrid.ts';
import type { Quantity } from './summary.ts';

/**
 * Values of a quantity in all realisations, replicate after replicate in the order given.
 *
 * @returns in the quantity's unit; Infinity where a date is not reached
 */
export function quantityValues(
  model: Model,
  quantity: Quantity,
  replicates: readonly Realisations[],
): Float64Array {
  const count = replicates.reduce((sum, replicate) => sum + replicate.count, 0);
  const values = new Float64Array(count);
  let offset = 0;
  for (const replicate of replicates) {
    values.set(ofReplicate(model, quantity, replicate), offset);
    offset += replicate.count;
  }
  return values;
}

function ofReplicate(model: Model, quantity: Quantity, replicate: Realisations): Float64Array {
  const { point, pair, date } = quantity;
  const { count } = replicate;
  const column = (values: Float64Array) => values.subarray(point * count, (point + 1) * count);
  const settlement = (at: number, time: number) => settlementAt(replicate, at, time);
  const between = (at: number, from: number, to: number) => minus(settlement(at, to), settlement(at, from));
  switch (quantity.kind) {
    case 'settlement_at_horizon':
      return settlement(point, model.horizon);
    case 'settlement_after_handover':
      return between(point, model.handover, model.horizon);
    case 'secondary_after_handover':
      return column(replicate.secondaryAfterHandover);
    case 'settlement_at_time':
      return settlement(point, date);
    case 'settlement_still_to_come':
      return between(point, date, model.horizon);
    case 'rate_at_handover':
      return column(replicate.rateAtHandover);
    case 'time_to_limit': {
      const place = model.limits
        .filter((limit) => limit.result === 'settlement_still_to_come')
        .findIndex(
          (limit) => limit.point === point && quantity.id.startsWith(`time_to_limit ${limit.value}@`),
        );
      return replicate.timeToLimit.subarray(place * count, (place + 1) * count);
    }
    case 'time_to_degree':
      return column(replicate.timeToDegree);
    case 'top_up':
      return column(replicate.topUp);
  }
  const { first, second } = model.pairs[pair];
  const isAtHorizon = quantity.kind === 'differential_at_horizon' || quantity.kind === 'slope_at_horizon';
  const differential = isAtHorizon
    ? minus(settlement(second, model.horizon), settlement(first, model.horizon))
    : minus(between(second, model.handover, model.horizon), between(first, model.handover, model.horizon));
  if (quantity.unit === 'm') return differential;
  const distance = Math.abs(model.points[second].x - model.points[first].x);
  return differential.map((value) => value / distance);
}

/** Settlement of a point at one of the history times, m. */
function settlementAt(replicate: Realisations, point: number, date: number): Float64Array {
  const { historyTimes, settlement, count } = replicate;
  const start = (point * historyTimes.length + placeOfDate(historyTimes, date)) * count;
  return settlement.subarray(start, start + count);
}

/**
 * Place of a date among the history times, which hold every date that a result is asked for.
 *
 * @throws where they do not
 */
function placeOfDate(times: Float64Array, date: number): number {
  let nearest = 0;
  for (let t = 1; t < times.length; t += 1) {
    if (Math.abs(times[t] - date) < Math.abs(times[nearest] - date)) nearest = t;
  }
  // a date within SAME_DATE of two others may stand for both
  if (!(Math.abs(times[nearest] - date) <= 2 * SAME_DATE)) {
    throw new RangeError(
      `quantityValues: the history must hold year ${date}, got ${times[nearest]} as nearest`,
    );
  }
  return nearest;
}

function minus(a: Float64Array, b: Float64Array): Float64Array {
  return a.map((value, i) => value - b[i]);
}
