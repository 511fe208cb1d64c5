import { atan } from '../elementary.ts';
import type { OutOfPlane } from '../project/model.ts';
import { pressureAt, type PressurePiece } from './fillSection.ts';

/**
 * Vertical stress increase in the elastic half-space below a pressure that varies straight from q1 at x1 to
 * q2 at x2 and goes on without end across the section. With ξ = s − x, B = (q2 − q1)/(x2 − x1),
 * A = q1 − B (x1 − x):
 *
 *     σz = (1/π) [ A (ξz/(ξ²+z²) + atan(ξ/z)) − B z³/(ξ²+z²) ]  from ξ = x1−x to ξ = x2−x
 *
 * Source: Boussinesq; integrates to the trapezoidal strip of Gray (1936) and Osterberg (1957);
 * Poulos & Davis (1974).
 *
 * @param x position of the point, m
 * @param z depth below the loaded surface, m, above 0
 * @returns kPa
 */
export function stripStress(piece: PressurePiece, x: number, z: number): number {
  const slope = (piece.q2 - piece.q1) / (piece.x2 - piece.x1);
  const level = piece.q1 - slope * (piece.x1 - x);
  return (stripTerm(piece.x2 - x, z, level, slope) - stripTerm(piece.x1 - x, z, level, slope)) / Math.PI;
}

function stripTerm(xi: number, z: number, level: number, slope: number): number {
  const square = xi * xi + z * z;
  return level * ((xi * z) / square + atan(xi / z)) - (slope * z * z * z) / square;
}

/**
 * Influence below the corner of a uniformly loaded rectangle: with m = a/z, n = b/z, R = √(m²+n²+1),
 *
 *     I = (1/2π) [ atan(mn/R) + mn (m²+n²+2) / ((1+m²)(1+n²) R) ]
 *
 * Odd in a and in b, so that any rectangle is four corners. Source: Newmark (1935).
 *
 * @param a m; may be negative
 * @param b m; may be negative or ±Infinity
 * @param z depth, m, above 0
 */
export function cornerInfluence(a: number, b: number, z: number): number {
  const m = a / z;
  if (b === Infinity || b === -Infinity)
    return ((b > 0 ? 1 : -1) * (atan(m) + m / (1 + m * m))) / (2 * Math.PI);
  const n = b / z;
  const [mm, nn] = [m * m, n * n];
  const r = Math.sqrt(mm + nn + 1);
  return (atan((m * n) / r) + (m * n * (mm + nn + 2)) / ((1 + mm) * (1 + nn) * r)) / (2 * Math.PI);
}

/** Vertical stress below a rectangle of 1 kPa from x1 to x2 and across it, seen from (x, 0). */
export function rectangleInfluence(x1: number, x2: number, across: OutOfPlane, x: number, z: number): number {
  return (
    cornerInfluence(x2 - x, across.to, z) -
    cornerInfluence(x1 - x, across.to, z) -
    cornerInfluence(x2 - x, across.from, z) +
    cornerInfluence(x1 - x, across.from, z)
  );
}

/**
 * Influence below the corner of a rectangle whose pressure grows from 0 at the corner by 1 kPa/m along a:
 *
 *     M = (b z/2π) [ 1/√(b²+z²) − z²/((a²+z²) √(a²+b²+z²)) ]
 *
 * Even in a, odd in b. By integrating Boussinesq's point load over the rectangle, which is the limit of ever
 * narrower rectangles by the corner formula.
 *
 * @returns m
 */
export function cornerInfluenceOfSlope(a: number, b: number, z: number): number {
  const near = a * a + z * z;
  if (b === Infinity || b === -Infinity) return ((b > 0 ? 1 : -1) * z * (1 - (z * z) / near)) / (2 * Math.PI);
  const inner = 1 / Math.sqrt(b * b + z * z) - (z * z) / (near * Math.sqrt(near + b * b));
  return (b * z * inner) / (2 * Math.PI);
}

/**
 * Vertical stress increase below surface pressures, kPa. A finite length across the section is the
 * superposition of narrow rectangles, carried to its limit; at z = 0 the pressure itself.
 *
 * @param across extent across the section, which lies at y = 0
 * @param wide σz = q at all depths
 */
export function stressIncrease(
  pieces: readonly PressurePiece[],
  across: OutOfPlane,
  wide: boolean,
  x: number,
  z: number,
): number {
  if (wide || !(z > 0)) return across.from < 0 && across.to > 0 ? pressureAt(pieces, x) : 0;
  if (across.from === -Infinity && across.to === Infinity) {
    let stress = 0;
    for (const piece of pieces) stress += stripStress(piece, x, z);
    return stress;
  }
  return finiteStress(pieces, across, x, z);
}

/** Pieces of finite length across the section: each its level and its slope at the point, by its two edges. */
function finiteStress(pieces: readonly PressurePiece[], across: OutOfPlane, x: number, z: number): number {
  let stress = 0;
  let edge = NaN;
  let [even, sloping] = [0, 0];
  for (const { x1, q1, x2, q2 } of pieces) {
    // the right edge of a piece is as a rule the left one of the next
    if (x1 !== edge)
      [even, sloping] = [edgeInfluence(x1 - x, across, z), edgeInfluenceOfSlope(x1 - x, across, z)];
    const [evenLeft, slopingLeft] = [even, sloping];
    even = edgeInfluence(x2 - x, across, z);
    sloping = edgeInfluenceOfSlope(x2 - x, across, z);
    edge = x2;
    const slope = (q2 - q1) / (x2 - x1);
    stress += (q1 - slope * (x1 - x)) * (even - evenLeft) + slope * (sloping - slopingLeft);
  }
  return stress;
}

function edgeInfluence(a: number, across: OutOfPlane, z: number): number {
  return cornerInfluence(a, across.to, z) - cornerInfluence(a, across.from, z);
}

function edgeInfluenceOfSlope(a: number, across: OutOfPlane, z: number): number {
  return cornerInfluenceOfSlope(a, across.to, z) - cornerInfluenceOfSlope(a, across.from, z);
}
