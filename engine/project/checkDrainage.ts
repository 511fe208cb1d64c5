import { centralValue } from './centralValue.ts';
import type { Drains, Model, Vacuum } from './model.ts';
import { placeWithin } from './place.ts';
import type { Reading } from './reading.ts';
import { shortNumber } from './readUncertain.ts';
import { thicknessAt, thicknessNumber } from './thicknessAt.ts';

/** Diameter served by a drain over its spacing (Hansbo 1981). */
const INFLUENCE = { triangular: 1.05, square: 1.13 };

/** Diameter of the ground that one drain serves, m. */
export function influenceOver({ pattern, spacing }: Drains): number {
  return INFLUENCE[pattern] * spacing;
}

interface DrainedParts {
  readonly soils: Model['soils'] | undefined;
  readonly layers: Model['layers'] | undefined;
  readonly drains: Drains;
  readonly vacuum: Vacuum | null;
  readonly boundaries: Model['boundaries'] | undefined;
  readonly points: Model['points'] | undefined;
}

const DRAINS = { pointer: '/drains', path: 'drains' };

/**
 * Refuses, in the central case: a drain or a smeared zone wider than the ground that one drain serves, drains
 * that reach below the ground at every point they stand at, and drains under vacuum that cross an inner
 * free-draining layer.
 */
export function checkDrainage(reading: Reading, parts: DrainedParts): void {
  const { drains, vacuum, soils, layers, points } = parts;
  const influence = influenceOver(drains);
  const smeared = drains.diameter * centralValue(drains.smearRatio);
  if (!(drains.diameter < influence)) {
    const found = `drains of ${shortNumber(drains.diameter)} m, each serving ${shortNumber(influence)} m of ground`;
    reading.faults.add(DRAINS, found, 'a diameter below that of the ground served');
  } else if (!(smeared < influence)) {
    const found = `a smeared zone of ${shortNumber(smeared)} m, each drain serving ${shortNumber(influence)} m of ground`;
    reading.faults.add(
      placeWithin(DRAINS, 'smear_ratio', 'smear ratio'),
      found,
      'a smeared zone within the ground served',
    );
  }
  if (soils === undefined || layers === undefined || points === undefined) return;
  const drained = points.filter(({ x, fixed }) => !fixed && x >= drains.from && x <= drains.to);
  const grounds = drained.map(({ x }) => ({ x, layers: centralLayers(layers, x) }));
  const deepest = Math.max(...grounds.map((ground) => ground.layers[ground.layers.length - 1].base));
  if (drained.length > 0 && drains.foot > deepest + 1e-9) {
    const found = `a foot at ${drains.foot} m, below the lowest layer, which ends at ${shortNumber(deepest)} m`;
    reading.faults.add(placeWithin(DRAINS, 'foot_m', 'foot'), found, 'a foot within the layers');
  }
  if (vacuum === null) return;
  for (const ground of grounds) {
    const crossed = innerSeamCrossed(ground.layers, soils, drains);
    if (crossed === null) continue;
    const found = `drains under vacuum that cross the free-draining layer "${crossed}" at x = ${ground.x} m`;
    const right = 'drains that end above it, or no vacuum: the layer would feed water to them';
    reading.faults.add(placeWithin(DRAINS, 'foot_m', 'foot'), found, right);
    return;
  }
}

export interface CentralLayer {
  readonly name: string;
  readonly soil: number;
  readonly top: number;
  readonly base: number;
}

/** Layers at x with the medians of their thicknesses, those without thickness there among them, m. */
export function centralLayers(layers: Model['layers'], x: number): CentralLayer[] {
  let top = 0;
  return layers.map(({ name, soil, thickness }) => {
    const layer = {
      name,
      soil,
      top,
      base: top + thicknessAt(thickness, x, centralValue(thicknessNumber(thickness))),
    };
    top = layer.base;
    return layer;
  });
}

/** Name of a free-draining layer that is not joined to the top and that drains reach into; null without one. */
function innerSeamCrossed(
  layers: readonly CentralLayer[],
  soils: Model['soils'],
  drains: Drains,
): string | null {
  let joinedToTop = true;
  for (const layer of layers) {
    if (!(layer.base - layer.top > 1e-6)) continue;
    if (soils[layer.soil].behaviour !== 'stiff_free_draining') joinedToTop = false;
    else if (!joinedToTop && layer.top < drains.foot && layer.base > drains.top) return layer.name;
  }
  return null;
}
