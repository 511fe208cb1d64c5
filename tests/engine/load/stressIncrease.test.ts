import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { liftPressure } from '../../../engine/load/fillSection.ts';
import { rectangleInfluence, stressIncrease } from '../../../engine/load/stressIncrease.ts';

const ENDLESS = { from: -Infinity, to: Infinity };
const lift = { crestCentre: 0, crestWidth: 10, leftSlope: 2, rightSlope: 2, thickness: 4 };
const embankment = liftPressure(lift, 20, [], 0);
const place = fc.double({ min: -30, max: 30, noNaN: true });
const depth = fc.double({ min: 0.05, max: 40, noNaN: true });
const seeded = { seed: 1935, numRuns: 300 };

describe('the stress increase', () => {
  it('of an embankment is that of a strip and two triangles', () => {
    const triangles = [
      [{ x1: -13, q1: 0, x2: -5, q2: 80 }],
      [{ x1: -5, q1: 80, x2: 5, q2: 80 }],
      [{ x1: 5, q1: 80, x2: 13, q2: 0 }],
    ];
    fc.assert(
      fc.property(place, depth, (x, z) => {
        const sum = triangles.reduce((all, pieces) => all + stressIncrease(pieces, ENDLESS, false, x, z), 0);
        expect(stressIncrease(embankment, ENDLESS, false, x, z)).toBeCloseTo(sum, 6);
      }),
      seeded,
    );
  });

  it('is between nothing and the largest pressure', () => {
    fc.assert(
      fc.property(place, depth, (x, z) => {
        const found = stressIncrease(embankment, ENDLESS, false, x, z);
        expect(found).toBeGreaterThan(0);
        expect(found).toBeLessThanOrEqual(80 + 1e-9);
      }),
      seeded,
    );
  });

  it('carries the whole weight at every depth', () => {
    for (const z of [1, 5, 15]) {
      // x = 13 tan(a): the ends of the integral lie at infinity
      const steps = 4000;
      let sum = 0;
      for (let i = 0; i < steps; i += 1) {
        const angle = Math.PI * ((i + 0.5) / steps - 0.5);
        const x = 13 * Math.tan(angle);
        sum +=
          stressIncrease(embankment, ENDLESS, false, x, z) * ((13 * Math.PI) / steps / Math.cos(angle) ** 2);
      }
      expect(sum / (80 * 18)).toBeCloseTo(1, 4);
    }
  });

  it('comes to the pressure itself at the surface', () => {
    for (const [x, pressure] of [
      [0, 80],
      [-9, 40],
      [20, 0],
    ]) {
      expect(stressIncrease(embankment, ENDLESS, false, x, 1e-7)).toBeCloseTo(pressure, 4);
      expect(stressIncrease(embankment, ENDLESS, false, x, 0)).toBeCloseTo(pressure, 9);
    }
  });

  it('is the pressure at all depths under a wide fill', () => {
    expect(stressIncrease(embankment, ENDLESS, true, 0, 30)).toBeCloseTo(80, 9);
  });

  it('of a long fill is that of an endless one', () => {
    for (const z of [1, 5, 15]) {
      const long = stressIncrease(embankment, { from: -2e3, to: 2e3 }, false, 4, z);
      expect(long / stressIncrease(embankment, ENDLESS, false, 4, z)).toBeCloseTo(1, 4);
    }
  });

  it('at the end of a fill is half of that within it', () => {
    const strip = [{ x1: -5, q1: 80, x2: 5, q2: 80 }];
    for (const z of [0.5, 5, 15]) {
      const end = { from: -Infinity, to: 0 };
      const ratio = (pieces: typeof strip) =>
        stressIncrease(pieces, end, false, 2, z) / stressIncrease(pieces, ENDLESS, false, 2, z);
      expect(ratio(strip)).toBeCloseTo(0.5, 12);
      // slopes are taken as 64 narrow rectangles
      expect(ratio(embankment)).toBeCloseTo(0.5, 4);
    }
  });

  it('of the two halves of a fill that is cut across is that of the whole', () => {
    const across = stressIncrease(embankment, { from: -7, to: 3 }, false, 1, 4);
    const near = stressIncrease(embankment, { from: -7, to: -2 }, false, 1, 4);
    const far = stressIncrease(embankment, { from: -2, to: 3 }, false, 1, 4);
    expect(near + far).toBeCloseTo(across, 9);
  });

  it('below the middle of a square is four times that below a corner of its quarter', () => {
    const whole = rectangleInfluence(-3, 3, { from: -3, to: 3 }, 0, 5);
    expect(whole).toBeCloseTo(4 * rectangleInfluence(0, 3, { from: 0, to: 3 }, 0, 5), 12);
  });
});
