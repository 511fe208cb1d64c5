import type { Model } from '../project/model.ts';
import type { CompressibleSoil, IndexOrRatio, Soil } from '../project/soil.ts';
import type { UncertainNumber } from '../project/uncertainNumber.ts';
import { thicknessAt, thicknessNumber } from '../project/thicknessAt.ts';
import { median } from '../marginals/marginal.ts';

/**
 * Whole median thickness of a soil: the sum of the median thicknesses of all its layers, mean over the
 * points of the section. Over it the variance of the soil's parameters is averaged, so that cutting a layer
 * in two changes nothing.
 *
 * @param soil place in `Model.soils`
 * @returns thickness, m; 0 for a soil without a layer
 */
export function soilThickness(model: Model, soil: number): number {
  let sum = 0;
  for (const point of model.points) {
    for (const layer of model.layers) {
      if (layer.soil !== soil) continue;
      sum += thicknessAt(layer.thickness, point.x, median(thicknessNumber(layer.thickness).marginal));
    }
  }
  return model.points.length > 0 ? sum / model.points.length : 0;
}

/** Every number of a soil, in the order of its parameters. */
export function numbersOfSoil(soil: Soil): UncertainNumber[] {
  switch (soil.behaviour) {
    case 'compressible':
      return numbersOfCompressibleSoil(soil);
    case 'stiff_free_draining':
      return [soil.unitWeight, soil.modulus];
    case 'stiff_poorly_draining':
      return [soil.unitWeight, soil.modulus, soil.verticalCoefficient, soil.horizontalRatio];
  }
}

function numbersOfCompressibleSoil(soil: CompressibleSoil): UncertainNumber[] {
  const indices = [soil.recompression, soil.swelling, soil.secondary].filter(
    (index): index is IndexOrRatio => index !== null,
  );
  const permeability = soil.permeability;
  return [
    soil.unitWeight,
    soil.compressionIndex,
    ...indices.map((index) => index.number),
    soil.initialVoidRatio,
    ...numbersOfPreconsolidation(soil),
    permeability.kind === 'cv' ? permeability.verticalCoefficient : permeability.permeability,
    ...(permeability.permeabilityIndex === null ? [] : [permeability.permeabilityIndex]),
    soil.horizontalRatio,
    soil.preYieldFactor,
  ];
}

function numbersOfPreconsolidation({ preconsolidation }: CompressibleSoil): UncertainNumber[] {
  switch (preconsolidation.kind) {
    case 'ocr':
      return [preconsolidation.ocr];
    case 'pop':
      return [preconsolidation.pop];
    case 'profile':
      return [preconsolidation.upper.stress, preconsolidation.lower.stress];
  }
}
