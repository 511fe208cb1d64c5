import { describe, expect, it } from 'vitest';
import { lognormalMoments } from '../../engine/marginals/lognormal.ts';

/**
 * Rosenblueth, E. (1975) Point estimates for probability moments, Proceedings of the National Academy of Sciences
 * 72:3812–3814. The exact moments of exp X, X normal with mean 2 and deviation 0.5, against which his two points
 * fall short by 14 % in the deviation; closed form, tolerance 1e-8.
 */
describe('Rosenblueth (1975), exact moments of exp X', () => {
  const { mean, deviation } = lognormalMoments({ kind: 'lognormal', logMean: 2, logDeviation: 0.5 });

  it('mean', () => expect(Math.abs(mean - 8.372897488)).toBeLessThan(1e-8));

  it('deviation', () => expect(Math.abs(deviation - 4.462254918)).toBeLessThan(1e-8));
});
