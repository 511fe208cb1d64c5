import { ln } from '../elementary.ts';
import { drainageOfParts } from '../drainage/boundaries.ts';
import { cells as makeCells, type Cells } from '../ground/cells.ts';
import { drawnSoil, type DrawnSoil } from '../ground/drawnSoil.ts';
import { initialEffectiveStress, LOWEST_INITIAL_STRESS } from '../ground/initialStress.ts';
import { layersAt, type LayerAt } from '../ground/layersAt.ts';
import type { ActingPeriod } from '../load/programme.ts';
import type { Model } from '../project/model.ts';
import { thicknessNumber } from '../project/thicknessAt.ts';
import { drawnValue, type DrawnGround } from '../sampling/drawnGround.ts';
import { cellLaws } from './cellLaws.ts';
import type { Column, SecondaryLaw } from './column.ts';
import { columnLoads, earliestDate, standingStress, topUpUnitWeight, type ValueOf } from './columnLoads.ts';
import { radialDrainage } from './radialDrainage.ts';

/** Above this depth the initial stress of any ground is next to nothing, m; there its floor is not counted. */
const AT_SURFACE = 0.25;

/** How finely a column is cut. */
export interface Resolution {
  /** Cells aimed at over the layers that drain poorly. */
  readonly cells: number;
  /** Steps in an interval of ordinary length. */
  readonly steps: number;
}

/**
 * The column under one point in one realisation; null where there is no ground, or nothing ever acts.
 *
 * @param point place in `model.points`
 * @param realisation place in `ground`
 */
export function assembleColumn(
  model: Model,
  ground: DrawnGround,
  point: number,
  realisation: number,
  resolution: Resolution,
): Column | null {
  const value: ValueOf = (number) => drawnValue(ground, number, point, realisation);
  const { x } = model.points[point];
  const layers = layersAt(model, x, (layer) => value(thicknessNumber(model.layers[layer].thickness)));
  if (layers.length === 0) return null;
  const soils = layers.map((layer) => drawnSoil(model.soils[layer.soil], ground, point, realisation));
  const isFree = soils.map((soil) => soil.behaviour === 'stiff_free_draining');
  const drains = drainsAt(model, x);
  const cuts = drains === null ? [] : [drains.top, drains.foot];
  const topDrained = model.boundaries.top === 'drained';
  const baseDrained = model.boundaries.base === 'drained';
  const cells = makeCells(layers, isFree, cuts, resolution.cells, baseDrained);
  const water = { depth: value(model.water.depth), baseExcessHead: value(model.water.baseExcessHead) };
  const waterHeight = Math.max(0, -water.depth);
  const { loads, datesPutInOrder } = columnLoads(model, x, value, cells.middle, waterHeight);
  const vacuum = vacuumOf(model, value);
  const timeZero = earliestDate(loads, vacuum?.period ?? null);
  if (!(timeZero < model.horizon)) return null;

  const unitWeights = soils.map((soil) => soil.unitWeight);
  const found = cells.middle.map((z) => initialEffectiveStress(z, layers, unitWeights, water));
  const before = found.map((stress) => Math.max(stress, LOWEST_INITIAL_STRESS));
  const standing = standingStress(loads, before.length);
  const laws = cellLaws(cells, soils, before, standing, value(model.modelFactors.rate));
  const drainage = drainageOfParts(isFree, topDrained);
  const radial =
    drains === null
      ? null
      : radialDrainage(drains, value, layers, isFree, cells, { topDrained, baseDrained });
  const hasDrains = drainage.meetsTop.map(
    (_, stratum) =>
      radial !== null &&
      cells.part.some((part, i) => drainage.stratum[part] === stratum && radial.reached[i] > 0),
  );
  const reachedStrata = drainage.meetsTop.map((meets, stratum) => meets || hasDrains[stratum]);
  return {
    cells,
    law: laws.compression,
    permeability: laws.permeability,
    initialVolume: laws.initialVolume,
    free: flagPerCell(cells, isFree),
    joinedToTop: flagPerCell(cells, drainage.joinedToTop),
    reachedByVacuum: flagPerCell(
      cells,
      isFree.map((free, part) => (free ? drainage.joinedToTop[part] : reachedStrata[drainage.stratum[part]])),
    ),
    topDrained,
    baseDrained,
    drains: radial,
    vacuum,
    loads,
    heldUntil: model.couplings.heldUntil ?? -Infinity,
    topUpUnitWeight: topUpUnitWeight(model, value),
    belowWater: model.couplings.submergence ? shareBelow(cells, water.depth) : null,
    waterHeight,
    wideFill: model.wideFill,
    secondary: secondaryLaw(model, cells, soils, drainage.stratum, reachedStrata),
    settlementFactor: value(model.modelFactors.settlement),
    timeZero,
    horizon: model.horizon,
    degree: model.results.degreeOfConsolidation ?? NaN,
    clamps: {
      preconsolidationRaised: laws.preconsolidationRaised,
      recompressionSetToCompression: soils.some(
        (soil) => soil.behaviour === 'compressible' && soil.recompressionSetToCompression,
      ),
      initialStressAtFloor: found.some(
        (stress, i) => stress < LOWEST_INITIAL_STRESS && cells.middle[i] > AT_SURFACE,
      ),
      vacuumDrainsCrossSeam:
        vacuum !== null && drains !== null && crossesSeam(drains, layers, isFree, drainage.joinedToTop),
      datesPutInOrder,
      smearReachesInfluence: radial !== null && radial.smearReachesInfluence,
    },
  };
}

/** A flag of each part, for each of its cells. */
function flagPerCell({ part }: Cells, ofPart: readonly boolean[]): Uint8Array {
  const flags = new Uint8Array(part.length);
  for (let i = 0; i < part.length; i += 1) flags[i] = ofPart[part[i]] ? 1 : 0;
  return flags;
}

/** A number of each part, for each of its cells. */
function numberPerCell({ part }: Cells, ofPart: readonly number[]): Float64Array {
  const numbers = new Float64Array(part.length);
  for (let i = 0; i < part.length; i += 1) numbers[i] = ofPart[part[i]];
  return numbers;
}

/** The drains at x, or null. */
function drainsAt(model: Model, x: number) {
  const { drains } = model;
  return drains !== null && x >= drains.from && x <= drains.to ? drains : null;
}

function vacuumOf(model: Model, value: ValueOf): { pressure: number; period: ActingPeriod } | null {
  if (model.vacuum === null) return null;
  const start = value(model.vacuum.start);
  const removalStart = Math.max(start, value(model.vacuum.end));
  return {
    pressure: value(model.vacuum.pressure),
    period: { start, end: start, removalStart, removalEnd: removalStart },
  };
}

/** Share of each cell that lies below a depth. */
function shareBelow(cells: Cells, depth: number): Float64Array {
  return cells.thickness.map((thickness, i) =>
    Math.max(0, Math.min(1, (cells.top[i] + thickness - depth) / thickness)),
  );
}

function crossesSeam(
  drains: { readonly top: number; readonly foot: number },
  layers: readonly LayerAt[],
  isFree: readonly boolean[],
  joinedToTop: readonly boolean[],
): boolean {
  return layers.some(
    (layer, part) => isFree[part] && !joinedToTop[part] && layer.top < drains.foot && layer.base > drains.top,
  );
}

function secondaryLaw(
  model: Model,
  cells: Cells,
  soils: readonly DrawnSoil[],
  stratum: readonly number[],
  reachedByVacuum: readonly boolean[],
): SecondaryLaw | null {
  const anyRate = soils.some((soil) => soil.behaviour === 'compressible' && soil.secondaryIndex > 0);
  if (!model.secondary.included || !anyRate) return null;
  const perCell = (ofSoil: (soil: DrawnSoil) => number) => numberPerCell(cells, soils.map(ofSoil));
  return {
    stratum: cells.part.map((part) => stratum[part]),
    strata: reachedByVacuum.length,
    rate: perCell((soil) =>
      soil.behaviour === 'compressible' ? soil.secondaryIndex / ((1 + soil.initialVoidRatio) * ln(10)) : 0,
    ),
    rateBeforeYield: perCell((soil) =>
      soil.behaviour === 'compressible' ? soil.recompressionIndex / soil.compressionIndex : 0,
    ),
    reachedByVacuum,
    reductionFloor: model.secondary.reductionFloor,
    reductionExponent: model.secondary.reductionExponent,
  };
}
