import { describe, expect, it } from 'vitest';
import { dateAt, intervalsOf, tauAt } from '../../../engine/settlement/timeGrid.ts';
import { columnOf } from './marchedColumn.ts';
import type { Plain } from './plainModel.ts';

const plain: Plain = {
  layers: [{ thickness: 6, soil: { modulus: 1000, cv: 1 } }],
  lifts: [
    { thickness: 1, placing: [0.5, 0.75] },
    { thickness: 1, placing: [1, 1], removal: [3, 3.25] },
  ],
  loads: [{ pressure: 10, start: 4, end: 6 }],
  vacuum: { pressure: 60, start: 0.6, end: 2 },
  drains: { spacing: 1, diameter: 0.1, foot: 5, installed: 0.9 },
  heldUntil: 5,
  horizon: 40,
};
const coarse = { cells: 16, steps: 8 };
const intervals = intervalsOf(columnOf(plain, coarse), 8, 2);

describe('the time grid', () => {
  it('starts afresh at every event of the column, from time zero to the horizon', () => {
    const starts = [0.5, 0.6, 0.75, 0.9, 1, 2, 3, 3.25, 4, 5, 6];
    expect(intervals.map(({ start }) => start)).toEqual(expect.arrayContaining(starts));
    expect(intervals[0].start).toBe(0.5);
    intervals.forEach(({ end }, i) => expect(end).toBe(intervals[i + 1]?.start ?? 40));
  });

  it('has the same number of steps in an interval whatever its date', () => {
    const later = columnOf({ ...plain, heldUntil: 5.1, horizon: 40.1 }, coarse);
    const shifted = intervalsOf(later, 8, 2);
    expect(shifted.length).toBe(intervals.length);
  });

  it('has dates that rise within an interval from its start to its end', () => {
    for (const interval of intervals) {
      const dates = Array.from({ length: interval.steps + 1 }, (_, j) =>
        dateAt(interval, j / interval.steps),
      );
      expect(dates[0]).toBe(interval.start);
      expect(dates[interval.steps]).toBe(interval.end);
      for (let j = 1; j < dates.length; j += 1) expect(dates[j]).toBeGreaterThan(dates[j - 1]);
    }
  });

  it('finds the share of the steps at a date by the inverse', () => {
    for (const interval of intervals) {
      for (const tau of [0, 0.1, 0.5, 0.9, 1])
        expect(tauAt(interval, dateAt(interval, tau))).toBeCloseTo(tau, 9);
    }
  });

  it('is refused with fewer than two steps', () => {
    expect(() => intervalsOf(columnOf(plain, coarse), 1, 2)).toThrow(RangeError);
    expect(() => intervalsOf(columnOf(plain, coarse), NaN, 2)).toThrow(RangeError);
  });
});
