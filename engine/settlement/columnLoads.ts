import { liftPressure, liftThicknessAt, pressureAt, type LiftShape } from '../load/fillSection.ts';
import type { ActingPeriod } from '../load/programme.ts';
import { stressIncrease } from '../load/stressIncrease.ts';
import type { Lift, Model, Period } from '../project/model.ts';
import type { UncertainNumber } from '../project/uncertainNumber.ts';
import type { AppliedLoad } from './column.ts';

/** Value of an uncertain number in the realisation and at the point at hand. */
export type ValueOf = (number: UncertainNumber) => number;

export interface ColumnLoads {
  readonly loads: readonly AppliedLoad[];
  /** A date was drawn before the one it must follow, and set equal to it. */
  readonly datesPutInOrder: boolean;
}

/** A lift's polygon in a realisation. */
export function liftShape(lift: Lift, value: ValueOf): LiftShape {
  return { ...lift, thickness: value(lift.thickness) };
}

/**
 * The loads of a realisation as they act at x: lifts in the order in which they lie on each other, then
 * surface loads.
 *
 * @param middle depths of the middles of the cells, m
 * @param waterHeight height of standing water above the ground, m
 */
export function columnLoads(
  model: Model,
  x: number,
  value: ValueOf,
  middle: Float64Array,
  waterHeight: number,
): ColumnLoads {
  let datesPutInOrder = false;
  const follow = (earlier: number, later: number) => {
    if (later < earlier) datesPutInOrder = true;
    return Math.max(earlier, later);
  };
  const periodOf = (placing: Period | null, removal: Period | null): ActingPeriod => {
    const start = placing === null ? -Infinity : value(placing.start);
    const end = placing === null ? -Infinity : follow(start, value(placing.end));
    const removalStart = removal === null ? Infinity : follow(end, value(removal.start));
    const removalEnd = removal === null ? Infinity : follow(removalStart, value(removal.end));
    return { start, end, removalStart, removalEnd };
  };
  const shapes = model.lifts.map((lift) => liftShape(lift, value));
  const periods = model.lifts.map((lift) => periodOf(lift.placing, lift.removal));
  const lifts = model.lifts.map((lift, index): AppliedLoad => {
    const below = shapes.filter(
      (_, other) => other < index && periods[other].removalEnd > Math.max(periods[index].start, -1e300),
    );
    const pieces = liftPressure(shapes[index], value(lift.unitWeight), below, waterHeight);
    return {
      kind: lift.standing ? 'standing' : 'lift',
      stress: middle.map((z) => stressIncrease(pieces, lift.outOfPlane, model.wideFill, x, z)),
      pressure: stressIncrease(pieces, lift.outOfPlane, model.wideFill, x, 0),
      thickness: liftThicknessAt(shapes[index], x),
      period: periods[index],
    };
  });
  const surface = model.surfaceLoads.map((load): AppliedLoad => {
    const pressure = value(load.pressure);
    const pieces = [{ x1: load.x1, q1: pressure, x2: load.x2, q2: pressure }];
    const start = value(load.start);
    const end = load.end === null ? Infinity : follow(start, value(load.end));
    return {
      kind: 'surface',
      stress: middle.map((z) => stressIncrease(pieces, load.outOfPlane, model.wideFill, x, z)),
      pressure: pressureAt(pieces, x),
      thickness: 0,
      period: { start, end: start, removalStart: end, removalEnd: end },
    };
  });
  return { loads: [...lifts, ...surface], datesPutInOrder };
}

/** Stress of the fills that stand already, which belongs to σ'v0, at each middle, kPa. */
export function standingStress(loads: readonly AppliedLoad[], cells: number): Float64Array {
  const stress = new Float64Array(cells);
  for (const load of loads) {
    if (load.kind === 'standing') for (let i = 0; i < cells; i += 1) stress[i] += load.stress[i];
  }
  return stress;
}

/** Date of the earliest placing, load or vacuum, years; Infinity where nothing ever acts. */
export function earliestDate(loads: readonly AppliedLoad[], vacuum: ActingPeriod | null): number {
  const starts = loads.map((load) =>
    load.kind === 'standing' ? load.period.removalStart : load.period.start,
  );
  return Math.min(...starts, vacuum === null ? Infinity : vacuum.start);
}

/** Unit weight of what holds the fill to level: as given, or that of the last lift that stays, kN/m³. */
export function topUpUnitWeight(model: Model, value: ValueOf): number {
  if (model.couplings.topUpUnitWeight !== null) return value(model.couplings.topUpUnitWeight);
  const staying = model.lifts.filter((lift) => lift.removal === null && !lift.standing);
  const last = staying.length > 0 ? staying[staying.length - 1] : model.lifts[model.lifts.length - 1];
  return last === undefined ? 0 : value(last.unitWeight);
}
