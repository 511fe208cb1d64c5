/**
 * Gray (1936), Stress distribution in elastic solids, 1st ICSMFE 2:157–168; the triangular strip also in the stress
 * chapter of Das. Closed form (1/2π)[(2x/B) α − sin 2δ], six digits, checked by quadrature.
 */
import { describe, expect, it } from 'vitest';
import { stressIncrease } from '../../engine/load/stressIncrease.ts';

const DEPTHS = [0.1, 0.25, 0.5, 1, 2];
/** x/B, σz/q at each z/B below a load of 0 at x = 0 and q at x = B. */
const TRIANGLE: readonly (readonly [number, readonly number[]])[] = [
  [-0.5, [0.000305, 0.00411, 0.021701, 0.064288, 0.089362]],
  [0.0, [0.031516, 0.074896, 0.127324, 0.159155, 0.127324]],
  [0.25, [0.250872, 0.257389, 0.262016, 0.223492, 0.143096]],
  [0.5, [0.49838, 0.47974, 0.409155, 0.274908, 0.152876]],
  [0.75, [0.737278, 0.644843, 0.472636, 0.287005, 0.154514]],
  [1.0, [0.468274, 0.422021, 0.352416, 0.25, 0.147584]],
  [1.5, [0.001252, 0.015199, 0.06222, 0.12055, 0.115384]],
];

describe('Gray 1936, pressure that grows straight from nothing', () => {
  it.each(TRIANGLE)('at x/B = %f the stress at five depths is %j of the largest pressure', (x, expected) => {
    const width = 5;
    const pieces = [{ x1: 0, q1: 0, x2: width, q2: 40 }];
    const endless = { from: -Infinity, to: Infinity };
    DEPTHS.forEach((z, i) => {
      const ratio = stressIncrease(pieces, endless, false, x * width, z * width) / 40;
      expect(Math.abs(ratio - expected[i])).toBeLessThan(1e-6);
    });
  });
});
