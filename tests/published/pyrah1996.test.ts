/**
 * Pyrah (1996), One-dimensional consolidation of layered soils, Géotechnique 46(3):555–560 (type of problem): two
 * soils of equal c_v, of which B is ten times as permeable and as compressible as A. A solution that scales by c_v
 * alone would give the homogeneous curve for both. Computed, by an eigenfunction expansion and a finite-volume
 * solution that agree to 5e-7.
 * Tolerance: that of a numerical solution on the fine grid, 5e-4 (the method statement allows 5e-3 on the
 * working grid).
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

const A_OVER_B_LAYERS = [
  { thickness: 1.0, cv: 1.0, modulus: 1 / 0.0001 },
  { thickness: 1.0, cv: 1.0, modulus: 1 / 0.001 },
];
const A_OVER_B_DEPTHS = [0.5, 1.0, 1.5, 2.0];
/** Time in years, U by settlement, u/u0 at the depths. */
const A_OVER_B: readonly (readonly [number, number, readonly number[]])[] = [
  [0.05, 0.022938, [0.886155, 0.999715, 1.0, 1.0]],
  [0.1, 0.032439, [0.737099, 0.995391, 0.999855, 0.999997]],
  [0.2, 0.045915, [0.585228, 0.9793, 0.996767, 0.999431]],
  [0.5, 0.075062, [0.48224, 0.941013, 0.973308, 0.983417]],
  [1, 0.117652, [0.453567, 0.896325, 0.929032, 0.940003]],
  [2, 0.196661, [0.41285, 0.816037, 0.845851, 0.855867]],
  [5, 0.39371, [0.311583, 0.615874, 0.638375, 0.645934]],
  [10, 0.620699, [0.19493, 0.385297, 0.399373, 0.404103]],
];

describe('Pyrah 1996, equal c_v, the tight one at the drain', () => {
  const given = { linear: A_OVER_B_LAYERS, base: 'closed' } as const;
  const whole = linearConsolidation({ ...given, horizon: A_OVER_B[A_OVER_B.length - 1][0] });
  it.each(A_OVER_B)('after %f years the degree by settlement is %f', (time, degree) => {
    expect(Math.abs(whole.degreeAt(time) - degree)).toBeLessThan(ON_FINE_GRID);
  });

  it.each(A_OVER_B.map(([time, , profile]) => [time, profile] as const))(
    'after %f years the excess pore pressure over depth is %j of the initial one',
    (time, profile) => {
      const { porePressureAt } = linearConsolidation({ ...given, horizon: time });
      A_OVER_B_DEPTHS.forEach((depth, i) => {
        expect(Math.abs(porePressureAt(depth) - profile[i])).toBeLessThan(ON_FINE_GRID);
      });
    },
  );
});
const B_OVER_A_LAYERS = [
  { thickness: 1.0, cv: 1.0, modulus: 1 / 0.001 },
  { thickness: 1.0, cv: 1.0, modulus: 1 / 0.0001 },
];
const B_OVER_A_DEPTHS = [0.5, 1.0, 1.5, 2.0];
/** Time in years, U by settlement, u/u0 at the depths. */
const B_OVER_A: readonly (readonly [number, number, readonly number[]])[] = [
  [0.05, 0.229376, [0.886152, 0.997154, 0.999996, 1.0]],
  [0.1, 0.324385, [0.735796, 0.953914, 0.998552, 0.999972]],
  [0.2, 0.458351, [0.556381, 0.793009, 0.967667, 0.994308]],
  [0.5, 0.700097, [0.283921, 0.426195, 0.735888, 0.834921]],
  [1, 0.87749, [0.107127, 0.167367, 0.378333, 0.455703]],
  [2, 0.976555, [0.019462, 0.031238, 0.081529, 0.100674]],
  [5, 0.999808, [0.000158, 0.000254, 0.00068, 0.000843]],
  [10, 1.0, [0.0, 0.0, 0.0, 0.0]],
];

describe('Pyrah 1996, equal c_v, the permeable one at the drain', () => {
  const given = { linear: B_OVER_A_LAYERS, base: 'closed' } as const;
  const whole = linearConsolidation({ ...given, horizon: B_OVER_A[B_OVER_A.length - 1][0] });
  it.each(B_OVER_A)('after %f years the degree by settlement is %f', (time, degree) => {
    expect(Math.abs(whole.degreeAt(time) - degree)).toBeLessThan(ON_FINE_GRID);
  });

  it.each(B_OVER_A.map(([time, , profile]) => [time, profile] as const))(
    'after %f years the excess pore pressure over depth is %j of the initial one',
    (time, profile) => {
      const { porePressureAt } = linearConsolidation({ ...given, horizon: time });
      B_OVER_A_DEPTHS.forEach((depth, i) => {
        expect(Math.abs(porePressureAt(depth) - profile[i])).toBeLessThan(ON_FINE_GRID);
      });
    },
  );
});
