/** Where a name stands: its middle along the drawing, and its row upwards; −1 where there is no room for it. */
export interface NamePlace {
  readonly x: number;
  readonly row: number;
}

/**
 * Puts names above their marks, from left to right in the lowest of three rows that keeps them apart; a name near an edge is moved inside.
 *
 * @param marks middle and width of each name, px
 * @param width of the drawing, px
 */
export function nameRows(
  marks: readonly { readonly x: number; readonly width: number }[],
  width: number,
): NamePlace[] {
  const ends: number[] = [];
  const places: NamePlace[] = new Array<NamePlace>(marks.length);
  const order = marks.map((_, i) => i).sort((a, b) => marks[a].x - marks[b].x);
  for (const i of order) {
    const half = marks[i].width / 2;
    const x = Math.max(half, Math.min(width - half, marks[i].x));
    let row = ends.findIndex((end) => end <= x - half);
    if (row < 0 && ends.length < ROWS) row = ends.length;
    if (row >= 0) ends[row] = x + half;
    places[i] = { x, row };
  }
  return places;
}

const ROWS = 3;
