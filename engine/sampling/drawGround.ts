import type { Model } from '../project/model.ts';
import type { UncertainNumber } from '../project/uncertainNumber.ts';
import { limits, quantile } from '../marginals/marginal.ts';
import { normalQuantile } from '../marginals/standardNormal.ts';
import { randomStream } from '../random/randomStream.ts';
import type { DrawnGround, DrawnInput } from './drawnGround.ts';
import { latinHypercube } from './latinHypercube.ts';
import { imposeRankCorrelation } from './rankCorrelation.ts';
import { samplingDesign, type SamplingDesign, type Variation } from './samplingDesign.ts';
import { spatialScores } from './spatialScores.ts';
import { valueAtScore } from './valueAtScore.ts';

/**
 * Draws one replicate: a Latin hypercube of `count` strata over all inputs, paired to their rank
 * correlations, with the variation from place to place on top.
 *
 *     z = √(1 − v) z0 + √(v Γ²) w,   value = F⁻¹(Φ(z)) × the ratio that keeps the mean
 *
 * z0 is the normal score of the input's hypercube probability, w its `spatialScores`. The values of an
 * input depend on the seed, the replicate, the input's permanent name and the inputs before it in the
 * pairing alone. A value that the ratio carries past a limit of the marginal is set to it and counted.
 *
 * @param model the checked model
 * @param replicate number of the replicate, 0 or more
 * @param count realisations in it, 1 or more
 * @throws RangeError when replicate or count is not such a whole number
 */
export function drawGround(model: Model, replicate: number, count = 100): DrawnGround {
  if (!(Number.isSafeInteger(replicate) && replicate >= 0)) {
    throw new RangeError(`drawGround: replicate must be a whole number of at least 0, got ${replicate}`);
  }
  const design = samplingDesign(model);
  const probabilities = pairedProbabilities(model, design, replicate, count);
  const scores = spatialScores(model, design, replicate, count);
  let cutAtLimits = 0;
  const inputs = model.inputs.map((input, i): DrawnInput => {
    const variation = design.variations[i];
    if (variation === null) {
      return { varies: false, values: probabilities[i].map((p) => quantile(input.marginal, p)) };
    }
    const local = valuesAtPoints(input, variation, probabilities[i], scores[i], design.sites.ofPoint);
    cutAtLimits += local.cut;
    return { varies: true, values: local.values };
  });
  return { replicate, count, points: model.points.length, inputs, cutAtLimits };
}

/** The hypercube, one column for each input, the correlated ones rearranged by the restricted pairing. */
function pairedProbabilities(
  model: Model,
  { pairing }: SamplingDesign,
  replicate: number,
  count: number,
): Float64Array[] {
  const columns = model.inputs.map((input) =>
    latinHypercube(randomStream(model.sampling.seed, 'z', input.name, replicate), count),
  );
  const paired = imposeRankCorrelation(
    pairing.inputs.map((input) => columns[input]),
    pairing.factor,
  );
  pairing.inputs.forEach((input, j) => {
    columns[input] = paired[j];
  });
  return columns;
}

function valuesAtPoints(
  input: UncertainNumber,
  variation: Variation,
  probabilities: Float64Array,
  localScores: readonly Float64Array[],
  siteOfPoint: readonly number[],
): { values: Float64Array; cut: number } {
  const { sharedPart, localPart, ratio } = variation;
  const { low, high } = limits(input.marginal);
  const count = probabilities.length;
  const shared = probabilities.map((p) => sharedPart * normalQuantile(p));
  const values = new Float64Array(siteOfPoint.length * count);
  let cut = 0;
  siteOfPoint.forEach((site, point) => {
    for (let r = 0; r < count; r++) {
      const whole = valueAtScore(input.marginal, shared[r] + localPart * localScores[site][r]) * ratio;
      const value = Math.min(Math.max(whole, low), high);
      if (value !== whole) cut += 1;
      values[point * count + r] = value;
    }
  });
  return { values, cut };
}
