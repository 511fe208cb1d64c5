/**
 * Heriot-Watt University, Foundation Engineering class examples 11, 13 and 15 (Consolidation 4, 6 and 8).
 * Examples 13 and 15: table of T and U as printed (the same as Taylor 1948), read in the solution sheets; printed to
 * 0.001 in T, which is 0.002 in U. T60 is printed 0.287 here and 0.286 elsewhere; the series gives 0.28636.
 * Example 15: inputs and table read, the printed answer not visible: 37.3 mm is the series with times counted from
 * the middle of construction; tolerance 0.5 mm.
 * Example 11: inputs read, printed answer not visible: the trapezoidal sum 135.5 kPa·m gives 27.1 mm; tolerance
 * 0.05 mm.
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, solved, linearColumn } from './linearConsolidation.ts';

/** T, U. */
const TABLE: readonly (readonly [number, number])[] = [
  [0.008, 0.1],
  [0.031, 0.2],
  [0.071, 0.3],
  [0.126, 0.4],
  [0.197, 0.5],
  [0.287, 0.6],
  [0.403, 0.7],
  [0.567, 0.8],
  [0.848, 0.9],
];

describe('Heriot-Watt class examples 13 and 15, printed time factors', () => {
  const { degreeAt } = linearConsolidation({ linear: [{ thickness: 2, cv: 1 }], horizon: 1 });
  it.each(TABLE)('at T = %f the degree is %f', (timeFactor, degree) => {
    expect(Math.abs(degreeAt(timeFactor) - degree)).toBeLessThan(0.002);
  });
});

describe('Heriot-Watt class example 15, a later settlement from one reading', () => {
  it('25 mm in May 2010 of 65 mm in the end, built evenly from May 2005 to May 2007, become 37.3 mm in May 2015', () => {
    // the c_v that gives the reading is found on the engine itself, by halving
    const settlement = (cv: number, year: number) => {
      const column = linearColumn(
        {
          linear: [{ thickness: 2, cv }],
          loads: [],
          lifts: [{ thickness: 5, placing: [2005, 2007] }],
          horizon: 2015,
        },
        { cells: 120, steps: 48 },
      );
      return 65 * solved(column, { cells: 120, steps: 48 }).degreeAt(year);
    };
    let [low, high] = [1e-3, 1];
    for (let i = 0; i < 25; i += 1) {
      const middle = 0.5 * (low + high);
      if (settlement(middle, 2010) < 25) low = middle;
      else high = middle;
    }
    expect(Math.abs(settlement(high, 2015) - 37.3)).toBeLessThan(0.5);
  });
});

describe('Heriot-Watt class example 11, settlement from a profile of stress', () => {
  it('stresses of 50, 40, 30, 15, 3 and 0 kPa at 0, 1, 2, 3, 6 and 10 m on m_v = 0.2 m²/MN settle 27.1 mm', () => {
    const depths = [0, 1, 2, 3, 6, 10];
    const stresses = [50, 40, 30, 15, 3, 0];
    const stressAt = (z: number) => {
      const below = depths.findIndex((depth) => depth >= z);
      const share = (z - depths[below - 1]) / (depths[below] - depths[below - 1]);
      return stresses[below - 1] + share * (stresses[below] - stresses[below - 1]);
    };
    // layers between the given depths, so that cells meet the bends of the profile
    const linear = depths
      .slice(1)
      .map((depth, i) => ({ thickness: depth - depths[i], modulus: 5000, cv: 100 }));
    const { settlementAt } = linearConsolidation({ linear, horizon: 100, shape: (z) => stressAt(z) / 100 });
    expect(Math.abs(1000 * settlementAt(100) - 27.1)).toBeLessThan(0.05);
  });
});
