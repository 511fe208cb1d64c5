import { drainOutlets } from '../drainage/boundaries.ts';
import {
  influenceDiameter,
  smearedDrainFactor,
  wayToOutlet,
  wellResistance,
} from '../drainage/verticalDrains.ts';
import type { Cells } from '../ground/cells.ts';
import type { LayerAt } from '../ground/layersAt.ts';
import type { Drains } from '../project/model.ts';
import { WATER_UNIT_WEIGHT } from '../units.ts';
import type { RadialDrainage } from './column.ts';
import type { ValueOf } from './columnLoads.ts';

/**
 * Drains as the cells of a column see them: which cells they reach and lead from, and how hard it is for
 * water to get there. A drain without an outlet leads nowhere and reaches nothing.
 */
export function radialDrainage(
  drains: Drains,
  value: ValueOf,
  layers: readonly LayerAt[],
  isFree: readonly boolean[],
  cells: Cells,
  ends: { readonly topDrained: boolean; readonly baseDrained: boolean },
): RadialDrainage {
  const base = layers[layers.length - 1].base;
  const foot = Math.min(drains.foot, base);
  const outlets = drainOutlets(
    { top: drains.top, foot },
    layers.filter((_, part) => isFree[part]),
    { base, ...ends },
  );
  const influence = influenceDiameter(drains.pattern, drains.spacing);
  const n = influence / drains.diameter;
  const smearDrawn = value(drains.smearRatio);
  const smear = Math.min(smearDrawn, n);
  const capacity = drains.dischargeCapacity === null ? Infinity : value(drains.dischargeCapacity);
  const count = cells.thickness.length;
  const reached = new Float64Array(count);
  const resistance = new Float64Array(count);
  for (let i = 0; i < count; i += 1) {
    if (isFree[cells.part[i]] || cells.middle[i] < drains.top || cells.middle[i] > foot) continue;
    const way = wayToOutlet(cells.middle[i], outlets, drains.top, foot);
    if (way === null) continue;
    reached[i] = 1;
    resistance[i] = wellResistance(way.distance, way.longest, capacity);
  }
  return {
    reached,
    conductance: 8 / (WATER_UNIT_WEIGHT * influence * influence),
    factor: smearedDrainFactor(n, smear, value(drains.permeabilityRatio)),
    wellResistance: resistance,
    installed: drains.installed,
    smearReachesInfluence: smearDrawn > n,
  };
}
