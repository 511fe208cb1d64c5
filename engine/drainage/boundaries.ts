/** How the parts of a column (its layers, from the top down) drain. */
export interface DrainageOfParts {
  /** Free-draining layers joined to the top one after the other, which a vacuum lowers. */
  readonly joinedToTop: readonly boolean[];
  /** Stratum of each part: neighbouring poorly draining parts share one; −1 for a free-draining part. */
  readonly stratum: readonly number[];
  readonly strata: number;
  /** Strata that touch the drained top or a free-draining layer joined to it. */
  readonly meetsTop: readonly boolean[];
}

/**
 * Strata and the reach of a vacuum at the top. Cutting a layer in two changes no stratum.
 *
 * @param isFreeDraining of each part, from the top down
 * @param topDrained whether the top boundary is drained
 */
export function drainageOfParts(isFreeDraining: readonly boolean[], topDrained: boolean): DrainageOfParts {
  const joinedToTop: boolean[] = [];
  const stratum: number[] = [];
  const meetsTop: boolean[] = [];
  isFreeDraining.forEach((free, part) => {
    joinedToTop.push(free && (part === 0 || joinedToTop[part - 1]));
    if (free) {
      stratum.push(-1);
    } else if (part > 0 && !isFreeDraining[part - 1]) {
      stratum.push(meetsTop.length - 1);
    } else {
      stratum.push(meetsTop.length);
      meetsTop.push(part === 0 ? topDrained : joinedToTop[part - 1]);
    }
  });
  return { joinedToTop, stratum, strata: meetsTop.length, meetsTop };
}

/** A stretch of depth, m. */
export interface DepthRange {
  readonly top: number;
  readonly base: number;
}

/**
 * Outlets of a drain: its ends where they lie in a free-draining layer or at a drained boundary, and the
 * faces of every free-draining layer that it crosses.
 *
 * @param drain its upper and lower end
 * @param free the free-draining layers
 * @param column depths of the column's ends, with whether they are drained
 * @returns depths, m, within the drain
 */
export function drainOutlets(
  drain: { readonly top: number; readonly foot: number },
  free: readonly DepthRange[],
  column: { readonly base: number; readonly topDrained: boolean; readonly baseDrained: boolean },
): number[] {
  const outlets: number[] = [];
  if (column.topDrained && drain.top <= 0) outlets.push(0);
  for (const layer of free) {
    if (layer.base < drain.top || layer.top > drain.foot) continue;
    outlets.push(Math.max(layer.top, drain.top), Math.min(layer.base, drain.foot));
  }
  if (column.baseDrained && drain.foot >= column.base) outlets.push(column.base);
  return outlets;
}
