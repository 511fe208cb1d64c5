import { describe, it, expect } from 'vitest';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { drawnValue } from '../../../engine/sampling/drawnGround.ts';
import { lognormalMarginal, uniformMarginal } from './inventedMarginals.ts';
import { inventedModel } from './inventedModel.ts';

describe('centralGround', () => {
  it('has every input at the median of its marginal at every point, without the ratio that keeps the mean', () => {
    const spread = { share: 1, verticalScale: 1, horizontalScale: 30 };
    const model = inventedModel({
      inputs: [
        { name: 'index', marginal: lognormalMarginal(1, 0.5), spread },
        { name: 'weight', marginal: uniformMarginal(15, 17) },
      ],
      x: [0, 10],
    });
    const ground = centralGround(model);
    expect(ground).toMatchObject({ replicate: -1, count: 1, points: 2, cutAtLimits: 0 });
    for (const point of [0, 1]) {
      // Median of a lognormal of mean 1: 1/√(1 + COV²).
      expect(drawnValue(ground, model.inputs[0], point, 0)).toBeCloseTo(1 / Math.sqrt(1.25), 14);
      expect(drawnValue(ground, model.inputs[1], point, 0)).toBe(16);
    }
  });
});
