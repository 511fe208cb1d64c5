import type { Model } from '../project/model.ts';
import type { UncertainNumber } from '../project/uncertainNumber.ts';
import { meanKeepingRatio } from './meanKeepingRatio.ts';
import { numbersOfSoil, soilThickness } from './soilThickness.ts';
import { pairingOf, type Pairing } from './pairing.ts';
import { sitesAt, type Sites } from './variationAlongSection.ts';
import { varianceReduction } from './varianceReduction.ts';

/** What every replicate of a model has in common: the same for all replicates, found once. */
export interface SamplingDesign {
  readonly sites: Sites;
  readonly pairing: Pairing;
  /** For each of `Model.inputs`; null for one that does not vary from place to place. */
  readonly variations: readonly (Variation | null)[];
}

/**
 * z = sharedPart · z0 + localPart · w, with sharedPart = √(1 − v) and localPart = √(v Γ²); the value is
 * F⁻¹(Φ(z)) · ratio.
 */
export interface Variation {
  readonly sharedPart: number;
  readonly localPart: number;
  readonly horizontalScale: number;
  readonly ratio: number;
}

/** The design of a model; kept for as long as the model is, since finding it costs more than a replicate. */
export function samplingDesign(model: Model): SamplingDesign {
  const known = designs.get(model);
  if (known !== undefined) return known;
  const design: SamplingDesign = {
    sites: sitesAt(model.points.map((point) => point.x)),
    pairing: pairingOf(model),
    variations: variationsOf(model),
  };
  designs.set(model, design);
  return design;
}

const designs = new WeakMap<Model, SamplingDesign>();

function variationsOf(model: Model): (Variation | null)[] {
  const soilOfInput = new Map<number, number>();
  model.soils.forEach((soil, place) => {
    for (const number of numbersOfSoil(soil)) soilOfInput.set(number.index, place);
  });
  return model.inputs.map((input) => variationOf(model, input, soilOfInput.get(input.index)));
}

function variationOf(model: Model, input: UncertainNumber, soil: number | undefined): Variation | null {
  if (input.spread === null) return null;
  const { share, verticalScale, horizontalScale } = input.spread;
  if (!(share > 0 && share <= 1)) {
    throw new RangeError(
      `samplingDesign: share of ${input.name} must be above 0 and at most 1, got ${share}`,
    );
  }
  const reduction =
    verticalScale === null ? 1 : varianceReduction(thicknessOf(model, input, soil), verticalScale);
  const variance = 1 - share + share * reduction;
  return {
    sharedPart: Math.sqrt(1 - share),
    localPart: Math.sqrt(share * reduction),
    horizontalScale,
    ratio: input.keepsMean ? meanKeepingRatio(input.marginal, variance) : 1,
  };
}

function thicknessOf(model: Model, input: UncertainNumber, soil: number | undefined): number {
  if (soil === undefined) {
    throw new RangeError(
      `samplingDesign: ${input.name} must belong to a soil to have a vertical scale, got none`,
    );
  }
  return soilThickness(model, soil);
}
