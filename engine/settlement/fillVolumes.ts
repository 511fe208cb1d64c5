import { liftCorners, liftVolume } from '../load/fillSection.ts';
import type { Model } from '../project/model.ts';
import { drawnValue, type DrawnGround } from '../sampling/drawnGround.ts';
import { liftShape } from './columnLoads.ts';

/**
 * Volumes of fill of one realisation per metre of embankment, m³/m: placed in lifts (those that stand already
 * left out), and added to hold the level. The latter is known at the points only: taken straight between
 * them, from the outermost ones to nothing at the toes of the fill.
 *
 * @param toppedUp thickness of topping up at each point, m; [point][realisation]
 */
export function fillVolumes(
  model: Model,
  ground: DrawnGround,
  realisation: number,
  toppedUp: Float64Array,
): readonly [placed: number, toppingUp: number] {
  const shapes = model.lifts
    .filter((lift) => !lift.standing)
    .map((lift) => liftShape(lift, (number) => drawnValue(ground, number, 0, realisation)));
  const placed = shapes.reduce((sum, shape) => sum + liftVolume(shape), 0);
  if (shapes.length === 0) return [placed, 0];
  const left = Math.min(...shapes.map((shape) => liftCorners(shape)[0]));
  const right = Math.max(...shapes.map((shape) => liftCorners(shape)[3]));
  const known = model.points
    .map((point, index) => ({ x: point.x, added: toppedUp[index * ground.count + realisation] }))
    .filter(({ x }) => x > left && x < right)
    .sort((a, b) => a.x - b.x);
  const line = [{ x: left, added: 0 }, ...known, { x: right, added: 0 }];
  let toppingUp = 0;
  for (let i = 1; i < line.length; i += 1) {
    toppingUp += 0.5 * (line[i].x - line[i - 1].x) * (line[i].added + line[i - 1].added);
  }
  return [placed, toppingUp];
}
