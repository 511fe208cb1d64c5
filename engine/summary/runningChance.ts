import type { Limit, Model } from '../project/model.ts';
import type { Realisations } from '../settlement/realisations.ts';
import { bandOfShare } from './confidenceBand.ts';
import { quantities } from './quantities.ts';
import { quantityValues } from './quantityValues.ts';
import type { Estimate, Quantity } from './summary.ts';

/** Place among the quantities of the result that a limit is set on. */
export function limitedQuantity(list: readonly Quantity[], limit: Limit): number {
  return list.findIndex(
    (quantity) =>
      quantity.kind === limit.result &&
      quantity.point === limit.point &&
      quantity.pair === limit.pair &&
      (limit.result !== 'settlement_still_to_come' || quantity.date === limit.date),
  );
}

/** Realisations that pass a limit: those above it, of a pair in absolute value. */
export function countAbove(values: Float64Array, limit: Limit): number {
  let above = 0;
  for (const value of values) if ((limit.pair >= 0 ? Math.abs(value) : value) > limit.value) above += 1;
  return above;
}

/** Chance of passing each limit so far, with its band: what a progress line shows. */
export function runningChances(model: Model, replicates: readonly Realisations[]): Estimate[] {
  const list = quantities(model);
  const counts = replicates.map(({ count }) => count);
  return model.limits.map((limit) => {
    const quantity = list[limitedQuantity(list, limit)];
    const above = replicates.map((replicate) =>
      countAbove(quantityValues(model, quantity, [replicate]), limit),
    );
    return bandOfShare(above, counts);
  });
}
