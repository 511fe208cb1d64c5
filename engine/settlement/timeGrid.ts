import { ln, pow } from '../elementary.ts';
import { changesOf } from '../load/programme.ts';
import type { Column } from './column.ts';

/** A stretch of time in which the rate of loading does not change, with the steps that it is marched in. */
export interface Interval {
  /** Years. */
  readonly start: number;
  readonly end: number;
  /** Steps of the coarser of the two marches. */
  readonly steps: number;
  /** Dates grow with this power of the number of the step, 2 or more. */
  readonly power: number;
}

/** Dates closer than this are one, years (about a second). */
export const SAME_DATE = 3e-8;

/** An interval is long when it lasts longer than this many times the one before. */
const PREVIOUS_LENGTHS = 4;
/** An interval shorter than this share of the time that counts needs fewer steps. */
const SHORT = 0.3;
const SHARE_OF_STEPS_IN_SHORT = 0.5;
const LEAST_POWER = 2;
/** After a load or a vacuum that comes or goes at once. */
const POWER_AFTER_SUDDEN = 3;
const MOST_POWER = 4;
/** Most steps of an interval over those of an ordinary one. */
const MOST_FACTOR = 2;

/** An interval of more consolidation times than this is cut in two after the next number of them. */
const LONGEST_WHOLE = 6;
const FIRST_PART = 4;
/** Share of the usual steps that the rest of such an interval needs. */
const SHARE_OF_STEPS_IN_REST = 0.7;
/**
 * Intervals between all dates at which something about the column changes, from its time zero to the
 * horizon: the time grid starts afresh after each.
 *
 * @param steps steps in an interval of ordinary length, 2 or more
 * @param consolidationTime a time in which the column consolidates, years: a long interval is stretched so
 *   that steps lie dense within it
 */
export function intervalsOf(column: Column, steps: number, consolidationTime: number): Interval[] {
  if (!(steps >= 2)) throw new RangeError(`intervalsOf: steps must be 2 or more, got ${steps}`);
  const { timeZero, horizon } = column;
  const changes = [
    ...column.loads.flatMap((load) => changesOf(load.period)),
    ...(column.vacuum === null ? [] : changesOf(column.vacuum.period)),
    ...(column.drains === null ? [] : [column.drains.installed]),
    column.heldUntil,
    horizon,
  ];
  const dates = changes
    .filter((date) => date > timeZero + SAME_DATE && date <= horizon)
    .sort((a, b) => a - b);
  const sudden = suddenChanges(column);
  const intervals: Interval[] = [];
  let start = timeZero;
  const add = (end: number, time: number, part = 1) => {
    const previous = intervals.length === 0 ? Infinity : start - intervals[intervals.length - 1].start;
    const ratio = (end - start) / Math.min(time, PREVIOUS_LENGTHS * previous);
    const isSudden = sudden.some((date) => Math.abs(date - start) <= SAME_DATE);
    const least = isSudden ? POWER_AFTER_SUDDEN : LEAST_POWER;
    const power = ratio > 1 ? Math.min(MOST_POWER, least + 0.3 * ln(ratio)) : least;
    const few = ratio < SHORT ? SHARE_OF_STEPS_IN_SHORT : part;
    intervals.push({
      start,
      end,
      steps: Math.max(2, Math.round(steps * few * Math.min(MOST_FACTOR, power - 1))),
      power,
    });
    start = end;
  };
  for (const end of dates) {
    if (end - start <= SAME_DATE) continue;
    if (end - start > LONGEST_WHOLE * consolidationTime) {
      add(start + FIRST_PART * consolidationTime, consolidationTime);
      add(end, FIRST_PART * consolidationTime, SHARE_OF_STEPS_IN_REST);
    } else add(end, consolidationTime);
  }
  return intervals;
}

/** Dates at which a load or a vacuum comes or goes at once. */
function suddenChanges(column: Column): number[] {
  const periods = column.loads.map((load) => load.period);
  if (column.vacuum !== null) periods.push(column.vacuum.period);
  return periods.flatMap(({ start, end, removalStart, removalEnd }) => [
    ...(end === start ? [start] : []),
    ...(removalEnd === removalStart ? [removalStart] : []),
  ]);
}

/**
 * Date at a share τ of an interval's steps: start + L τ^p. Settlement after a sudden load grows with √t, so
 * that with p = 2 it is straight in τ at first; the more steps a long interval has to span, the larger p.
 */
export function dateAt({ start, end, power }: Interval, tau: number): number {
  return tau >= 1 ? end : start + (end - start) * pow(tau, power);
}

/** The share τ of an interval's steps at a date within it: the inverse of `dateAt`. */
export function tauAt({ start, end, power }: Interval, date: number): number {
  if (date >= end) return 1;
  return date <= start ? 0 : pow((date - start) / (end - start), 1 / power);
}
