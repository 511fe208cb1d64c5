import { WATER_UNIT_WEIGHT } from '../units.ts';

/** The polygon of a lift in one realisation: m, slopes horizontal per vertical. */
export interface LiftShape {
  readonly crestCentre: number;
  readonly crestWidth: number;
  readonly leftSlope: number;
  readonly rightSlope: number;
  readonly thickness: number;
}

/** Pressure on the ground that runs straight from q1 at x1 to q2 at x2, kPa; x1 < x2. */
export interface PressurePiece {
  readonly x1: number;
  readonly q1: number;
  readonly x2: number;
  readonly q2: number;
}

/** Positions of a lift's left toe, left crest, right crest and right toe, m. */
export function liftCorners(lift: LiftShape): readonly [number, number, number, number] {
  const left = lift.crestCentre - 0.5 * lift.crestWidth;
  const right = lift.crestCentre + 0.5 * lift.crestWidth;
  return [left - lift.leftSlope * lift.thickness, left, right, right + lift.rightSlope * lift.thickness];
}

/** Thickness of a lift at x, m: full under the crest, straight down to the toes, 0 beyond. */
export function liftThicknessAt(lift: LiftShape, x: number): number {
  const [leftToe, left, right, rightToe] = liftCorners(lift);
  if (x < leftToe || x > rightToe) return 0;
  if (x < left) return (lift.thickness * (x - leftToe)) / (left - leftToe);
  if (x > right) return (lift.thickness * (rightToe - x)) / (rightToe - right);
  return lift.thickness;
}

/**
 * Surface pressure of a lift: unit weight times thickness, the part below standing water with γ − γw.
 *
 * @param unitWeight kN/m³
 * @param below lifts that it lies on, which decide how far it reaches into the water
 * @param waterHeight height of standing water above the ground as found, m, 0 where there is none
 * @returns pieces from left to right, those without pressure left out
 */
export function liftPressure(
  lift: LiftShape,
  unitWeight: number,
  below: readonly LiftShape[],
  waterHeight: number,
): PressurePiece[] {
  const pressureAt = (x: number) => {
    const thickness = liftThicknessAt(lift, x);
    if (!(waterHeight > 0)) return unitWeight * thickness;
    const foot = below.reduce((height, other) => height + liftThicknessAt(other, x), 0);
    return unitWeight * thickness - WATER_UNIT_WEIGHT * Math.max(0, Math.min(thickness, waterHeight - foot));
  };
  const corners = waterHeight > 0 ? bends(lift, below, waterHeight) : liftCorners(lift);
  const pieces: PressurePiece[] = [];
  for (let i = 1; i < corners.length; i += 1) {
    const [x1, x2] = [corners[i - 1], corners[i]];
    if (!(x2 > x1)) continue;
    // just inside the piece, so that an upright face has its full pressure
    const nudge = 1e-9 * (x2 - x1);
    const [q1, q2] = [pressureAt(x1 + nudge), pressureAt(x2 - nudge)];
    if (q1 > 0 || q2 > 0) pieces.push({ x1, q1, x2, q2 });
  }
  return pieces;
}

/** Where the pressure of a lift in standing water can bend: all corners, and where a surface meets the water. */
function bends(lift: LiftShape, below: readonly LiftShape[], waterHeight: number): number[] {
  const [leftToe, , , rightToe] = liftCorners(lift);
  const corners = [lift, ...below]
    .flatMap((shape) => [...liftCorners(shape)])
    .filter((x) => x >= leftToe && x <= rightToe)
    .sort((a, b) => a - b);
  const footAt = (x: number) => below.reduce((height, other) => height + liftThicknessAt(other, x), 0);
  const surfaces = [footAt, (x: number) => footAt(x) + liftThicknessAt(lift, x)];
  const crossings = surfaces.flatMap((surface) =>
    corners.slice(1).flatMap((right, index) => {
      const left = corners[index];
      const [a, b] = [surface(left) - waterHeight, surface(right) - waterHeight];
      return a * b < 0 ? [left + ((right - left) * a) / (a - b)] : [];
    }),
  );
  return [...corners, ...crossings].sort((a, b) => a - b);
}

/** Pressure at x, kPa; on an edge the larger of its two sides. */
export function pressureAt(pieces: readonly PressurePiece[], x: number): number {
  let pressure = 0;
  for (const { x1, q1, x2, q2 } of pieces) {
    if (x >= x1 && x <= x2) pressure = Math.max(pressure, q1 + ((q2 - q1) * (x - x1)) / (x2 - x1));
  }
  return pressure;
}

/** Volume of a lift per metre of embankment, m³/m. */
export function liftVolume(lift: LiftShape): number {
  return lift.thickness * (lift.crestWidth + 0.5 * lift.thickness * (lift.leftSlope + lift.rightSlope));
}
