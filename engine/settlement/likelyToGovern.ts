import { initialEffectiveStress } from '../ground/initialStress.ts';
import { layersAt } from '../ground/layersAt.ts';
import { liftCorners } from '../load/fillSection.ts';
import { actingShare, changesOf } from '../load/programme.ts';
import type { Model } from '../project/model.ts';
import { thicknessNumber } from '../project/thicknessAt.ts';
import { drawnValue, type DrawnGround } from '../sampling/drawnGround.ts';
import { assembleColumn } from './assembleColumn.ts';
import type { Column } from './column.ts';
import { liftShape, type ValueOf } from './columnLoads.ts';

/** Bearing factor of the undrained strip on soft ground. */
const BEARING_FACTOR = 5.14;
/** s_u / σ'p (Mesri 1975). */
const STRENGTH_OVER_PRECONSOLIDATION = 0.22;
const WANTED_SAFETY = 1.5;
/** Base width over thickness of soft soil below which spreading is likely to matter (common practice). */
const NARROW_BASE = 4;
/** Effective stress below which seepage is likely to govern, kPa. */
const LOW_EFFECTIVE_STRESS = 5;
const LOOK = { cells: 60, steps: 8 };

/** What is not computed but likely to govern in one realisation (method statement, section 9). */
export interface LikelyToGovern {
  readonly stability: boolean;
  readonly spreading: boolean;
  readonly seepage: boolean;
}

/**
 * Looks for what this program does not compute at every settling point of the central realisation:
 * stability where 5.14 · 0.22 σ'p (mean over the soft soil to a depth of half the base width) is below 1.5
 * times the fill's pressure at any stage; spreading where the fill's base is narrower than four times the
 * soft soil's thickness; seepage where the base head brings σ' at any depth below 5 kPa.
 */
export function likelyToGovern(model: Model, ground: DrawnGround): LikelyToGovern {
  const width = baseWidth(model, ground);
  let [stability, spreading, seepage] = [false, false, false];
  model.points.forEach((_, point) => {
    const column = assembleColumn(model, ground, point, 0, LOOK);
    if (column === null) return;
    const soft = softThickness(model, ground, point);
    const pressure = largestFillPressure(column);
    if (pressure > 0 && soft > 0) {
      const strength = STRENGTH_OVER_PRECONSOLIDATION * meanPreconsolidation(column, 0.5 * width);
      if (BEARING_FACTOR * strength < WANTED_SAFETY * pressure) stability = true;
      if (width < NARROW_BASE * soft) spreading = true;
    }
    if (headLowersStress(model, ground, point)) seepage = true;
  });
  return { stability, spreading, seepage };
}

function baseWidth(model: Model, ground: DrawnGround): number {
  const corners = model.lifts.map((lift) =>
    liftCorners(liftShape(lift, (number) => drawnValue(ground, number, 0, 0))),
  );
  if (corners.length === 0) return 0;
  return Math.max(...corners.map((each) => each[3])) - Math.min(...corners.map((each) => each[0]));
}

function softThickness(model: Model, ground: DrawnGround, point: number): number {
  const value = (layer: number) =>
    drawnValue(ground, thicknessNumber(model.layers[layer].thickness), point, 0);
  return layersAt(model, model.points[point].x, value)
    .filter((layer) => model.soils[layer.soil].behaviour === 'compressible')
    .reduce((sum, layer) => sum + layer.base - layer.top, 0);
}

/** Largest pressure of the fill at any stage, kPa. */
function largestFillPressure(column: Column): number {
  const lifts = column.loads.filter((load) => load.kind !== 'surface');
  const stages = lifts.flatMap((lift) => changesOf(lift.period));
  const pressures = stages.flatMap((date) =>
    ([-1, 1] as const).map((side) =>
      lifts.reduce((sum, lift) => sum + lift.pressure * actingShare(lift.period, date, side), 0),
    ),
  );
  return Math.max(0, ...pressures);
}

/** Mean σ'p of the compressible cells down to a depth, kPa; Infinity where there are none. */
function meanPreconsolidation(column: Column, depth: number): number {
  let sum = 0;
  let whole = 0;
  column.cells.middle.forEach((middle, i) => {
    if (column.law.modulus[i] > 0 || middle > depth) return;
    sum += column.cells.thickness[i] * column.law.yieldStress[i];
    whole += column.cells.thickness[i];
  });
  return whole > 0 ? sum / whole : Infinity;
}

/** Whether the base head brings σ' below 5 kPa at the base of any layer, where it is not so without it. */
function headLowersStress(model: Model, ground: DrawnGround, point: number): boolean {
  const value: ValueOf = (number) => drawnValue(ground, number, point, 0);
  const layers = layersAt(model, model.points[point].x, (layer) =>
    value(thicknessNumber(model.layers[layer].thickness)),
  );
  const unitWeights = layers.map((layer) => value(model.soils[layer.soil].unitWeight));
  const depth = value(model.water.depth);
  const stress = (z: number, baseExcessHead: number) =>
    initialEffectiveStress(z, layers, unitWeights, { depth, baseExcessHead });
  const head = value(model.water.baseExcessHead);
  return layers.some(
    ({ base }) => stress(base, head) < LOW_EFFECTIVE_STRESS && stress(base, 0) >= LOW_EFFECTIVE_STRESS,
  );
}
