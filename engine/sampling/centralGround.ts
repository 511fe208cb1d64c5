import type { Model } from '../project/model.ts';
import { median } from '../marginals/marginal.ts';
import type { DrawnGround } from './drawnGround.ts';

/**
 * The central realisation: every input at the median of its marginal as entered, at every point, without
 * the ratio that keeps the mean. A ground of one realisation, its replicate numbered −1.
 */
export function centralGround(model: Model): DrawnGround {
  const points = model.points.length;
  return {
    replicate: -1,
    count: 1,
    points,
    inputs: model.inputs.map(({ marginal, spread }) => {
      const varies = spread !== null;
      return { varies, values: new Float64Array(varies ? points : 1).fill(median(marginal)) };
    }),
    cutAtLimits: 0,
  };
}
