/**
 * Terzaghi & Fröhlich (1936), Theorie der Setzung von Tonschichten; curves for half-closed layers also in Taylor
 * (1948) and Craig, Soil Mechanics. Initial excess pore pressure that grows straight from nothing at one face.
 * Closed form, six digits, checked by a finite-volume solution: rising to the closed face
 * U = 1 − 2 Σ (2 sin M/M³) exp(−M² Tv), falling to it U = 1 − 2 Σ (2/M² − 2 sin M/M³) exp(−M² Tv).
 * Tolerance: that of a numerical solution on the fine grid, 5e-4 (the method statement allows 5e-3 on the
 * working grid).
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

/** Tv, U with nothing at the drained face, U with nothing at the closed face. */
const DEGREES: readonly (readonly [number, number, number])[] = [
  [0.02, 0.04, 0.279154],
  [0.05, 0.099956, 0.40467],
  [0.1, 0.197746, 0.5159],
  [0.15, 0.288573, 0.585327],
  [0.2, 0.370386, 0.637789],
  [0.3, 0.507752, 0.71872],
  [0.4, 0.615353, 0.780411],
  [0.5, 0.699455, 0.828446],
  [0.6, 0.76517, 0.86596],
  [0.7, 0.816517, 0.895269],
  [0.8, 0.856637, 0.918169],
  [0.9, 0.887984, 0.936062],
  [1.0, 0.912477, 0.950042],
  [1.5, 0.974512, 0.985452],
];

const CV = 0.7;
const THICKNESS = 4;
const yearsOf = (timeFactor: number) => (timeFactor * THICKNESS * THICKNESS) / CV;
const halfClosed = {
  linear: [{ thickness: THICKNESS, cv: CV }],
  base: 'closed',
  horizon: yearsOf(1.5),
} as const;

describe('Terzaghi & Fröhlich 1936, nothing at the drained face', () => {
  const { degreeAt } = linearConsolidation({ ...halfClosed, shape: (z) => z / THICKNESS });
  it.each(DEGREES)('at Tv = %f the degree is %f', (timeFactor, degree) => {
    expect(Math.abs(degreeAt(yearsOf(timeFactor)) - degree)).toBeLessThan(ON_FINE_GRID);
  });
});

describe('Terzaghi & Fröhlich 1936, nothing at the closed face', () => {
  const { degreeAt } = linearConsolidation({ ...halfClosed, shape: (z) => 1 - z / THICKNESS });
  it.each(DEGREES.map(([timeFactor, , degree]) => [timeFactor, degree]))(
    'at Tv = %f the degree is %f',
    (timeFactor, degree) => {
      expect(Math.abs(degreeAt(yearsOf(timeFactor)) - degree)).toBeLessThan(ON_FINE_GRID);
    },
  );
});
