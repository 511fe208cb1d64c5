import { liftCorners, liftThicknessAt, type LiftShape } from '../../engine/load/fillSection.ts';
import { centralValue } from '../../engine/project/centralValue.ts';
import type { Model } from '../../engine/project/model.ts';
import { thicknessAt, thicknessNumber } from '../../engine/project/thicknessAt.ts';

/** A point of the drawing: x along the section, height above the ground as found, both in m. */
export type Corner = readonly [x: number, height: number];

/** A closed outline of the drawing. */
export interface Outline {
  readonly name: string;
  readonly corners: readonly Corner[];
}

/** The central section: every input at the median of its marginal, in m. */
export interface SectionShape {
  readonly from: number;
  readonly to: number;
  /** Height of the highest thing drawn, and of the base of the ground (negative). */
  readonly top: number;
  readonly base: number;
  /** One for each of `Model.layers`. */
  readonly layers: readonly Outline[];
  /** One for each of `Model.lifts`. */
  readonly lifts: readonly Outline[];
  /** Height of the water level. */
  readonly water: number;
}

/**
 * The section between two ends that leave room beside all that is drawn.
 *
 * @param widest makes it at least so many times as wide as it is high, by showing more level ground
 */
export function sectionShape(model: Model, widest = 0): SectionShape {
  const shapes = model.lifts.map(liftShape);
  const [left, right] = extent(model, shapes);
  const depths = (x: number) => layerBases(model, x);
  const knots = [
    left,
    right,
    ...model.layers.flatMap(({ thickness }) => (thickness.kind === 'borings' ? [...thickness.x] : [])),
  ];
  const base = -Math.max(...knots.map((x) => depths(x)[model.layers.length - 1] ?? 0));
  const water = -centralValue(model.water.depth);
  const heights = shapes
    .flatMap((shape) => [...liftCorners(shape)])
    .map((x) => stackAt(shapes, x, shapes.length));
  const top = Math.max(0, water, ...heights);
  const lacking = Math.max(0, widest * (top - base) - (right - left));
  const [from, to] = [left - lacking / 2, right + lacking / 2];
  const xs = rising([from, to, ...knots].filter((x) => x >= from && x <= to));
  return {
    from,
    to,
    top,
    base,
    water,
    layers: model.layers.map((layer, i) => ({
      name: layer.name,
      corners: closed(
        xs.map((x): Corner => [x, -(depths(x)[i - 1] ?? 0)]),
        xs.map((x): Corner => [x, -depths(x)[i]]),
      ),
    })),
    lifts: model.lifts.map((lift, i) => ({ name: lift.name, corners: liftOutline(shapes, i) })),
  };
}

/** Height of the first `count` lifts at x, m above ground. */
export function stackAt(shapes: readonly LiftShape[], x: number, count: number): number {
  return shapes.slice(0, count).reduce((height, shape) => height + liftThicknessAt(shape, x), 0);
}

/** The polygon of a lift at its central thickness. */
export function liftShape({
  crestCentre,
  crestWidth,
  leftSlope,
  rightSlope,
  thickness,
}: Model['lifts'][number]): LiftShape {
  return { crestCentre, crestWidth, leftSlope, rightSlope, thickness: centralValue(thickness) };
}

function layerBases(model: Model, x: number): number[] {
  let depth = 0;
  return model.layers.map(({ thickness }) => {
    depth += thicknessAt(thickness, x, centralValue(thicknessNumber(thickness)));
    return depth;
  });
}

/** A lift lies on those below it; at an upright face both sides are corners. */
function liftOutline(shapes: readonly LiftShape[], index: number): Corner[] {
  const [left, , , right] = liftCorners(shapes[index]);
  const inside = shapes.slice(0, index + 1).flatMap((shape) => [...liftCorners(shape)]);
  const xs = rising(inside.filter((x) => x >= left && x <= right)).flatMap((x) => [x - EDGE, x, x + EDGE]);
  const within = xs.filter((x) => x >= left && x <= right);
  return closed(
    within.map((x): Corner => [x, stackAt(shapes, x, index + 1)]),
    within.map((x): Corner => [x, stackAt(shapes, x, index)]),
  );
}

function extent(model: Model, shapes: readonly LiftShape[]): [number, number] {
  const marks = [
    ...model.points.map(({ x }) => x),
    ...shapes.flatMap((shape) => [...liftCorners(shape)]),
    ...model.surfaceLoads.flatMap(({ x1, x2 }) => [x1, x2]),
    ...(model.drains ? [model.drains.from, model.drains.to] : []),
  ].filter((x) => Number.isFinite(x));
  const [left, right] = marks.length > 0 ? [Math.min(...marks), Math.max(...marks)] : [-10, 10];
  const room = Math.max(2, 0.06 * (right - left));
  return [left - room, right + room];
}

function closed(there: readonly Corner[], back: readonly Corner[]): Corner[] {
  return [...there, ...[...back].reverse()];
}

function rising(values: readonly number[]): number[] {
  return [...new Set(values)].sort((a, b) => a - b);
}

/** Half the width of an upright face, m. */
const EDGE = 1e-6;
