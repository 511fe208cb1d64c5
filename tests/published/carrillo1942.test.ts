/**
 * Carrillo (1942), Simple two- and three-dimensional cases in the theory of consolidation of soils, J. Math. Phys. 21:1–5.
 * 1 − U = (1 − Uv)(1 − Ur), arithmetic to five digits. The date at which vertical flow alone has come to Uv and the
 * c_h with which radial flow alone comes to Ur at that date are found on the engine; then both act in one march.
 * Tolerance: 5e-4 for each of the two numerical solutions that stand behind the date.
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID, type LinearCase } from './linearConsolidation.ts';

/** Uv, Ur, U. */
const CASES: readonly (readonly [number, number, number])[] = [
  [0.3, 0.6, 0.72],
  [0.25, 0.73, 0.7975],
  [0.159, 0.881, 0.89992],
  [0.67, 0.77, 0.9241],
  [0.1, 0.9, 0.91],
  [0, 0.5, 0.5],
];

const THICKNESS = 4;
const drains = { spacing: 2, diameter: 0.1, foot: THICKNESS };

/** Where a rising function of x comes to a value, by halving on a logarithmic scale. */
function whereReached(value: number, of: (x: number) => number, low: number, high: number): number {
  for (let i = 0; i < 40; i += 1) {
    const middle = Math.sqrt(low * high);
    if (of(middle) < value) low = middle;
    else high = middle;
  }
  return high;
}

describe('Carrillo 1942, vertical and radial flow together', () => {
  it.each(CASES)('Uv = %f and Ur = %f make U = %f', (vertical, radial, both) => {
    const cv = vertical === 0 ? 1e-9 : 1;
    const alone = linearConsolidation({ linear: [{ thickness: THICKNESS, cv: 1 }], horizon: 10 });
    const date = vertical === 0 ? 1 : whereReached(vertical, alone.degreeAt, 1e-4, 10);
    const ofRadial = (coefficient: number): LinearCase => ({
      linear: [{ thickness: THICKNESS, cv: 1e-9, horizontalRatio: coefficient * 1e9 }],
      drains,
      horizon: date,
    });
    const coarse = { cells: 16, steps: 128 };
    const ch = whereReached(
      radial,
      (c) => linearConsolidation(ofRadial(c), coarse).degreeAt(date),
      1e-3,
      1e3,
    );
    const { degreeAt } = linearConsolidation({
      linear: [{ thickness: THICKNESS, cv, horizontalRatio: ch / cv }],
      drains,
      horizon: date,
    });
    expect(Math.abs(degreeAt(date) - both)).toBeLessThan(2 * ON_FINE_GRID);
  });
});
