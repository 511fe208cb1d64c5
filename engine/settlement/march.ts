import { actingShare } from '../load/programme.ts';
import type { Column } from './column.ts';
import { secondaryCompression } from './secondaryCompression.ts';
import {
  emptyLoadState,
  emptyTotalStress,
  largestLoad,
  loadsAt,
  sameLoads,
  totalBetween,
} from './stressState.ts';
import { dateAt, SAME_DATE, type Interval } from './timeGrid.ts';
import { timeStepper } from './timeStepper.ts';
import { trackRecorder, type Track } from './track.ts';

/** Marches a batch of columns, each on its own time grid. */
export function march(columns: readonly Column[], grids: readonly (readonly Interval[])[]): Track[] {
  return columns.map((column, index) => marchColumn(column, grids[index]));
}

/**
 * Marches one column from its time zero to the horizon: at the start of each interval the loads that come or
 * go at once act, then the interval's steps follow, and after each step secondary compression.
 */
function marchColumn(column: Column, intervals: readonly Interval[]): Track {
  const cells = column.law.initialStress.length;
  const stepper = timeStepper(column);
  const { state } = stepper;
  const total = emptyTotalStress(cells);
  const [start, end] = [emptyLoadState(cells), emptyLoadState(cells)];
  const secondary = column.secondary === null ? null : secondaryCompression(column, column.secondary);
  const recorder = trackRecorder(column, intervals, state);
  let toppedUp = column.heldUntil > column.timeZero + SAME_DATE ? NaN : 0;

  for (const interval of intervals) {
    if (Number.isNaN(toppedUp) && column.heldUntil <= interval.start + SAME_DATE) toppedUp = state.settlement;
    secondary?.beforeChange(interval.start, state);
    loadsAt(column, interval.start, 1, start);
    loadsAt(column, interval.end, -1, end);
    total.vacuum = vacuumAt(column, interval.start);
    total.drained = column.drains !== null && interval.start >= column.drains.installed - SAME_DATE;
    total.largestLoad = Math.max(total.largestLoad, largestLoad(column, start, end, total.vacuum));
    totalBetween(column, start, end, 0, toppedUp, state.settlement, total);
    stepper.startAfresh(total);
    secondary?.afterChange(interval.start, total, state);
    recorder.record(interval.start, total);

    // where neither the loads nor their coupling change, neither does the total
    const steady = column.waterHeight === 0 && sameLoads(start, end);
    let from = interval.start;
    for (let j = 1; j <= interval.steps; j += 1) {
      const to = dateAt(interval, j / interval.steps);
      const share = (to - interval.start) / (interval.end - interval.start);
      if (!steady) totalBetween(column, start, end, share, toppedUp, state.settlement, total);
      stepper.advance(total, to - from, steady);
      secondary?.advance(from, to, total, state);
      recorder.record(to, total);
      from = to;
    }
  }
  return recorder.finished(Number.isNaN(toppedUp) ? state.settlement : toppedUp, stepper.notClosed);
}

/** Pressure of the vacuum just after a date, kPa. */
function vacuumAt({ vacuum }: Column, date: number): number {
  return vacuum === null ? 0 : vacuum.pressure * actingShare(vacuum.period, date, 1);
}
