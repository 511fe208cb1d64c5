import { centralLayers, influenceOver, type CentralLayer } from './checkDrainage.ts';
import { quoted } from './describeFound.ts';
import type { Drains, Remark } from './model.ts';
import type { UnremarkedModel } from './unremarkedModel.ts';

/** Diameters of a drain in the ground that it serves below which the drain factor is less exact (Hansbo 1981). */
const WIDE_ENOUGH = 10;
const THINNEST = 1e-6;

/** What should be known of the drains, in the central case. */
export function remarksOnDrains(model: UnremarkedModel): Remark[] {
  const { drains, layers, points } = model;
  if (drains === null) return [];
  const remarks: Remark[] = [];
  const ratio = influenceOver(drains) / drains.diameter;
  if (ratio < WIDE_ENOUGH) {
    const sentence = `Each drain serves only ${ratio.toFixed(1)} times its own diameter: the drain factor holds from about 10.`;
    remarks.push({ pointer: '/drains/spacing_m', sentence });
  }
  const drained = points.filter(({ x, fixed }) => !fixed && x >= drains.from && x <= drains.to);
  if (drained.length === 0) {
    remarks.push({ pointer: '/drains', sentence: 'No point that settles lies where the drains stand.' });
  }
  const grounds = drained.map(({ name, x }) => ({ name, layers: centralLayers(layers, x) }));
  const named = (isSo: (layers: readonly CentralLayer[]) => boolean) =>
    grounds.filter((ground) => isSo(ground.layers)).map(({ name }) => quoted(name));
  const without = named((at) => !hasOutlet(model, drains, at));
  if (without.length > 0) {
    const sentence =
      'The drains end in no free-draining layer and at no drained boundary, so they lead nowhere and have no effect: ' +
      `at ${without.join(', ')}.`;
    remarks.push({ pointer: '/drains/foot_m', sentence });
  }
  const below = named((at) => drains.foot > at[at.length - 1].base + THINNEST);
  if (below.length > 0) {
    remarks.push({
      pointer: '/drains/foot_m',
      sentence: `The drains end at the base of the lowest layer, above their stated foot: at ${below.join(', ')}.`,
    });
  }
  return remarks;
}

function hasOutlet(
  { soils, boundaries }: UnremarkedModel,
  drains: Drains,
  layers: readonly CentralLayer[],
): boolean {
  const base = layers[layers.length - 1].base;
  if (boundaries.top === 'drained' && drains.top <= 0) return true;
  if (boundaries.base === 'drained' && drains.foot >= base) return true;
  return layers.some(
    (layer) =>
      layer.base - layer.top > THINNEST &&
      soils[layer.soil].behaviour === 'stiff_free_draining' &&
      layer.base >= drains.top &&
      layer.top <= drains.foot,
  );
}
