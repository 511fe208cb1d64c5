import { endOfPlacing } from '../../../engine/settlement/track.ts';
import { describe, expect, it } from 'vitest';
import {
  dateOfDegree,
  dateOfSettlementStillToCome,
  valueAtDate,
} from '../../../engine/settlement/settlementHistory.ts';
import { dateAt } from '../../../engine/settlement/timeGrid.ts';
import { FINE, marchedModel } from './marchedColumn.ts';
import type { Plain } from './plainModel.ts';

const plain: Plain = {
  layers: [{ thickness: 4, soil: { modulus: 1000, cv: 1 } }],
  lifts: [{ thickness: 5, placing: [1, 1.5] }],
  degree: 0.9,
  horizon: 21,
};
const { column, track, settlementAt } = marchedModel(plain);

describe('the settlement at a date', () => {
  it('is nothing before the first load', () => expect(settlementAt(0.5)).toBe(0));

  it('is the value of the march at each of its dates', () => {
    let offset = 0;
    for (const interval of track.intervals) {
      for (let j = 1; j <= interval.steps; j += 1) {
        const date = dateAt(interval, j / interval.steps);
        expect(settlementAt(date)).toBeCloseTo(track.settlement[offset + j], 9);
      }
      offset += interval.steps + 1;
    }
  });
});

describe('the date of a degree of consolidation', () => {
  it('is the one at which the primary settlement is that share of its drained value', () => {
    const date = dateOfDegree(track, 0.9, endOfPlacing(column), 21);
    // 100 kPa over 1000 kPa on 4 m settle 0.4 m
    expect(settlementAt(date) / 0.4).toBeCloseTo(0.9, 4);
  });

  it('is not before the end of placing, and never where it is not reached', () => {
    expect(endOfPlacing(column)).toBe(1.5);
    expect(dateOfDegree(track, 0.01, 1.5, 21)).toBe(1.5);
    const short = marchedModel({ ...plain, horizon: 2 }, FINE);
    expect(dateOfDegree(short.track, 0.9, 1.5, 2)).toBe(Infinity);
  });
});

describe('the date from which little settlement is still to come', () => {
  it('is the one at which the settlement lies that much below that at the horizon', () => {
    const date = dateOfSettlementStillToCome(track, 21, 0.02);
    expect(valueAtDate(track, track.settlement, date)).toBeCloseTo(settlementAt(21) - 0.02, 6);
  });

  it('is the first date where the settlement never lies further below', () => {
    expect(dateOfSettlementStillToCome(track, 21, 1)).toBe(1);
  });
});
