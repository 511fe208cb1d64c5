import type { SectionScale } from './sectionScale.ts';
import type { Corner } from './sectionShape.ts';

/**
 * Where a layer's name stands: near the right-hand end, in the middle of the layer's height there, or further
 * left where it is thicker; null where it is nowhere high enough for a line of text.
 *
 * @param corners the upper boundary from left to right, then the lower one back
 */
export function roomiestPlace(
  corners: readonly Corner[],
  scale: SectionScale,
): { x: number; y: number } | null {
  const half = corners.length / 2;
  const upper = corners.slice(0, half);
  const lower = corners.slice(half).reverse();
  const [left, right] = [scale.x(upper[0][0]), scale.x(upper[half - 1][0])];
  let best: { x: number; y: number; height: number } | null = null;
  for (const share of [0.78, 0.6, 0.4, 0.2, 0.05]) {
    const x = left + share * (right - left);
    const [top, base] = [heightAt(upper, x, scale), heightAt(lower, x, scale)];
    const height = base - top;
    if (height >= LINE && (!best || height > 1.5 * best.height)) best = { x, y: (top + base) / 2, height };
  }
  return best;
}

/** Least height of a layer on screen that takes its name, px. */
const LINE = 14;

function heightAt(line: readonly Corner[], x: number, scale: SectionScale): number {
  for (let i = 1; i < line.length; i += 1) {
    const [x1, x2] = [scale.x(line[i - 1][0]), scale.x(line[i][0])];
    if (x <= x2 && x2 > x1) {
      const share = (x - x1) / (x2 - x1);
      return scale.y(line[i - 1][1] + share * (line[i][1] - line[i - 1][1]));
    }
  }
  return scale.y(line[line.length - 1][1]);
}
