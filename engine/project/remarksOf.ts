import { deviation, mean } from '../marginals/marginal.ts';
import { quoted } from './describeFound.ts';
import type { Remark } from './model.ts';
import type { Place } from './place.ts';
import { REALISATIONS_IN_REPLICATE } from './replicateSize.ts';
import { remarksOnDates } from './remarksOnDates.ts';
import { remarksOnDrains } from './remarksOnDrains.ts';
import type { UnremarkedModel } from './unremarkedModel.ts';

/** Realisations of the ten replicates that a band needs. */
const REALISATIONS_FOR_BAND = 10 * REALISATIONS_IN_REPLICATE;

/**
 * What is allowed in a project but should be known.
 *
 * @param inputPlaces where in the file each of `model.inputs` stands
 */
export function remarksOf(model: UnremarkedModel, inputPlaces: readonly Place[]): Remark[] {
  return [
    ...remarksOnGround(model),
    ...remarksOnDates(model),
    ...remarksOnDrains(model),
    ...remarksOnInputs(model, inputPlaces),
    ...remarksOnQuestion(model),
  ];
}

function remarksOnGround({ soils, layers, secondary, points }: UnremarkedModel): Remark[] {
  const remarks: Remark[] = [];
  const lying = soils.filter((_, index) => layers.some(({ soil }) => soil === index));
  if (!lying.some(({ behaviour }) => behaviour === 'compressible')) {
    remarks.push({ pointer: '/layers', sentence: 'No layer is compressible: only stiff layers settle.' });
  }
  soils.forEach((soil, i) => {
    const pointer = `/soils/${i}`;
    if (!lying.includes(soil)) {
      remarks.push({
        pointer,
        sentence: `No layer is of the soil ${quoted(soil.name)}: its numbers have no effect.`,
      });
    } else if (secondary.included && soil.behaviour === 'compressible' && soil.secondary === null) {
      const sentence = `The soil ${quoted(soil.name)} has no secondary index: its settlement ends with primary.`;
      remarks.push({ pointer, sentence });
    }
  });
  layers.forEach(({ name, thickness }, i) => {
    if (thickness.kind === 'even') return;
    const [first, last] = [thickness.x[0], thickness.x[thickness.x.length - 1]];
    const beyond = points
      .filter(({ x, fixed }) => !fixed && (x < first || x > last))
      .map((point) => quoted(point.name));
    if (beyond.length === 0) return;
    const sentence = `Beyond the outermost borings the layer ${quoted(name)} is taken as level: at ${beyond.join(', ')}.`;
    remarks.push({ pointer: `/layers/${i}/borings`, sentence });
  });
  return remarks;
}

function remarksOnInputs({ inputs, sampling }: UnremarkedModel, places: readonly Place[]): Remark[] {
  const remarks: Remark[] = [];
  inputs.forEach(({ label, unit, marginal }, i) => {
    const [centre, spread] = [mean(marginal), deviation(marginal)];
    // a date or a level has no zero of its own, so no coefficient of variation
    if (unit === 'year' || label.includes('level') || label.includes('head') || !(spread > Math.abs(centre)))
      return;
    const sentence = `The coefficient of variation of the ${label} is above 1: few tests support so wide a spread.`;
    remarks.push({ pointer: places[i].pointer, sentence });
  });
  if (inputs.length === 0) {
    remarks.push({ pointer: '', sentence: 'No number is uncertain: every realisation is the same.' });
  }
  if (sampling.realisations < REALISATIONS_FOR_BAND) {
    const sentence = `Fewer than ${REALISATIONS_FOR_BAND} realisations: no confidence band can be shown.`;
    remarks.push({ pointer: '/sampling/realisations', sentence });
  }
  return remarks;
}

function remarksOnQuestion({ points, pairs, limits }: UnremarkedModel): Remark[] {
  const remarks: Remark[] = [];
  if (points.every(({ fixed }) => fixed)) {
    remarks.push({ pointer: '/points', sentence: 'Every point is fixed: none settles.' });
  }
  if (limits.length === 0) {
    remarks.push({ pointer: '', sentence: 'No limit is given: no chance of passing one is found.' });
  }
  limits.forEach(({ name, point, pair }, i) => {
    const concerned = point >= 0 ? [points[point]] : [points[pairs[pair].first], points[pairs[pair].second]];
    if (!concerned.every(({ fixed }) => fixed)) return;
    remarks.push({
      pointer: `/limits/${i}`,
      sentence: `The limit ${quoted(name)} is for what is fixed: it is never passed.`,
    });
  });
  return remarks;
}
