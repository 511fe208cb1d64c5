import { describe, it, expect } from 'vitest';
import { quantile } from '../../../engine/marginals/marginal.ts';
import { normalCumulative } from '../../../engine/marginals/standardNormal.ts';
import { valueAtScore } from '../../../engine/sampling/valueAtScore.ts';
import {
  lognormalMarginal,
  normalMarginal,
  pertMarginal,
  tableMarginal,
  triangularMarginal,
  uniformMarginal,
} from './inventedMarginals.ts';

const MARGINALS = {
  lognormal: lognormalMarginal(1, 0.4),
  normal: normalMarginal(3, 0.7),
  'normal cut at both ends': normalMarginal(3, 0.7, 2, 4.5),
  'normal of which little is left': normalMarginal(0, 1, 2),
  uniform: uniformMarginal(1, 2),
  triangular: triangularMarginal(1, 1.2, 4),
  PERT: pertMarginal(1, 1.2, 4),
  table: tableMarginal([0.5, 0.7, 1, 3], [0, 0.3, 0.6, 1]),
};

describe('valueAtScore', () => {
  for (const [name, marginal] of Object.entries(MARGINALS)) {
    it(`is the quantile of the probability of the score, for a marginal that is ${name}`, () => {
      for (let z = -5; z <= 5; z += 0.25) {
        const expected = quantile(marginal, normalCumulative(z));
        // At z = 5 a probability next to 1 keeps ten digits of its distance from 1.
        expect(Math.abs(valueAtScore(marginal, z) / expected - 1)).toBeLessThan(1e-9);
      }
    });
  }

  it('stays finite and goes on rising where the probability itself rounds to 1', () => {
    for (const marginal of [
      MARGINALS.normal,
      MARGINALS['normal of which little is left'],
      MARGINALS.lognormal,
    ]) {
      expect(valueAtScore(marginal, 9)).toBeLessThan(Infinity);
      expect(valueAtScore(marginal, 9)).toBeGreaterThan(valueAtScore(marginal, 8.9));
    }
  });
});
