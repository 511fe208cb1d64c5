import { permeabilityAt } from '../ground/permeabilityLaw.ts';
import { WATER_UNIT_WEIGHT } from '../units.ts';
import type { Column } from './column.ts';

/** Coefficients of the flow of water out of the cells, per kPa and year. */
export interface Flow {
  /** Between cell i − 1 and cell i, m/(kPa year); first entry to the top boundary, last to the base. */
  readonly between: Float64Array;
  /** Into the drains, m/(kPa year). */
  readonly radial: Float64Array;
  /** Resistance of half a cell, kPa year/m, */
  readonly half: Float64Array;
  /** and the σ' that it and `radial` were last worked out for, kPa; 0 where they were not. */
  readonly knownFor: Float64Array;
  /** Whether drains acted then. */
  drained: boolean;
}

/** Change of σ', as a share of it, up to which a cell keeps its permeability. */
const KEPT = 2e-3;

export function emptyFlow(cells: number): Flow {
  const array = () => new Float64Array(cells);
  return {
    between: new Float64Array(cells + 1),
    radial: array(),
    half: array(),
    knownFor: array(),
    drained: false,
  };
}

/**
 * Fills `flow` for given strains: vertically two half cells in a row between middles,
 * k_v/γw · (1+e0)/(1+e) over the original distance; radially 8 k_h/(γw μ de²) · (1+e)/(1+e0) times the
 * original thickness, with μ = μ_s + π z (2l − z) k_h/q_w. The void ratio that flow is computed with is not
 * taken below 0.1. A free-draining cell has no resistance. A cell whose σ' has changed by less than 0.2 % keeps
 * its permeability.
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
  const { free } = column;
  const { stress } = state;
  const { between, half, knownFor } = flow;
  const cells = stress.length;
  if (flow.drained !== drained) {
    knownFor.fill(0);
    flow.drained = drained;
  }
  let resistanceAbove = 0;
  let openAbove = column.topDrained;
  for (let i = 0; i < cells; i += 1) {
    if (free[i] === 1) {
      between[i] = resistanceAbove > 0 && openAbove ? 1 / resistanceAbove : 0;
      resistanceAbove = 0;
    } else {
      if (!(Math.abs(stress[i] - knownFor[i]) <= KEPT * knownFor[i])) resistanceOf(column, state, flow, i);
      between[i] = openAbove ? 1 / (resistanceAbove + half[i]) : 0;
      resistanceAbove = half[i];
    }
    openAbove = true;
  }
  between[cells] = column.baseDrained && resistanceAbove > 0 ? 1 / resistanceAbove : 0;
}

/** Works out the resistance and the radial flow of one cell. */
function resistanceOf(
  column: Column,
  state: { readonly strain: Float64Array; readonly stress: Float64Array; readonly largest: Float64Array },
  flow: Flow,
  i: number,
): void {
  const { permeability } = column;
  const strain = state.strain[i];
  const thickness = column.cells.thickness[i];
  const vertical = permeabilityAt(permeability, i, strain, state.stress[i], state.largest[i]);
  const volume = permeability.sensitivity[i] === 0 ? 1 : Math.max(1 - strain, permeability.leastVolume[i]);
  flow.half[i] = (0.5 * thickness * volume * WATER_UNIT_WEIGHT) / vertical;
  flow.knownFor[i] = state.stress[i];
  const { drains } = column;
  if (!flow.drained || drains === null || drains.reached[i] === 0) {
    flow.radial[i] = 0;
    return;
  }
  const horizontal = vertical * permeability.horizontalRatio[i];
  const factor = drains.factor + drains.wellResistance[i] * horizontal;
  flow.radial[i] = (thickness * drains.reached[i] * drains.conductance * horizontal * volume) / factor;
}
