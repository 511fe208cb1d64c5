import { exp, ln } from '../elementary.ts';
import { actingShare } from '../load/programme.ts';
import type { Column, SecondaryLaw } from './column.ts';
import type { ColumnState } from './columnState.ts';
import type { TotalStress } from './stressState.ts';
import { SAME_DATE } from './timeGrid.ts';

/** Share of the mean load that the mean gain of effective stress must reach for primary to have ended. */
const END_OF_PRIMARY = 0.95;
/** A lift that adds less than this share of the load before it does not put off secondary compression. */
const LIFT_THAT_COUNTS = 0.1;

/** Secondary compression of a column while it is marched. */
export interface SecondaryCompression {
  /** To be called before a load acts at once: notes the effective stress at which a removal starts. */
  readonly beforeChange: (date: number, state: ColumnState) => void;
  /** To be called after it: a removal that ends sets the rate from here on. */
  readonly afterChange: (date: number, total: TotalStress, state: ColumnState) => void;
  /** Adds the secondary settlement of a step. */
  readonly advance: (from: number, to: number, total: TotalStress, state: ColumnState) => void;
}

/**
 * Cα'/Cα = m + (1 − m) exp(−n (σ'before/σ'after − 1)), never above 1.
 * Source: form after Alonso, Gens & Lloret (2000), values of m and n from memory.
 */
export function reductionAfterSurcharge(
  before: number,
  after: number,
  floor: number,
  exponent: number,
): number {
  return Math.min(1, floor + (1 - floor) * exp(-exponent * (before / after - 1)));
}

/**
 * Secondary settlement by stratum: strain goes on along log t, t from time zero, from the end of primary, at
 * the rate of each cell's state. The end of primary is the first date, not before the last lift that counts,
 * at which the stratum's mean gain of effective stress is 95 % of its mean load; found straight between steps.
 * After a surcharge has come off the rate is lower, by the effective stress reached when its removal started
 * and the one at rest under the load left when it ended.
 */
export function secondaryCompression(column: Column, law: SecondaryLaw): SecondaryCompression {
  const strata = strataOf(column, law);
  const { thickness } = column.cells;
  const { yieldStress, initialStress } = column.law;
  const removals = removalsOf(column);
  const before = removals.map(() => new Float64Array(law.strata).fill(NaN));
  const earliest = strata.map((cells, stratum) => earliestEndOfPrimary(column, law, stratum, cells));
  const endOfPrimary = new Float64Array(law.strata).fill(NaN);
  const reduction = new Float64Array(law.strata).fill(1);
  const lastShare = new Float64Array(law.strata);
  const initialMean = strata.map((cells) => meanOver(cells, thickness, initialStress));

  /** Mean over a stratum of σ' at rest under the load now acting, kPa. */
  const meanAtRest = (stratum: number, total: TotalStress, settlement: number) => {
    const cells = strata[stratum];
    const fixed = meanOver(cells, thickness, total.base);
    const answering = total.coupled ? settlement * meanOver(cells, thickness, total.slope) : 0;
    return fixed + answering + (law.reachedByVacuum[stratum] ? total.vacuum : 0);
  };

  /** Looks whether primary has ended by `to`. */
  const watch = (stratum: number, from: number, to: number, total: TotalStress, state: ColumnState) => {
    const load = meanAtRest(stratum, total, state.settlement) - initialMean[stratum];
    const gain = meanOver(strata[stratum], thickness, state.stress) - initialMean[stratum];
    const share = load > 0 ? gain / load : 0;
    const last = lastShare[stratum];
    lastShare[stratum] = share;
    if (share < END_OF_PRIMARY || to < earliest[stratum] - SAME_DATE) return;
    const way = last >= END_OF_PRIMARY || to === from ? 0 : (END_OF_PRIMARY - last) / (share - last);
    const reached = Math.max(from + way * (to - from), earliest[stratum]);
    endOfPrimary[stratum] = Math.max(reached - column.timeZero, SAME_DATE);
  };

  return {
    beforeChange(date, state) {
      removals.forEach(([start], removal) => {
        if (Math.abs(start - date) > SAME_DATE) return;
        strata.forEach((cells, stratum) => {
          before[removal][stratum] = meanOver(cells, thickness, state.stress);
        });
      });
    },
    afterChange(date, total, state) {
      strata.forEach((_, stratum) => {
        if (Number.isNaN(endOfPrimary[stratum])) watch(stratum, date, date, total, state);
        removals.forEach(([, end], removal) => {
          if (Math.abs(end - date) > SAME_DATE) return;
          const after = meanAtRest(stratum, total, state.settlement);
          const { reductionFloor, reductionExponent } = law;
          const reduced = reductionAfterSurcharge(
            before[removal][stratum],
            after,
            reductionFloor,
            reductionExponent,
          );
          if (reduced < reduction[stratum]) reduction[stratum] = reduced;
        });
      });
    },
    advance(from, to, total, state) {
      let added = 0;
      strata.forEach((cells, stratum) => {
        if (Number.isNaN(endOfPrimary[stratum])) watch(stratum, from, to, total, state);
        const since = Math.max(endOfPrimary[stratum], from - column.timeZero);
        const until = to - column.timeZero;
        if (!(until > since)) return;
        const logTime = reduction[stratum] * ln(until / since);
        for (let i = cells.first; i < cells.end; i += 1) {
          const ofState = state.largest[i] >= yieldStress[i] ? 1 : law.rateBeforeYield[i];
          added += thickness[i] * law.rate[i] * ofState * logTime;
        }
      });
      state.secondary += added;
      state.settlement += column.settlementFactor * added;
    },
  };
}

/** Start and end of each removal: of lifts, of surface loads, and the end of a vacuum. */
function removalsOf(column: Column): (readonly [number, number])[] {
  const periods = column.loads.map((load) => load.period);
  if (column.vacuum !== null) periods.push(column.vacuum.period);
  return periods
    .filter((period) => period.removalStart < Infinity)
    .map((period) => [period.removalStart, period.removalEnd] as const);
}

/** The cells of a stratum, which lie next to each other: from `first` to before `end`. */
interface Stratum {
  readonly first: number;
  readonly end: number;
  readonly thickness: number;
}

function strataOf(column: Column, law: SecondaryLaw): Stratum[] {
  return Array.from({ length: law.strata }, (_, stratum) => {
    const first = law.stratum.indexOf(stratum);
    const end = law.stratum.lastIndexOf(stratum) + 1;
    let thickness = 0;
    for (let i = first; i < end; i += 1) thickness += column.cells.thickness[i];
    return { first, end, thickness };
  });
}

function meanOver(stratum: Stratum, thickness: Float64Array, values: Float64Array): number {
  let sum = 0;
  for (let i = stratum.first; i < stratum.end; i += 1) sum += thickness[i] * values[i];
  return sum / stratum.thickness;
}

/** End of the last lift that adds a tenth or more to the stratum's mean load; time zero where none does. */
function earliestEndOfPrimary(column: Column, law: SecondaryLaw, stratum: number, cells: Stratum): number {
  const means = column.loads.map((load) => meanOver(cells, column.cells.thickness, load.stress));
  const { vacuum } = column;
  let earliest = column.timeZero;
  column.loads.forEach((lift, index) => {
    if (lift.kind !== 'lift') return;
    let loadBefore = 0;
    column.loads.forEach((load, other) => {
      const share = other === index ? 0 : actingShare(load.period, lift.period.start, -1);
      loadBefore += (load.kind === 'standing' ? share - 1 : share) * means[other];
    });
    if (vacuum !== null && law.reachedByVacuum[stratum]) {
      loadBefore += vacuum.pressure * actingShare(vacuum.period, lift.period.start, -1);
    }
    const counts = means[index] > 0 && means[index] >= LIFT_THAT_COUNTS * loadBefore;
    if (counts) earliest = Math.max(earliest, lift.period.end);
  });
  return earliest;
}
