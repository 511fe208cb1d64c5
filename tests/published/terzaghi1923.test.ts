/**
 * Terzaghi (1923), Die Berechnung der Durchlässigkeitsziffer des Tones; Terzaghi & Fröhlich (1936), Theorie der
 * Setzung von Tonschichten; figures as in Taylor (1948), Fundamentals of Soil Mechanics, chapter 10.
 * Closed form: U = 1 − Σ (2/M²) exp(−M² Tv), u/u0 = Σ (2/M) sin(MZ) exp(−M² Tv), M = π(2m+1)/2; six and five
 * digits, checked by a second series.
 * Tolerance: that of a numerical solution on the fine grid, 5e-4 (the method statement allows 5e-3 on the
 * working grid).
 */
import { describe, expect, it } from 'vitest';
import { WORKING_RESOLUTION } from '../../engine/settlement/realise.ts';
import { linearConsolidation, ON_FINE_GRID, ON_WORKING_GRID } from './linearConsolidation.ts';

/** Tv, U. */
const DEGREES: readonly (readonly [number, number])[] = [
  [0.001, 0.035682],
  [0.004, 0.071365],
  [0.008, 0.100925],
  [0.02, 0.159577],
  [0.031, 0.198672],
  [0.05, 0.252313],
  [0.071, 0.300666],
  [0.1, 0.356823],
  [0.126, 0.400519],
  [0.15, 0.43695],
  [0.197, 0.500338],
  [0.25, 0.562234],
  [0.287, 0.600594],
  [0.3, 0.613236],
  [0.403, 0.700111],
  [0.5, 0.76395],
  [0.567, 0.799919],
  [0.6, 0.815565],
  [0.7, 0.855893],
  [0.848, 0.899979],
  [1.0, 0.93126],
  [1.129, 0.949999],
  [1.5, 0.979982],
  [1.781, 0.989993],
  [2.0, 0.99417],
];

/** U, Tv: the inverse table. */
const TIME_FACTORS: readonly (readonly [number, number])[] = [
  [0.1, 0.00785],
  [0.2, 0.03142],
  [0.3, 0.07069],
  [0.4, 0.12567],
  [0.5, 0.19673],
  [0.6, 0.2864],
  [0.7, 0.40285],
  [0.8, 0.56716],
  [0.9, 0.84809],
  [0.95, 1.12901],
  [0.99, 1.78129],
  [0.999, 2.71449],
];

const DEPTHS = [0.25, 0.5, 0.75, 1];
/** Tv, u/u0 at Z = 0.25, 0.5, 0.75 and 1 from a drained face. */
const ISOCHRONES: readonly (readonly [number, readonly number[]])[] = [
  [0.05, [0.570805, 0.886152, 0.982217, 0.996869]],
  [0.1, [0.423759, 0.735651, 0.901279, 0.949305]],
  [0.15, [0.350565, 0.632525, 0.806618, 0.864222]],
  [0.2, [0.302084, 0.553176, 0.716227, 0.772312]],
  [0.3, [0.232923, 0.429843, 0.560907, 0.606804]],
  [0.4, [0.181655, 0.335597, 0.438401, 0.474487]],
  [0.5, [0.141899, 0.262188, 0.342557, 0.370777]],
  [0.6, [0.110868, 0.204856, 0.267657, 0.289709]],
  [0.8, [0.067684, 0.125064, 0.163404, 0.176867]],
  [1.0, [0.041321, 0.076351, 0.099758, 0.107977]],
];

const CV = 2;
const LONGEST_PATH = 3;
const yearsOf = (timeFactor: number) => (timeFactor * LONGEST_PATH * LONGEST_PATH) / CV;
const doubly = { linear: [{ thickness: 2 * LONGEST_PATH, cv: CV }], horizon: yearsOf(2.8) };

describe('Terzaghi 1923, average degree of consolidation, uniform initial excess pore pressure', () => {
  const { degreeAt } = linearConsolidation(doubly);
  it.each(DEGREES)('at Tv = %f the degree is %f', (timeFactor, degree) => {
    expect(Math.abs(degreeAt(yearsOf(timeFactor)) - degree)).toBeLessThan(ON_FINE_GRID);
  });
});

describe('Terzaghi 1923, time factor at which a degree is reached', () => {
  const { degreeAt } = linearConsolidation({
    linear: [{ thickness: LONGEST_PATH, cv: CV }],
    base: 'closed',
    horizon: yearsOf(2.8),
  });
  it.each(TIME_FACTORS)(
    'a degree of %f is reached at Tv = %f by a half-closed layer',
    (degree, timeFactor) => {
      expect(Math.abs(degreeAt(yearsOf(timeFactor)) - degree)).toBeLessThan(ON_FINE_GRID);
    },
  );
});

describe('Terzaghi 1923, isochrones', () => {
  it.each(ISOCHRONES)(
    'at Tv = %f the excess pore pressure is %j of the initial one',
    (timeFactor, expected) => {
      const { porePressureAt } = linearConsolidation({ ...doubly, horizon: yearsOf(timeFactor) });
      DEPTHS.forEach((depth, i) => {
        expect(Math.abs(porePressureAt(depth * LONGEST_PATH) - expected[i])).toBeLessThan(ON_FINE_GRID);
        const fromBase = 2 * LONGEST_PATH - depth * LONGEST_PATH;
        expect(Math.abs(porePressureAt(fromBase) - expected[i])).toBeLessThan(ON_FINE_GRID);
      });
    },
  );
});

describe('Terzaghi 1923, on the working grid', () => {
  it('the degree is met within 0.5 % of the final settlement at all twenty-five time factors', () => {
    const { degreeAt } = linearConsolidation(doubly, WORKING_RESOLUTION);
    for (const [timeFactor, degree] of DEGREES) {
      expect(Math.abs(degreeAt(yearsOf(timeFactor)) - degree)).toBeLessThan(ON_WORKING_GRID);
    }
  });
});
