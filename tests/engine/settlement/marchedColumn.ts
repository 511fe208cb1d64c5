import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { assembleColumn, type Resolution } from '../../../engine/settlement/assembleColumn.ts';
import type { Column } from '../../../engine/settlement/column.ts';
import { consolidationTime } from '../../../engine/settlement/consolidationTime.ts';
import { march } from '../../../engine/settlement/march.ts';
import { WORKING_RESOLUTION } from '../../../engine/settlement/realise.ts';
import { valueAtDate } from '../../../engine/settlement/settlementHistory.ts';
import { intervalsOf } from '../../../engine/settlement/timeGrid.ts';
import type { Track } from '../../../engine/settlement/track.ts';
import { plainModel, type Plain } from './plainModel.ts';

/** Eight times the cells and steps of everyday work. */
export const FINE: Resolution = { cells: 8 * WORKING_RESOLUTION.cells, steps: 8 * WORKING_RESOLUTION.steps };

/** What the engine gives for one column: its track, and the settlement at any date. */
export interface Marched {
  readonly column: Column;
  readonly track: Track;
  /** m */
  readonly settlementAt: (date: number) => number;
}

/** The column of a model's first point as the engine assembles it. */
export function columnOf(plain: Plain, resolution: Resolution = FINE, point = 0): Column {
  const model = plainModel(plain);
  const column = assembleColumn(model, centralGround(model), point, 0, resolution);
  if (column === null) throw new RangeError('columnOf: the model must have ground and a load');
  return column;
}

export function marched(column: Column, resolution: Resolution = FINE): Marched {
  const grid = intervalsOf(column, resolution.steps, consolidationTime(column));
  const [track] = march([column], [grid]);
  return { column, track, settlementAt: (date) => valueAtDate(track, track.settlement, date) };
}

/** A plain model's first point, assembled and marched. */
export function marchedModel(plain: Plain, resolution: Resolution = FINE): Marched {
  return marched(columnOf(plain, resolution), resolution);
}

/** Date at which the mean excess pore pressure of a column of clay under one sudden load has fallen to 5 % of it, by halving. */
export function endOfPrimary(plain: Plain, resolution: Resolution = FINE): number {
  const leftAt = (horizon: number) => {
    const { column, track } = marchedModel({ ...plain, horizon }, resolution);
    let [sum, whole] = [0, 0];
    column.cells.thickness.forEach((thickness, i) => {
      if (column.free[i] === 1) return;
      // u = σ′v0 + Δσ − σ′
      sum += thickness * (column.law.initialStress[i] + column.loads[0].stress[i] - track.final.stress[i]);
      whole += thickness * column.loads[0].stress[i];
    });
    return sum / whole;
  };
  let [low, high] = [1e-4, 1e4];
  for (let i = 0; i < 30; i += 1) {
    const middle = Math.sqrt(low * high);
    if (leftAt(middle) > 0.05) low = middle;
    else high = middle;
  }
  return high;
}
