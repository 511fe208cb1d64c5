import { describe, expect, it } from 'vitest';
import { normalCumulative, normalQuantile } from '../../engine/marginals/standardNormal.ts';

/**
 * EN 1990:2002 Basis of structural design, Table C1: reliability index β and probability of failure, pf = Φ(−β).
 * Printed to two decimals; it has 2.32 and 4.27 where rounding gives 2.33 and 4.26, so those two are left out.
 * The longer figures: scipy 1.17.1, norm.sf and norm.isf, tolerance 1e-9 of the value.
 */
describe('EN 1990 (2002), Table C1', () => {
  it.each([
    [1e-1, 1.28],
    [1e-3, 3.09],
    [1e-4, 3.72],
    [1e-6, 4.75],
    [1e-7, 5.2],
  ])('a chance of %f has a reliability index of %f as printed', (chance, printed) => {
    expect(Math.abs(-normalQuantile(chance) - printed)).toBeLessThanOrEqual(0.005);
  });

  it.each([
    [1e-1, 1.2815515655],
    [1e-2, 2.326347874],
    [1e-3, 3.0902323062],
    [1e-4, 3.7190164855],
    [1e-5, 4.2648907939],
    [1e-6, 4.7534243088],
    [1e-7, 5.1993375822],
  ])('a chance of %f has the reliability index %f', (chance, index) => {
    expect(Math.abs(-normalQuantile(chance) / index - 1)).toBeLessThan(1e-9);
  });

  it.each([
    [0, 0.5],
    [0.5, 0.3085375387],
    [1, 0.1586552539],
    [1.28, 0.100272568],
    [1.5, 0.06680720127],
    [2, 0.02275013195],
    [2.32, 0.01017043867],
    [2.5, 0.006209665326],
    [3, 0.001349898032],
    [3.09, 0.001000782477],
    [3.5, 0.000232629079],
    [3.72, 9.961138898e-5],
    [3.8, 7.234804393e-5],
    [4, 3.167124183e-5],
    [4.27, 9.773648373e-6],
    [4.7, 1.300807454e-6],
    [4.75, 1.017083243e-6],
    [5, 2.866515719e-7],
    [5.2, 9.964426317e-8],
  ])('a reliability index of %f leaves the chance %f', (index, chance) => {
    expect(Math.abs(normalCumulative(-index) / chance - 1)).toBeLessThan(1e-9);
  });
});
