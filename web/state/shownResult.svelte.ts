import type { QuantitySummary, Summary } from '../../engine/summary/summary.ts';

/** Which result, limit and point the person is looking at. Names, not places, so that it outlives a new answer. */
export class ShownResult {
  pointQuantity = $state('');
  pairQuantity = $state('');
  /** The result asked for last: the one whose drivers and convergence are shown. */
  asked = $state('');
  /** Value of the limit asked for with it; NaN for none. */
  askedLimit = $state(NaN);
  point = $state(-1);

  /** Asks for a result, by itself or with one of its limits. */
  ask({ quantity }: QuantitySummary, limit = NaN): void {
    this.asked = quantity.id;
    this.askedLimit = limit;
    if (quantity.pair >= 0) this.pairQuantity = quantity.id;
    else {
      this.pointQuantity = quantity.id;
      this.point = quantity.point;
    }
  }

  /** Forgets all of it: another project is opened. */
  forget(): void {
    this.pointQuantity = this.pairQuantity = this.asked = '';
    this.askedLimit = NaN;
    this.point = -1;
  }
}

/** The result of a name, else the first with a limit, else the first of the kind; null where there is none. */
export function findResult(summary: Summary, id: string, pairs: boolean | null): QuantitySummary | null {
  const fitting = summary.quantities.filter((candidate) => isShown(summary, candidate, pairs));
  const limited = summary.limits.map((limit) => summary.quantities[limit.quantity]);
  return (
    fitting.find(({ quantity }) => quantity.id === id) ??
    fitting.find((candidate) => limited.includes(candidate)) ??
    fitting[0] ??
    null
  );
}

/** Whether a result can be asked for: not that of a fixed point, which is always nothing. */
export function isShown(summary: Summary, { quantity }: QuantitySummary, pairs: boolean | null): boolean {
  if (quantity.pair >= 0) return pairs !== false;
  return pairs !== true && !summary.model.points[quantity.point]?.fixed;
}

/** The point whose settlement with time is shown: the one asked for, else that of the result shown, else the first that settles. */
export function shownPoint(summary: Summary, shown: ShownResult): number {
  if (shown.point >= 0 && shown.point < summary.timeBands.length) return shown.point;
  const result = findResult(summary, shown.pointQuantity, false);
  return result ? result.quantity.point : summary.model.points.findIndex(({ fixed }) => !fixed);
}
