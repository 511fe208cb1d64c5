import type { Model } from '../project/model.ts';
import { thicknessAt, thicknessNumber } from '../project/thicknessAt.ts';
import { median } from '../marginals/marginal.ts';

/** A layer as it lies under one point: depths in m below the ground as found. */
export interface LayerAt {
  /** Place in `Model.layers`. */
  readonly layer: number;
  /** Place in `Model.soils`. */
  readonly soil: number;
  readonly top: number;
  readonly base: number;
}

/**
 * Layers under x from the top down, those without thickness there left out.
 *
 * @param valueOf the value to take for each layer's uncertain number; the median when left out
 */
export function layersAt(
  model: Model,
  x: number,
  valueOf: (layer: number) => number = (layer) =>
    median(thicknessNumber(model.layers[layer].thickness).marginal),
): LayerAt[] {
  const found: LayerAt[] = [];
  let top = 0;
  model.layers.forEach((layer, index) => {
    const base = top + thicknessAt(layer.thickness, x, valueOf(index));
    if (base - top > THINNEST) found.push({ layer: index, soil: layer.soil, top, base });
    top = base;
  });
  return found;
}

/** A layer thinner than this (m) has thinned out. */
const THINNEST = 1e-6;
