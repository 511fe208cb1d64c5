import { strainAt } from '../ground/compressionLaw.ts';
import type { Column } from './column.ts';
import type { ColumnState } from './columnState.ts';
import type { TotalStress } from './stressState.ts';
import { SAME_DATE, type Interval } from './timeGrid.ts';

/** Settlement of a column at the knots of its time grid: the start and each step's end of each interval. */
export interface Track {
  readonly intervals: readonly Interval[];
  /** m, with the factor on settlement; interval after interval, `steps` + 1 knots each. */
  readonly settlement: Float64Array;
  /** Secondary part of it, m. */
  readonly secondary: Float64Array;
  /**
   * Primary settlement over its drained value under the load then acting: 0 before the end of placing, and kept
   * once the degree asked for is reached; empty where none is asked for.
   */
  readonly degree: Float64Array;
  /** Thickness of topping up in the end, m. */
  readonly toppedUp: number;
  readonly largestStrain: number;
  readonly leastVoidRatio: number;
  /** Steps whose iteration did not close. */
  readonly notClosed: number;
  /** State at the end. */
  readonly final: ColumnState;
}

const KNOTS_BEYOND = 2;

/** Writes down a column's settlement knot after knot. */
export function trackRecorder(column: Column, intervals: readonly Interval[], state: ColumnState) {
  const knots = intervals.reduce((sum, interval) => sum + interval.steps + 1, 0);
  const settlement = new Float64Array(knots);
  const secondary = new Float64Array(knots);
  const degree = new Float64Array(Number.isNaN(column.degree) ? 0 : knots);
  // it is asked for from the end of placing on, until it is reached
  const asked = endOfPlacing(column) - SAME_DATE;
  let knotsReached = 0;
  let knot = 0;
  return {
    /** @param total the total stress at the knot, on which the degree of consolidation depends */
    record(date: number, total: TotalStress): void {
      settlement[knot] = state.settlement;
      secondary[knot] = column.settlementFactor * state.secondary;
      if (degree.length > 0) {
        // two knots more than needed, so that the curve between knots is not bent where it is read
        if (knotsReached > KNOTS_BEYOND) degree[knot] = degree[knot - 1];
        else if (date >= asked) degree[knot] = degreeOfConsolidation(column, total, state);
        if (degree[knot] >= column.degree) knotsReached += 1;
      }
      knot += 1;
    },
    finished: (toppedUp: number, notClosed: number): Track => ({
      intervals,
      settlement,
      secondary,
      degree,
      toppedUp,
      ...extremes(column, state),
      notClosed,
      final: state,
    }),
  };
}

/** Primary settlement over what it comes to at rest under the load now acting. */
function degreeOfConsolidation(column: Column, total: TotalStress, state: ColumnState): number {
  const { thickness } = column.cells;
  let now = 0;
  let drained = 0;
  for (let i = 0; i < thickness.length; i += 1) {
    const vacuum = column.reachedByVacuum[i] === 1 ? total.vacuum : 0;
    const atRest = total.base[i] + total.slope[i] * state.settlement + vacuum;
    now += thickness[i] * state.strain[i];
    drained += thickness[i] * strainAt(column.law, i, atRest, state.largest[i]);
  }
  return drained > 0 ? now / drained : 0;
}

function extremes(column: Column, state: ColumnState) {
  let largestStrain = 0;
  let leastVoidRatio = Infinity;
  for (let i = 0; i < state.strain.length; i += 1) {
    const strain = strainAt(column.law, i, state.largest[i], state.largest[i]);
    largestStrain = Math.max(largestStrain, strain);
    const volume = column.initialVolume[i];
    if (volume > 0) leastVoidRatio = Math.min(leastVoidRatio, volume * (1 - strain) - 1);
  }
  return { largestStrain, leastVoidRatio };
}

/** End of the last placing of a lift on the column, years; its time zero where there is none. */
export function endOfPlacing(column: Column): number {
  const ends = column.loads.filter((load) => load.kind === 'lift').map((load) => load.period.end);
  return Math.max(column.timeZero, ...ends);
}
