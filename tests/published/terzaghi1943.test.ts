/**
 * Terzaghi (1943), Theoretical Soil Mechanics; Taylor (1948): settlement under a load placed evenly taken as that of
 * a sudden load from the middle of its placing. Closed form, five digits. The rule is an approximation and serves
 * as a bound only: it lies above the exact degree in all these cases.
 * Tolerance: 5e-4 for the numerical solution.
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

/** Tc, Tv, exact U, U by the rule. */
const CASES: readonly (readonly [number, number, number, number])[] = [
  [0.1, 0.1, 0.23788, 0.25231],
  [0.1, 0.2, 0.43482, 0.43695],
  [0.1, 0.5, 0.73227, 0.73295],
  [0.1, 0.8, 0.8723, 0.87262],
  [0.1, 1.0, 0.92204, 0.92223],
  [0.2, 0.2, 0.33635, 0.35682],
  [0.2, 0.5, 0.69479, 0.69788],
  [0.2, 0.8, 0.85443, 0.85589],
  [0.2, 1.0, 0.91113, 0.91202],
  [0.5, 0.5, 0.52467, 0.56223],
  [0.5, 0.8, 0.77785, 0.79135],
  [0.5, 1.0, 0.86439, 0.87262],
];

describe('Terzaghi 1943, half of the construction time', () => {
  it.each(CASES)(
    "with Tc = %f at Tv = %f the degree lies at %f, not above the rule's %f",
    (end, timeFactor, exact, rule) => {
      const { degreeAt } = linearConsolidation({
        linear: [{ thickness: 2, cv: 1 }],
        loads: [],
        lifts: [{ thickness: 5, placing: [0, end] }],
        horizon: 1,
      });
      expect(Math.abs(degreeAt(timeFactor) - exact)).toBeLessThan(ON_FINE_GRID);
      expect(degreeAt(timeFactor)).toBeLessThan(rule + ON_FINE_GRID);
    },
  );
});
