import { describe, expect, it } from 'vitest';
import { randomStream } from '../../engine/random/randomStream.ts';
import { latinHypercube } from '../../engine/sampling/latinHypercube.ts';
import { drivers, rankedInput, rankedInputs } from '../../engine/summary/drivers.ts';

/**
 * Ishigami, T. & Homma, T. (1990) An importance quantification technique in uncertainty analysis for computer
 * models; closed form in Saltelli et al. (2008). f = sin x1 + 7 sin² x2 + 0.1 x3⁴ sin x1, x uniform from −π to π.
 * The estimator takes 32 bins: within a bin E[f | x] bends, which costs at most 2 % of the share, and 20,000
 * points scatter by 0.01; tolerance 0.02, fixed beforehand.
 */
const COUNT = 20_000;
const inputs = [1, 2, 3].map((i) =>
  latinHypercube(randomStream(1990, 'ishigami', i), COUNT).map((p) => (2 * p - 1) * Math.PI),
);
const values = inputs[0].map(
  (x1, r) => Math.sin(x1) + 7 * Math.sin(inputs[1][r]) ** 2 + 0.1 * inputs[2][r] ** 4 * Math.sin(x1),
);

const found = drivers(rankedInputs(inputs.map((each, i) => rankedInput(i, each))), values);

describe('Ishigami & Homma (1990), first-order shares of the variance', () => {
  it.each([
    [1, 0.313905191147811],
    [2, 0.442411144790041],
    [3, 0],
  ])('of x%i', (i, expected) => {
    expect(Math.abs(found[i - 1].firstOrderShare - expected)).toBeLessThan(0.02);
  });
});
