import { describe, expect, it } from 'vitest';
import {
  liftCorners,
  liftPressure,
  liftThicknessAt,
  liftVolume,
  pressureAt,
} from '../../../engine/load/fillSection.ts';

const lift = { crestCentre: 5, crestWidth: 10, leftSlope: 2, rightSlope: 3, thickness: 2 };
const WATER = 9.81;

/** Force of pressure pieces, kN/m. */
function force(pieces: ReturnType<typeof liftPressure>): number {
  return pieces.reduce((sum, { x1, q1, x2, q2 }) => sum + 0.5 * (q1 + q2) * (x2 - x1), 0);
}

describe('a lift', () => {
  it('has its toes where its slopes meet the ground', () =>
    expect(liftCorners(lift)).toEqual([-4, 0, 10, 16]));

  it('is as thick as its crest under it and thins out to the toes', () => {
    expect([-5, -4, -2, 0, 5, 10, 13, 16, 17].map((x) => liftThicknessAt(lift, x))).toEqual([
      0, 0, 1, 2, 2, 2, 1, 0, 0,
    ]);
  });

  it('weighs its volume times its unit weight', () => {
    expect(liftVolume(lift)).toBe(30);
    expect(force(liftPressure(lift, 20, [], 0))).toBeCloseTo(600, 4);
  });

  it('has its full pressure under an upright face', () => {
    const pieces = liftPressure({ ...lift, leftSlope: 0, rightSlope: 0 }, 20, [], 0);
    expect(pressureAt(pieces, 0)).toBeCloseTo(40, 9);
    expect(pressureAt(pieces, 10)).toBeCloseTo(40, 9);
    expect(pressureAt(pieces, 10.01)).toBe(0);
  });
});

describe('a lift in standing water', () => {
  it('is lighter by the water that it displaces', () => {
    const height = 1.2;
    // section of the lift below the water level
    const displaced = height * (10 + (2 + 3) * (2 - 0.5 * height));
    expect(force(liftPressure(lift, 20, [], height))).toBeCloseTo(600 - WATER * displaced, 4);
  });

  it('counts with γ − γw when it is drowned', () => {
    expect(pressureAt(liftPressure(lift, 20, [], 5), 5)).toBeCloseTo(2 * (20 - WATER), 9);
  });

  it('on a lift that reaches out of the water is not lighter', () => {
    const below = { ...lift, crestWidth: 40, thickness: 3 };
    expect(pressureAt(liftPressure(lift, 20, [below], 2), 5)).toBeCloseTo(40, 9);
  });
});
