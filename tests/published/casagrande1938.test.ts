/**
 * Casagrande (1938) and Taylor (1948): T = (π/4) U² up to 60 %, T = 1.781 − 0.933 log(100 − U%) beyond, as quoted
 * on a question page. Values of U by both branches, five digits; they are fits, and lie up to 0.00365 (first) and
 * 0.00012 (second, up to 95 %) from the series.
 * Tolerance: those errors and 5e-4 for the numerical solution.
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

/** Tv, U by the square root. */
const FIRST_BRANCH: readonly (readonly [number, number])[] = [
  [0.05, 0.25231],
  [0.1, 0.35682],
  [0.2, 0.50463],
  [0.28, 0.59708],
];
/** Tv, U by the logarithm; beyond 95 % the fit is no worse. */
const SECOND_BRANCH: readonly (readonly [number, number])[] = [
  [0.3, 0.61332],
  [0.4, 0.69789],
  [0.6, 0.81558],
  [0.848, 0.9],
  [1.0, 0.93128],
  [1.5, 0.97999],
];

const { degreeAt } = linearConsolidation({ linear: [{ thickness: 2, cv: 1 }], horizon: 2 });

describe('Casagrande 1938, usual approximations', () => {
  it.each(FIRST_BRANCH)('at Tv = %f the parabola gives %f', (timeFactor, degree) => {
    expect(Math.abs(degreeAt(timeFactor) - degree)).toBeLessThan(0.00365 + ON_FINE_GRID);
  });

  it.each(SECOND_BRANCH)('at Tv = %f the logarithm gives %f', (timeFactor, degree) => {
    expect(Math.abs(degreeAt(timeFactor) - degree)).toBeLessThan(0.00012 + ON_FINE_GRID);
  });
});
