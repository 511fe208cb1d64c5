/**
 * Chapra & Canale, Numerical Methods for Engineers, table P20.27 (stress below a corner, Boussinesq), as printed; read
 * in a question page. I(0.7, 1.4) = 0.16199 differs from the exact 0.162003 by one unit in the last place.
 * Tolerance: one unit in the last printed place, 1.1e-5.
 */
import { describe, expect, it } from 'vitest';
import { cornerInfluence } from '../../engine/load/stressIncrease.ts';

const N = [1.2, 1.4, 1.6];
/** m, influence at each n. */
const PRINTED: readonly (readonly [number, readonly number[]])[] = [
  [0.1, [0.02926, 0.03007, 0.03058]],
  [0.2, [0.05733, 0.05894, 0.05994]],
  [0.3, [0.08323, 0.08561, 0.08709]],
  [0.4, [0.10631, 0.10941, 0.11135]],
  [0.5, [0.12626, 0.13003, 0.13241]],
  [0.6, [0.14309, 0.14749, 0.15027]],
  [0.7, [0.15703, 0.16199, 0.16515]],
  [0.8, [0.16843, 0.17389, 0.17739]],
];

describe('Chapra & Canale, table P20.27', () => {
  it.each(PRINTED)('for m = %f the influence at n = 1.2, 1.4 and 1.6 is %j', (m, expected) => {
    N.forEach((n, i) => expect(Math.abs(cornerInfluence(m, n, 1) - expected[i])).toBeLessThan(1.1e-5));
  });
});
