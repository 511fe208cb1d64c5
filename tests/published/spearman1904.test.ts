import { describe, expect, it } from 'vitest';
import { drivers, rankedInput, rankedInputs } from '../../engine/summary/drivers.ts';

/**
 * Spearman, C. (1904) rank correlation, on ten points; figures computed from the definition with another library
 * (scipy 1.17.1), tolerance 1e-12.
 */
const x1 = Float64Array.of(1, 2, 3, 4, 5, 6, 7, 8, 9, 10);
const x2 = Float64Array.of(3, 1, 4, 10, 5, 9, 2, 6, 8, 7);
const y = Float64Array.of(2.1, 1.7, 4.4, 9.8, 6.9, 10.7, 5.2, 9.1, 12, 11.4);

describe('Spearman (1904), rank correlation of ten points', () => {
  it.each([
    ['x1 with y', x1, y, 0.8181818181818182],
    ['x2 with y', x2, y, 0.8545454545454544],
    ['x1 with x2', x1, x2, 0.4545454545454545],
  ])('%s', (_, a, b, expected) => {
    const [driver] = drivers(rankedInputs([rankedInput(0, a)]), b);
    expect(Math.abs(driver.rankCorrelation - expected)).toBeLessThan(1e-12);
  });
});
