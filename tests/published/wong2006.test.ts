/**
 * Wong (2006, 2010), preload design for creep: Cα′/Cα = (1 − m) exp[−n (OCR − 1)] + m with m = 0.1, n = 6, after data of
 * Ladd (1989) and Stewart et al. (1994). Formula and constants from memory, medium confidence (data scatter by about
 * 50 % about the curve); the values are its evaluation, 1e-4.
 */
import { describe, expect, it } from 'vitest';
import { reductionAfterSurcharge } from '../../engine/settlement/secondaryCompression.ts';

describe('Wong 2006, rate of secondary compression after a surcharge', () => {
  it.each([
    [1, 1.0],
    [1.05, 0.7667],
    [1.1, 0.5939],
    [1.15, 0.4659],
    [1.2, 0.3711],
    [1.3, 0.2488],
    [1.4, 0.1816],
    [1.5, 0.1448],
  ])('with an overconsolidation ratio of %f the rate is %f of that before', (ratio, expected) => {
    expect(Math.abs(reductionAfterSurcharge(80 * ratio, 80, 0.1, 6) - expected)).toBeLessThan(1e-4);
  });
});
