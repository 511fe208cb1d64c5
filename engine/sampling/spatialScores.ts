import type { Model } from '../project/model.ts';
import { normalQuantile } from '../marginals/standardNormal.ts';
import { randomStream } from '../random/randomStream.ts';
import { latinHypercube } from './latinHypercube.ts';
import type { SamplingDesign } from './samplingDesign.ts';
import { variationAlongSection } from './variationAlongSection.ts';

/**
 * Standard normal scores w of what varies from place to place, in one replicate: correlated between
 * sites by exp(−2|Δx|/θh), and at a site between inputs as z0 is:
 *
 *     w_j = L_j Σ_k P_jk ε_k
 *
 * ε_k is a Latin hypercube column of normal scores for each site, sites in order of x, from the stream
 * (seed, 'w', name of input k, replicate); P the Cholesky factor of the pairing; L_j the factor over the
 * sites for the horizontal scale of input j. Correlated inputs draw their ε whether they vary themselves or
 * not, so that letting one vary leaves the others as they were.
 *
 * @returns for each of `Model.inputs` a column for each site; empty for an input that does not vary
 */
export function spatialScores(
  model: Model,
  design: SamplingDesign,
  replicate: number,
  count: number,
): Float64Array[][] {
  const { pairing, sites, variations } = design;
  const rowOf = new Map(pairing.inputs.map((input, j) => [input, j]));
  const drawn = new Map<number, Float64Array[]>();
  const ownScores = (input: number): Float64Array[] => {
    const known = drawn.get(input);
    if (known !== undefined) return known;
    const stream = randomStream(model.sampling.seed, 'w', model.inputs[input].name, replicate);
    const columns = sites.x.map(() => latinHypercube(stream, count).map((p) => normalQuantile(p)));
    drawn.set(input, columns);
    return columns;
  };
  return variations.map((variation, input) => {
    if (variation === null) return [];
    const row = rowOf.get(input);
    const independent =
      row === undefined ? ownScores(input) : weightedSum(pairing.inputs, pairing.factor[row], ownScores);
    return variationAlongSection(independent, sites.x, variation.horizontalScale);
  });
}

/** Σ_k weight_k ε_k, site by site; an ε of weight 0 is not asked for. */
function weightedSum(
  inputs: readonly number[],
  weights: ArrayLike<number>,
  scoresOf: (input: number) => Float64Array[],
): Float64Array[] {
  const parts = Array.from(weights, (weight, k) => ({ weight, input: inputs[k] })).filter(
    ({ weight }) => weight !== 0,
  );
  const sum = scoresOf(parts[0].input).map((column) => new Float64Array(column.length));
  for (const { weight, input } of parts) {
    scoresOf(input).forEach((column, site) => {
      for (let r = 0; r < column.length; r++) sum[site][r] += weight * column[r];
    });
  }
  return sum;
}
