import { permeabilityAt } from '../ground/permeabilityLaw.ts';
import { WATER_UNIT_WEIGHT } from '../units.ts';
import type { Column } from './column.ts';

/** Coefficients of the flow of water out of the cells, per kPa and year. */
export interface Flow {
  /** Between cell i − 1 and cell i, m/(kPa year); first entry to the top boundary, last to the base. */
  readonly between: Float64Array;
  /** Into the drains, m/(kPa year). */
  readonly radial: Float64Array;
}

/**
 * Fills `flow` for given strains: vertically two half cells in a row between middles,
 * k_v/γw · (1+e0)/(1+e) over the original distance; radially 8 k_h/(γw μ de²) · (1+e)/(1+e0) times the
 * original thickness, with μ = μ_s + π z (2l − z) k_h/q_w. The void ratio that flow is computed with is not
 * taken below 0.1. A free-draining cell has no resistance.
 *
 * @param state gives the strain, and the largest σ' for the factor before first yield
 * @param drained whether the drains act
 */
export function flowCoefficients(
  column: Column,
  state: { readonly strain: Float64Array; readonly stress: Float64Array; readonly largest: Float64Array },
  drained: boolean,
  flow: Flow,
): void {
  const { permeability, free } = column;
  const { strain, stress, largest } = state;
  const { thickness } = column.cells;
  const { between, radial } = flow;
  const drains = drained ? column.drains : null;
  const cells = strain.length;
  let resistanceAbove = 0;
  let openAbove = column.topDrained;
  for (let i = 0; i < cells; i += 1) {
    radial[i] = 0;
    if (free[i] === 1) {
      between[i] = resistanceAbove > 0 && openAbove ? 1 / resistanceAbove : 0;
      resistanceAbove = 0;
      openAbove = true;
      continue;
    }
    const vertical = permeabilityAt(permeability, i, strain[i], stress[i], largest[i]);
    const volume =
      permeability.sensitivity[i] === 0 ? 1 : Math.max(1 - strain[i], permeability.leastVolume[i]);
    const half = (0.5 * thickness[i] * volume * WATER_UNIT_WEIGHT) / vertical;
    between[i] = openAbove ? 1 / (resistanceAbove + half) : 0;
    resistanceAbove = half;
    openAbove = true;
    if (drains !== null && drains.reached[i] > 0) {
      const horizontal = vertical * permeability.horizontalRatio[i];
      const factor = drains.factor + drains.wellResistance[i] * horizontal;
      radial[i] = (thickness[i] * drains.reached[i] * drains.conductance * horizontal * volume) / factor;
    }
  }
  between[cells] = column.baseDrained && resistanceAbove > 0 ? 1 / resistanceAbove : 0;
}
