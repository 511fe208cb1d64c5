import { cos, ln } from '../elementary.ts';
import type { LayerAt } from './layersAt.ts';

/** A column of finite volumes that meet the layer faces. Arrays over the cells, from the top down. */
export interface Cells {
  /** Depth of the upper face, m below the ground as found. */
  readonly top: Float64Array;
  /** m */
  readonly thickness: Float64Array;
  /** Depth of the middle, m. */
  readonly middle: Float64Array;
  /** Place in the list of layers that it was made from. */
  readonly part: Int32Array;
}

/** A stretch of the column that cells must not straddle. */
interface Stretch {
  readonly part: number;
  readonly top: number;
  readonly base: number;
  readonly cells: number;
  readonly graded: Grading;
}

/** Share of the grading at the two faces of a stretch; 0 where cells need not be finer. */
interface Grading {
  readonly top: number;
  readonly base: number;
}

const FREE_DRAINING_CELLS = 3;
const FEWEST_CELLS = 5;
const FEWEST_CELLS_AT_DRAINED_FACE = 8;
/** Pore pressures bend most next to a drained face, less where two soils meet. */
const AT_DRAINED_FACE = 0.9;
const WHERE_SOILS_MEET = 0.6;

/**
 * Cells of a column: layers are cut at `cuts` (ends of drains) and each stretch is graded towards its
 * faces, most towards a drained one and the ground's surface, not at all towards a closed base.
 *
 * @param layers layers under the point, from the top down
 * @param isFreeDraining whether the pore pressure of each layer is given; such a layer needs few cells
 * @param cuts depths at which a cell must end, m
 * @param count cells aimed at over all the layers that drain poorly, 8 or more
 * @param baseDrained whether the base of the column drains
 */
export function cells(
  layers: readonly LayerAt[],
  isFreeDraining: readonly boolean[],
  cuts: readonly number[],
  count: number,
  baseDrained: boolean,
): Cells {
  if (!(count >= 8)) throw new RangeError(`cells: count must be 8 or more, got ${count}`);
  const stretches = stretchesOf(layers, isFreeDraining, cuts, count, baseDrained);
  const total = stretches.reduce((sum, stretch) => sum + stretch.cells, 0);
  const column: Cells = {
    top: new Float64Array(total),
    thickness: new Float64Array(total),
    middle: new Float64Array(total),
    part: new Int32Array(total),
  };
  let cell = 0;
  for (const { part, top, base, cells: inStretch, graded } of stretches) {
    let upper = top;
    for (let j = 1; j <= inStretch; j += 1, cell += 1) {
      const lower = j === inStretch ? base : top + (base - top) * gradedFraction(j / inStretch, graded);
      column.top[cell] = upper;
      column.thickness[cell] = lower - upper;
      column.middle[cell] = 0.5 * (lower + upper);
      column.part[cell] = part;
      upper = lower;
    }
  }
  return column;
}

/** Cosine between two graded faces, a parabola from one, uniform between none; blended with uniform. */
function gradedFraction(fraction: number, { top, base }: Grading): number {
  if (top > 0 && base > 0) {
    const share = Math.max(top, base);
    return (1 - share) * fraction + share * 0.5 * (1 - cos(Math.PI * fraction));
  }
  if (top > 0) return (1 - top) * fraction + top * fraction * fraction;
  if (base > 0) return (1 - base) * fraction + base * fraction * (2 - fraction);
  return fraction;
}

/** √(thickness · ln of how much the depth grows over it): strain changes most where stresses are small. */
function weightOf({ top, base }: LayerAt): number {
  return Math.sqrt((base - top) * ln((base + 1) / (top + 1)));
}

function stretchesOf(
  layers: readonly LayerAt[],
  isFreeDraining: readonly boolean[],
  cuts: readonly number[],
  count: number,
  baseDrained: boolean,
): Stretch[] {
  const weights = layers.map((layer, part) => (isFreeDraining[part] ? 0 : weightOf(layer)));
  const whole = weights.reduce((sum, weight) => sum + weight, 0);
  const refinement = Math.max(1, count / 60);
  const last = layers.length - 1;
  const gradingBetween = (neighbour: number, endDrained: boolean) => {
    if (neighbour < 0 || neighbour > last) return endDrained ? AT_DRAINED_FACE : 0;
    return isFreeDraining[neighbour] ? AT_DRAINED_FACE : WHERE_SOILS_MEET;
  };
  return layers.flatMap((layer, part) => {
    const faces = [layer.top, ...cuts.filter((cut) => cut > layer.top && cut < layer.base), layer.base];
    faces.sort((a, b) => a - b);
    return faces.slice(1).map((base, index): Stretch => {
      const top = faces[index];
      if (isFreeDraining[part]) {
        const wanted = Math.ceil(FREE_DRAINING_CELLS * refinement);
        return { part, top, base, cells: wanted, graded: { top: 0, base: 0 } };
      }
      const graded = {
        // stresses are smallest at the ground's surface, drained or not
        top: index > 0 ? WHERE_SOILS_MEET : gradingBetween(part - 1, true),
        base: index < faces.length - 2 ? WHERE_SOILS_MEET : gradingBetween(part + 1, baseDrained),
      };
      const isAtDrainedFace = Math.max(graded.top, graded.base) === AT_DRAINED_FACE;
      const fewest = isAtDrainedFace ? FEWEST_CELLS_AT_DRAINED_FACE : FEWEST_CELLS;
      const share = (weights[part] / whole) * Math.sqrt((base - top) / (layer.base - layer.top));
      return {
        part,
        top,
        base,
        cells: Math.max(Math.ceil(fewest * refinement), Math.round(count * share)),
        graded,
      };
    });
  });
}
