import type { Resolution } from '../../engine/settlement/assembleColumn.ts';
import type { Column } from '../../engine/settlement/column.ts';
import { columnOf, FINE, marched, type Marched } from '../engine/settlement/marchedColumn.ts';
import type { Plain } from '../engine/settlement/plainModel.ts';

/**
 * How far a numerical solution may lie from a printed degree of consolidation. The method statement allows
 * 0.5 % of the final settlement on the working grid; on one with eight times as many cells and steps a
 * tenth of that is asked. Closed forms are given to more digits than either.
 */
export const ON_WORKING_GRID = 5e-3;
export const ON_FINE_GRID = 5e-4;

/** Pressure of the load, kPa. */
export const LOAD = 100;

/** A linear layer: modulus (kPa) and c_v do not change, as in Terzaghi's theory. */
export interface LinearLayer {
  readonly thickness: number;
  /** kPa; 1000 unless stated. */
  readonly modulus?: number;
  readonly cv: number;
  readonly horizontalRatio?: number;
}

export interface LinearCase extends Partial<Plain> {
  readonly linear: readonly LinearLayer[];
  readonly horizon: number;
  /** Excess pore pressure at a depth as a share of the load at once; 1 unless stated. */
  readonly shape?: (depth: number) => number;
}

/** A column of stiff, poorly draining layers under a wide load of 100 kPa put on at once, unless `loads` says otherwise. */
export function linearColumn(given: LinearCase, resolution: Resolution = FINE): Column {
  const { linear, shape, ...plain } = given;
  const column = columnOf(
    {
      loads: [{ pressure: LOAD }],
      ...plain,
      layers: linear.map(({ thickness, modulus = 1000, cv, horizontalRatio }) => ({
        thickness,
        soil: { modulus, cv, horizontalRatio },
      })),
    },
    resolution,
  );
  if (shape === undefined) return column;
  const loads = column.loads.map((load) => ({
    ...load,
    stress: column.cells.middle.map((z) => LOAD * shape(z)),
  }));
  return { ...column, loads };
}

export interface LinearSolution extends Marched {
  /** Settlement over that at rest under the whole load. */
  readonly degreeAt: (date: number) => number;
  /** u over the load at the horizon, straight between the middles of cells. */
  readonly porePressureAt: (depth: number) => number;
}

export function linearConsolidation(given: LinearCase, resolution: Resolution = FINE): LinearSolution {
  return solved(linearColumn(given, resolution), resolution);
}

export function solved(column: Column, resolution: Resolution = FINE): LinearSolution {
  const solution = marched(column, resolution);
  const { thickness, middle } = column.cells;
  let final = 0;
  for (const load of column.loads) {
    for (let i = 0; i < thickness.length; i += 1)
      final += (thickness[i] * load.stress[i]) / column.law.modulus[i];
  }
  // u = σ′v0 + Δσ − σ′ at the horizon, when all loads act in full
  const pore = solution.track.final.stress.map(
    (stress, i) =>
      column.law.initialStress[i] + column.loads.reduce((sum, load) => sum + load.stress[i], 0) - stress,
  );
  return {
    ...solution,
    degreeAt: (date) => solution.settlementAt(date) / final,
    porePressureAt(depth) {
      const below = middle.findIndex((z) => z >= depth);
      const last = middle.length - 1;
      if (below === 0) return pore[0] / LOAD;
      if (below < 0) return pore[last] / LOAD;
      const share = (depth - middle[below - 1]) / (middle[below] - middle[below - 1]);
      return (pore[below - 1] + share * (pore[below] - pore[below - 1])) / LOAD;
    },
  };
}
