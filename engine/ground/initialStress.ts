import { WATER_UNIT_WEIGHT } from '../units.ts';
import type { LayerAt } from './layersAt.ts';

/** Lowest initial vertical effective stress, kPa. */
export const LOWEST_INITIAL_STRESS = 1;

/** What the initial stress under a point depends on. */
export interface GroundWater {
  /** Depth of the water level, m; negative for standing water above ground. */
  readonly depth: number;
  /** Excess head at the base of the lowest layer, m. */
  readonly baseExcessHead: number;
}

/**
 * σ'v0(z) = Σ γ Δz − u0(z): hydrostatic below the water level, with an excess head that grows linearly
 * from zero at the water level (from the ground, where water stands above it, because standing water has
 * no gradient) to its value at the base. The weight of standing water is in the total stress.
 * Not yet held at its floor.
 *
 * @param depth m below the ground as found, within the layers
 * @param layers layers under the point, from the top down
 * @param unitWeights bulk unit weight of each, kN/m³
 * @returns kPa
 */
export function initialEffectiveStress(
  depth: number,
  layers: readonly LayerAt[],
  unitWeights: readonly number[],
  water: GroundWater,
): number {
  let total = water.depth < 0 ? -water.depth * WATER_UNIT_WEIGHT : 0;
  for (let part = 0; part < layers.length && layers[part].top < depth; part += 1) {
    total += unitWeights[part] * (Math.min(depth, layers[part].base) - layers[part].top);
  }
  return total - initialPorePressure(depth, layers[layers.length - 1].base, water);
}

/** u0 at a depth, kPa: zero above the water level. */
export function initialPorePressure(depth: number, base: number, water: GroundWater): number {
  if (depth <= water.depth) return 0;
  const from = Math.max(0, water.depth);
  const excessHead = depth > from ? (water.baseExcessHead * (depth - from)) / (base - from) : 0;
  return WATER_UNIT_WEIGHT * (depth - water.depth + excessHead);
}
