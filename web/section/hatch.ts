import type { Soil } from '../../engine/project/soil.ts';

/** A hatch of the section by its name. */
export type Hatch =
  | `compressible-${0 | 1 | 2}`
  | `stiff_free_draining-${0 | 1}`
  | `stiff_poorly_draining-${0 | 1}`
  | 'fill'
  | 'standing';

/** The hatch of a soil: by its behaviour, and among soils of one behaviour in turn. */
export function soilHatch(soils: readonly Soil[], soil: number): Hatch {
  const { behaviour } = soils[soil];
  const earlier = soils.slice(0, soil).filter((other) => other.behaviour === behaviour).length;
  const kinds = behaviour === 'compressible' ? 3 : 2;
  return `${behaviour}-${earlier % kinds}` as Hatch;
}

/** Name of the pattern in the document. */
export function hatchId(prefix: string, hatch: Hatch): string {
  return `${prefix}-${hatch}`;
}
