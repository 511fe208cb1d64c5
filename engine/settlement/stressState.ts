import { WATER_UNIT_WEIGHT } from '../units.ts';
import { actingShare } from '../load/programme.ts';
import type { Column } from './column.ts';

/** The loads on a column at one date, on one side of it. */
export interface LoadState {
  /** σ'v0 + Δσ in each cell, kPa, without what depends on settlement. */
  readonly stress: Float64Array;
  /** Part of Δσ that comes from fill, standing fill included, kPa. */
  readonly fill: Float64Array;
  /** Pressure of the fill on the ground at the point, kPa, and its thickness there, m. */
  fillPressure: number;
  fillThickness: number;
}

/**
 * Total vertical stress less the initial pore pressure in each cell at one time, and how it answers to
 * settlement while the fill is held to level or sinks under water: total = base + slope · s.
 */
export interface TotalStress {
  /** kPa */
  readonly base: Float64Array;
  /** kPa/m */
  readonly slope: Float64Array;
  /** Whether any slope is not zero. */
  coupled: boolean;
  /** Pressure of the vacuum now acting, kPa. */
  vacuum: number;
  /** Whether drains act. */
  drained: boolean;
  /** Largest |Δσ| of the loads and the vacuum, kPa, by which the iteration of a step is judged. */
  largestLoad: number;
}

export function emptyLoadState(cells: number): LoadState {
  return {
    stress: new Float64Array(cells),
    fill: new Float64Array(cells),
    fillPressure: 0,
    fillThickness: 0,
  };
}

export function emptyTotalStress(cells: number): TotalStress {
  return {
    base: new Float64Array(cells),
    slope: new Float64Array(cells),
    coupled: false,
    vacuum: 0,
    drained: false,
    largestLoad: 0,
  };
}

/** Fills `state` with the loads just before a date (`side` −1) or just after it (1). */
export function loadsAt(column: Column, date: number, side: -1 | 1, state: LoadState): void {
  const { stress, fill } = state;
  const cells = stress.length;
  stress.set(column.law.initialStress);
  fill.fill(0);
  state.fillPressure = 0;
  state.fillThickness = 0;
  for (const load of column.loads) {
    const share = actingShare(load.period, date, side);
    // the stress of a standing fill is part of the initial stress
    const added = load.kind === 'standing' ? share - 1 : share;
    if (added !== 0) for (let i = 0; i < cells; i += 1) stress[i] += added * load.stress[i];
    if (load.kind === 'surface' || share === 0) continue;
    state.fillPressure += share * load.pressure;
    state.fillThickness += share * load.thickness;
    for (let i = 0; i < cells; i += 1) fill[i] += share * load.stress[i];
  }
}

/**
 * Fills `total` for a share of the way between the loads at two dates, between which they change evenly:
 * Δσ, and what topping up and submergence add by the placed fill's own σz/q (at most 1; all of the loss by
 * submergence, and none of the topping up, where no fill lies above the point).
 *
 * @param toppedUp thickness of topping up that no longer changes, m; NaN while the fill is held to level
 * @param settlement so far, m: decides only whether the column's top is under water, where nothing is lost
 */
export function totalBetween(
  column: Column,
  start: LoadState,
  end: LoadState,
  share: number,
  toppedUp: number,
  settlement: number,
  total: TotalStress,
): void {
  const { base, slope } = total;
  const cells = base.length;
  const between = (a: number, b: number) => a + share * (b - a);
  for (let i = 0; i < cells; i += 1) base[i] = start.stress[i] + share * (end.stress[i] - start.stress[i]);
  const pressure = between(start.fillPressure, end.fillPressure);
  const thickness = between(start.fillThickness, end.fillThickness);
  const underFill = pressure > 0;
  const holding = Number.isNaN(toppedUp);
  const topUnderWater =
    column.waterHeight > 0 && thickness + (holding ? 0 : toppedUp - settlement) < column.waterHeight;
  const belowWater = topUnderWater ? null : column.belowWater;
  const answering = underFill && holding ? column.topUpUnitWeight : 0;
  const added = underFill && !holding ? column.topUpUnitWeight * toppedUp : 0;
  total.coupled = belowWater !== null || answering !== 0;
  if (!total.coupled && added === 0) {
    slope.fill(0);
    return;
  }
  const spread = underFill && !column.wideFill;
  for (let i = 0; i < cells; i += 1) {
    const fill = start.fill[i] + share * (end.fill[i] - start.fill[i]);
    const influence = spread ? Math.min(1, fill / pressure) : 1;
    const lost = belowWater === null ? 0 : WATER_UNIT_WEIGHT * belowWater[i];
    base[i] += influence * added;
    slope[i] = influence * (answering - lost);
  }
}

/** Largest change of stress that the loads at two dates and a vacuum make in any cell, kPa. */
export function largestLoad(column: Column, start: LoadState, end: LoadState, vacuum: number): number {
  const { initialStress } = column.law;
  let largest = 0;
  for (let i = 0; i < initialStress.length; i += 1) {
    const change = Math.max(
      Math.abs(start.stress[i] - initialStress[i]),
      Math.abs(end.stress[i] - initialStress[i]),
    );
    if (change > largest) largest = change;
  }
  return largest + vacuum;
}

/** Whether two load states are the same in every cell. */
export function sameLoads(start: LoadState, end: LoadState): boolean {
  for (let i = 0; i < start.stress.length; i += 1) {
    if (start.stress[i] !== end.stress[i] || start.fill[i] !== end.fill[i]) return false;
  }
  return true;
}
