/**
 * Gray (1945), Simultaneous consolidation of contiguous layers of unlike compressible soils, Trans. ASCE 110 (type
 * of problem). Computed, by an eigenfunction expansion and a finite-volume solution that agree to 2e-6.
 * Tolerance: that of a numerical solution on the fine grid, 5e-4 (the method statement allows 5e-3 on the
 * working grid).
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

const SLOW_ON_TOP_LAYERS = [
  { thickness: 6.0, cv: 0.3, modulus: 1 / 0.0012 },
  { thickness: 4.0, cv: 1.5, modulus: 1 / 0.0008 },
];
const SLOW_ON_TOP_DEPTHS = [1.5, 3.0, 4.5, 6.0, 8.0, 10.0];
/** Time in years, U by settlement, u/u0 at the depths. */
const SLOW_ON_TOP: readonly (readonly [number, number, readonly number[]])[] = [
  [0.5, 0.050425, [0.99383, 1.0, 1.0, 1.0, 1.0, 1.0]],
  [1, 0.071312, [0.947192, 0.999892, 1.0, 1.0, 1.0, 1.0]],
  [2, 0.100851, [0.829096, 0.99383, 0.99996, 1.0, 1.0, 1.0]],
  [5, 0.159459, [0.613524, 0.916736, 0.990628, 0.999573, 0.999944, 0.999989]],
  [10, 0.225509, [0.459712, 0.779375, 0.934235, 0.988424, 0.99576, 0.997632]],
  [20, 0.318938, [0.33541, 0.615096, 0.81072, 0.927638, 0.952362, 0.960249]],
  [40, 0.451622, [0.242221, 0.462427, 0.642992, 0.772762, 0.803491, 0.813767]],
  [80, 0.634879, [0.157904, 0.303858, 0.426856, 0.517679, 0.539499, 0.546837]],
];

describe('Gray 1945, two layers, drained through the slow layer', () => {
  const given = { linear: SLOW_ON_TOP_LAYERS, base: 'closed' } as const;
  const whole = linearConsolidation({ ...given, horizon: SLOW_ON_TOP[SLOW_ON_TOP.length - 1][0] });
  it.each(SLOW_ON_TOP)('after %f years the degree by settlement is %f', (time, degree) => {
    expect(Math.abs(whole.degreeAt(time) - degree)).toBeLessThan(ON_FINE_GRID);
  });

  it.each(SLOW_ON_TOP.map(([time, , profile]) => [time, profile] as const))(
    'after %f years the excess pore pressure over depth is %j of the initial one',
    (time, profile) => {
      const { porePressureAt } = linearConsolidation({ ...given, horizon: time });
      SLOW_ON_TOP_DEPTHS.forEach((depth, i) => {
        expect(Math.abs(porePressureAt(depth) - profile[i])).toBeLessThan(ON_FINE_GRID);
      });
    },
  );
});
