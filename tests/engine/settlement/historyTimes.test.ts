import { describe, expect, it } from 'vitest';
import { historyTimes } from '../../../engine/settlement/historyTimes.ts';
import { plainModel, type Plain } from './plainModel.ts';

const plain: Plain = {
  layers: [{ thickness: 6, soil: { modulus: 1000, cv: 1 } }],
  lifts: [
    { thickness: 1, placing: [0.5, 0.75] },
    { thickness: 1, placing: [1, 1.25], removal: [3, 3.25] },
  ],
  loads: [{ pressure: 10, start: 4, end: 60 }],
  handover: 2.2,
  outputTimes: [0.6, 2.2, 7.77, 30],
  horizon: 30,
};
const times = [...historyTimes(plainModel(plain))];

describe('the history times', () => {
  it('rise and lie between the first event and the horizon', () => {
    for (let i = 1; i < times.length; i += 1) expect(times[i]).toBeGreaterThan(times[i - 1]);
    expect(times[0]).toBe(0.5);
    expect(times[times.length - 1]).toBe(30);
  });

  it('include every event, the output dates, handover and 30 days after it', () => {
    for (const date of [0.5, 0.75, 1, 1.25, 3, 3.25, 4, 0.6, 2.2, 7.77, 30, 2.2 + 30 / 365.25]) {
      expect(times).toContain(date);
    }
  });

  it('are about 80 between the events', () => {
    expect(times.length).toBeGreaterThan(70);
    expect(times.length).toBeLessThan(120);
  });
});
