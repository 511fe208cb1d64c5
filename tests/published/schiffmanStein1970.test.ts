/**
 * Schiffman & Stein (1970), One-dimensional consolidation of layered systems, J. Soil Mech. Found. Div. ASCE
 * 96(SM4):1499–1504; data in SI after Lee, Xie & Cheung (1992). Layer data from memory: k = 2.78e-11, 8.25e-11,
 * 1.17e-11, 2.94e-11 m/s agree with c_v m_v γw within 0.4 %. The papers print figures only: the numbers are
 * computed, by an eigenfunction expansion and a finite-volume solution that agree to 4e-7.
 * Tolerance: that of a numerical solution on the fine grid, 5e-4 (the method statement allows 5e-3 on the
 * working grid).
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

const DRAINED_LAYERS = [
  { thickness: 3.05, cv: 0.00381888 * 365.25, modulus: 1 / 6.41e-5 },
  { thickness: 6.1, cv: 0.0177984 * 365.25, modulus: 1 / 4.07e-5 },
  { thickness: 9.14, cv: 0.00508896 * 365.25, modulus: 1 / 2.03e-5 },
  { thickness: 6.1, cv: 0.00636768 * 365.25, modulus: 1 / 4.07e-5 },
];
const DRAINED_DEPTHS = [1.525, 3.05, 6.1, 9.15, 13.72, 18.29, 21.34];
/** Time in days, U by settlement, u/u0 at the depths. */
const DRAINED: readonly (readonly [number, number, readonly number[]])[] = [
  [100, 0.092691, [0.919009, 0.999592, 1.0, 1.0, 1.0, 1.0, 0.993122]],
  [740, 0.252322, [0.487051, 0.831525, 0.947904, 0.982076, 0.999594, 0.935103, 0.678443]],
  [2000, 0.417916, [0.32892, 0.615659, 0.75384, 0.821627, 0.947809, 0.686109, 0.428557]],
  [2930, 0.506464, [0.273937, 0.517696, 0.640318, 0.706237, 0.858216, 0.558683, 0.335376]],
  [5000, 0.652037, [0.192026, 0.364957, 0.454385, 0.505489, 0.636513, 0.375856, 0.217068]],
  [7195, 0.757657, [0.134365, 0.255617, 0.318597, 0.354886, 0.447426, 0.256286, 0.146241]],
  [15000, 0.932396, [0.037936, 0.072144, 0.089869, 0.100001, 0.124468, 0.069872, 0.039608]],
];

describe('Schiffman & Stein 1970, four layers, drained at both ends', () => {
  const given = { linear: DRAINED_LAYERS, base: 'drained' } as const;
  const whole = linearConsolidation({ ...given, horizon: DRAINED[DRAINED.length - 1][0] / 365.25 });
  it.each(DRAINED)('after %f days the degree by settlement is %f', (time, degree) => {
    expect(Math.abs(whole.degreeAt(time / 365.25) - degree)).toBeLessThan(ON_FINE_GRID);
  });

  it.each(DRAINED.map(([time, , profile]) => [time, profile] as const))(
    'after %f days the excess pore pressure over depth is %j of the initial one',
    (time, profile) => {
      const { porePressureAt } = linearConsolidation({ ...given, horizon: time / 365.25 });
      DRAINED_DEPTHS.forEach((depth, i) => {
        expect(Math.abs(porePressureAt(depth) - profile[i])).toBeLessThan(ON_FINE_GRID);
      });
    },
  );
});
const CLOSED_LAYERS = [
  { thickness: 3.05, cv: 0.00381888 * 365.25, modulus: 1 / 6.41e-5 },
  { thickness: 6.1, cv: 0.0177984 * 365.25, modulus: 1 / 4.07e-5 },
  { thickness: 9.14, cv: 0.00508896 * 365.25, modulus: 1 / 2.03e-5 },
  { thickness: 6.1, cv: 0.00636768 * 365.25, modulus: 1 / 4.07e-5 },
];
const CLOSED_DEPTHS = [1.525, 3.05, 6.1, 9.15, 13.72, 18.29, 21.34, 24.39];
/** Time in days, U by settlement, u/u0 at the depths. */
const CLOSED: readonly (readonly [number, number, readonly number[]])[] = [
  [740, 0.138727, [0.487051, 0.831525, 0.947904, 0.982076, 0.999953, 1.0, 1.0, 1.0]],
  [2930, 0.284158, [0.274143, 0.518419, 0.642081, 0.71064, 0.949689, 0.997078, 0.999467, 0.999851]],
  [7195, 0.441575, [0.14464, 0.27839, 0.353238, 0.406624, 0.753845, 0.94509, 0.97117, 0.979013]],
  [15000, 0.585037, [0.071213, 0.13973, 0.18212, 0.218964, 0.543867, 0.795227, 0.837389, 0.851401]],
  [30000, 0.727209, [0.039329, 0.077969, 0.103054, 0.12661, 0.353437, 0.542087, 0.574845, 0.585895]],
];

describe('Schiffman & Stein 1970, four layers, closed base', () => {
  const given = { linear: CLOSED_LAYERS, base: 'closed' } as const;
  const whole = linearConsolidation({ ...given, horizon: CLOSED[CLOSED.length - 1][0] / 365.25 });
  it.each(CLOSED)('after %f days the degree by settlement is %f', (time, degree) => {
    expect(Math.abs(whole.degreeAt(time / 365.25) - degree)).toBeLessThan(ON_FINE_GRID);
  });

  it.each(CLOSED.map(([time, , profile]) => [time, profile] as const))(
    'after %f days the excess pore pressure over depth is %j of the initial one',
    (time, profile) => {
      const { porePressureAt } = linearConsolidation({ ...given, horizon: time / 365.25 });
      CLOSED_DEPTHS.forEach((depth, i) => {
        expect(Math.abs(porePressureAt(depth) - profile[i])).toBeLessThan(ON_FINE_GRID);
      });
    },
  );
});
