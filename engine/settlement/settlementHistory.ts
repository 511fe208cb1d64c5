import { DAYS_PER_YEAR } from '../units.ts';
import type { Track } from './track.ts';
import { dateAt, tauAt } from './timeGrid.ts';

/** Days over which the rate of settlement at handover is averaged. */
const RATE_DAYS = 30;

/** 30 days in years. */
export const RATE_PERIOD = RATE_DAYS / DAYS_PER_YEAR;

/**
 * Value of a track's series at a date: 0 before its first knot; between knots a cubic in the share τ of the
 * interval's steps, in which settlement is smooth, with slopes from the neighbouring knots.
 *
 * @param series one value for each knot of the track's grid
 * @param date years, not beyond the end of the last interval
 */
export function valueAtDate(track: Track, series: Float64Array, date: number): number {
  let offset = 0;
  for (const interval of track.intervals) {
    if (date <= interval.start) return offset === 0 ? 0 : series[offset - 1];
    if (date <= interval.end) return cubicBetween(series, offset, interval.steps, tauAt(interval, date));
    offset += interval.steps + 1;
  }
  return offset === 0 ? 0 : series[offset - 1];
}

function cubicBetween(series: Float64Array, offset: number, steps: number, tau: number): number {
  const position = tau * steps;
  const left = Math.min(steps - 1, Math.floor(position));
  const t = position - left;
  const at = (knot: number) => series[offset + knot];
  const slope = (knot: number) => {
    if (knot === 0) return steps > 1 ? -1.5 * at(0) + 2 * at(1) - 0.5 * at(2) : at(1) - at(0);
    if (knot === steps) return 1.5 * at(steps) - 2 * at(steps - 1) + 0.5 * at(steps - 2);
    return 0.5 * (at(knot + 1) - at(knot - 1));
  };
  const [a, b] = [at(left), at(left + 1)];
  const [slopeA, slopeB] = [slope(left), slope(left + 1)];
  const s = 1 - t;
  return s * s * (1 + 2 * t) * a + t * t * (3 - 2 * t) * b + s * s * t * slopeA - t * t * s * slopeB;
}

/**
 * First date from which on the settlement still to come until `horizon` is at most `limit`; the track's first
 * date where it always is.
 *
 * @param limit m
 */
export function dateOfSettlementStillToCome(track: Track, horizon: number, limit: number): number {
  const target = valueAtDate(track, track.settlement, horizon) - limit;
  return lastCrossing(track, track.settlement, horizon, (value) => value < target);
}

/**
 * First date, not before `earliest`, at which the degree of consolidation is `degree` or more; Infinity when
 * it is not by the horizon.
 */
export function dateOfDegree(track: Track, degree: number, earliest: number, horizon: number): number {
  const first = Math.max(earliest, track.intervals[0].start);
  if (valueAtDate(track, track.degree, first) >= degree) return first;
  let offset = 0;
  for (const interval of track.intervals) {
    for (let knot = 0; knot < interval.steps; knot += 1) {
      const to = dateAt(interval, (knot + 1) / interval.steps);
      if (to <= first || track.degree[offset + knot + 1] < degree) continue;
      const from = Math.max(first, dateAt(interval, knot / interval.steps));
      const date = bisect(from, to, (at) => valueAtDate(track, track.degree, at) < degree);
      return date <= horizon ? date : Infinity;
    }
    offset += interval.steps + 1;
  }
  return Infinity;
}

/** Last date at which `before` holds of the series, found between knots. */
function lastCrossing(
  track: Track,
  series: Float64Array,
  horizon: number,
  before: (value: number) => boolean,
): number {
  const knots: number[] = [];
  for (const interval of track.intervals) {
    for (let knot = 0; knot <= interval.steps; knot += 1) knots.push(dateAt(interval, knot / interval.steps));
  }
  let last = knots.length - 1;
  while (last >= 0 && (knots[last] > horizon || !before(series[last]))) last -= 1;
  if (last < 0) return knots[0];
  const until = last + 1 < knots.length ? Math.min(horizon, knots[last + 1]) : horizon;
  return bisect(knots[last], until, (date) => before(valueAtDate(track, series, date)));
}

/** The date between `from`, where `before` holds, and `to`, where it does not. */
function bisect(from: number, to: number, before: (date: number) => boolean): number {
  let [low, high] = [from, to];
  for (let i = 0; i < 40; i += 1) {
    const middle = 0.5 * (low + high);
    if (before(middle)) low = middle;
    else high = middle;
  }
  return high;
}
