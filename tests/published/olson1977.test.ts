/**
 * Olson (1977), Consolidation under time dependent loading, J. Geotech. Eng. Div. ASCE 103(GT1):55–60.
 * Closed form for a load that grows evenly until Tc and stays, U over the final load, six digits, checked by
 * quadrature of the superposition integral. The radial case with Barron's F(15) = 1.971251.
 * Tolerance: that of a numerical solution on the fine grid, 5e-4 (the method statement allows 5e-3 on the
 * working grid).
 */
import { describe, expect, it } from 'vitest';
import { linearColumn, LOAD, linearConsolidation, ON_FINE_GRID, solved } from './linearConsolidation.ts';

const TIME_FACTORS = [0.02, 0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.8, 1.0, 1.5, 2.0, 3.0];
/** Tc, U at each time factor. */
const VERTICAL: readonly (readonly [number, readonly number[]])[] = [
  [
    0.05,
    [
      0.042554, 0.168209, 0.307557, 0.471383, 0.588278, 0.678446, 0.748771, 0.803705, 0.880163, 0.92684,
      0.978695, 0.993796, 0.999474,
    ],
  ],
  [
    0.1,
    [
      0.021277, 0.084104, 0.237883, 0.434817, 0.561047, 0.657313, 0.732275, 0.790818, 0.872295, 0.922036,
      0.977296, 0.993388, 0.999439,
    ],
  ],
  [
    0.2,
    [
      0.010638, 0.042052, 0.118942, 0.33635, 0.497932, 0.60918, 0.694794, 0.761546, 0.854426, 0.911128,
      0.974119, 0.992463, 0.999361,
    ],
  ],
  [
    0.5,
    [
      0.004255, 0.016821, 0.047577, 0.13454, 0.246749, 0.378212, 0.524667, 0.635254, 0.777852, 0.864385,
      0.960507, 0.988499, 0.999025,
    ],
  ],
  [
    1.0,
    [
      0.002128, 0.00841, 0.023788, 0.06727, 0.123375, 0.189106, 0.262334, 0.341415, 0.512301, 0.694526,
      0.912446, 0.974503, 0.997838,
    ],
  ],
  [
    2.0,
    [
      0.001064, 0.004205, 0.011894, 0.033635, 0.061687, 0.094553, 0.131167, 0.170708, 0.25615, 0.347263,
      0.58739, 0.834515, 0.98617,
    ],
  ],
];

const RADIAL_TIME_FACTORS = [0.02, 0.05, 0.1, 0.2, 0.3, 0.5, 0.8];
/** Thc, Ur at each time factor. */
const RADIAL: readonly (readonly [number, readonly number[]])[] = [
  [0.05, [0.015803, 0.09493, 0.26115, 0.507615, 0.671864, 0.854269, 0.956868]],
  [0.1, [0.007901, 0.047465, 0.17804, 0.452229, 0.634954, 0.837877, 0.952017]],
  [0.3, [0.002634, 0.015822, 0.059347, 0.21009, 0.421741, 0.743185, 0.923991]],
];

/** Tv, U: half the load over T = 0 to 0.1, the other half over 0.3 to 0.4. */
const TWO_STAGES: readonly (readonly [number, number])[] = [
  [0.05, 0.042052],
  [0.1, 0.118942],
  [0.2, 0.217409],
  [0.3, 0.280523],
  [0.35, 0.348167],
  [0.4, 0.447598],
  [0.6, 0.675932],
  [1.0, 0.879297],
  [1.5, 0.96485],
];

const CV = 1.5;
const LONGEST_PATH = 2;
const yearsOf = (timeFactor: number) => (timeFactor * LONGEST_PATH * LONGEST_PATH) / CV;
const linear = [{ thickness: 2 * LONGEST_PATH, cv: CV }];
/** A lift of LOAD kPa placed from one time factor to another. */
const lift = (share: number, from: number, to: number) => ({
  thickness: (share * LOAD) / 20,
  unitWeight: 20,
  placing: [yearsOf(from), yearsOf(to)] as const,
});

describe('Olson 1977, vertical drainage, load placed evenly', () => {
  it.each(VERTICAL)('with Tc = %f the degree at thirteen time factors is %j', (end, expected) => {
    const { degreeAt } = linearConsolidation({
      linear,
      loads: [],
      lifts: [lift(1, 0, end)],
      horizon: yearsOf(3),
    });
    TIME_FACTORS.forEach((timeFactor, at) => {
      expect(Math.abs(degreeAt(yearsOf(timeFactor)) - expected[at])).toBeLessThan(ON_FINE_GRID);
    });
  });
});

describe('Olson 1977, radial drainage, load placed evenly', () => {
  const [diameter, ch] = [1.2, 3];
  const dateOf = (timeFactor: number) => (timeFactor * diameter * diameter) / ch;
  it.each(RADIAL)('with Thc = %f and n = 15 the degree at seven time factors is %j', (end, expected) => {
    const thickness = 5;
    const column = linearColumn({
      linear: [{ thickness, cv: 1e-9, horizontalRatio: ch / 1e-9 }],
      loads: [],
      lifts: [{ thickness: 5, placing: [0, dateOf(end)] }],
      drains: { spacing: diameter / 1.05, diameter: diameter / 15, foot: thickness },
      horizon: dateOf(0.8),
    });
    // the case is Barron's with his exact F(n): the factor is set to it
    const { degreeAt } = solved({ ...column, drains: { ...column.drains!, factor: 1.971251 } });
    RADIAL_TIME_FACTORS.forEach((timeFactor, at) => {
      expect(Math.abs(degreeAt(dateOf(timeFactor)) - expected[at])).toBeLessThan(ON_FINE_GRID);
    });
  });
});

describe('Olson 1977, superposed: filling in two stages', () => {
  const { degreeAt } = linearConsolidation({
    linear,
    loads: [],
    lifts: [lift(0.5, 0, 0.1), lift(0.5, 0.3, 0.4)],
    horizon: yearsOf(1.5),
  });
  it.each(TWO_STAGES)('at Tv = %f the degree over the whole load is %f', (timeFactor, degree) => {
    expect(Math.abs(degreeAt(yearsOf(timeFactor)) - degree)).toBeLessThan(ON_FINE_GRID);
  });
});
