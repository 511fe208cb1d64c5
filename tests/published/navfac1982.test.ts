/**
 * NAVFAC DM-7.1 (1982), chapter 5: a layer is replaced by H √(c_v2/c_v1) of the other's soil (method from memory). Two
 * layers drained at both ends, 4 m (c_v = 1.5 m²/year, m_v = 0.8 m²/MN) over 6 m (0.3, 1.2). Closed form and
 * eigenfunction expansion, four digits: equivalent layer of 7.7889 m, and the exact degree by settlement, which the
 * approximation misses by 0.02 to 0.05. Tolerance: 5e-4 for the numerical solution.
 */
import { describe, expect, it } from 'vitest';
import { linearConsolidation, ON_FINE_GRID } from './linearConsolidation.ts';

const layers = [
  { thickness: 4, cv: 1.5, modulus: 1 / 0.0008 },
  { thickness: 6, cv: 0.3, modulus: 1 / 0.0012 },
];
const exact = linearConsolidation({ linear: layers, horizon: 20 });
const equivalent = linearConsolidation({ linear: [{ thickness: 7.7889, cv: 0.3 }], horizon: 20 });

describe('NAVFAC DM-7.1, equivalent thickness', () => {
  it.each([
    [1, 0.1587, 0.1776],
    [5, 0.3549, 0.3955],
    [10, 0.5013, 0.5505],
    [20, 0.6946, 0.7421],
  ])('after %f years the equivalent layer has come to %f, the two layers to %f', (years, ofOne, ofTwo) => {
    expect(Math.abs(equivalent.degreeAt(years) - ofOne)).toBeLessThan(ON_FINE_GRID);
    expect(Math.abs(exact.degreeAt(years) - ofTwo)).toBeLessThan(ON_FINE_GRID);
  });
});
