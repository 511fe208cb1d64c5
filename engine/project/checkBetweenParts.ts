import { checkDates } from './checkDates.ts';
import { checkDrainage } from './checkDrainage.ts';
import type { Model } from './model.ts';
import type { Reading } from './reading.ts';

/** The parts of a model that could be read. */
export type ReadParts = {
  readonly [
    Part in
      | 'soils'
      | 'layers'
      | 'lifts'
      | 'surfaceLoads'
      | 'drains'
      | 'vacuum'
      | 'boundaries'
      | 'points'
      | 'pairs'
      | 'limits'
  ]: Model[Part] | undefined;
};

/** Refuses what is right by itself and wrong beside another part; looks at every part that could be read. */
export function checkBetweenParts(reading: Reading, parts: ReadParts): void {
  checkDates(reading, parts.lifts ?? [], parts.surfaceLoads ?? [], parts.vacuum ?? null);
  refuseStandingOnPlaced(reading, parts);
  refuseSlopeOfStep(reading, parts);
  const { soils, layers, drains, vacuum, boundaries, points } = parts;
  if (drains === undefined || drains === null) return;
  checkDrainage(reading, { soils, layers, drains, vacuum: vacuum ?? null, boundaries, points });
}

function refuseStandingOnPlaced(reading: Reading, { lifts }: ReadParts): void {
  lifts?.forEach((lift, i) => {
    if (!lift.standing || lifts.slice(0, i).every((below) => below.standing)) return;
    const place = { pointer: `/fill/lifts/${i}/standing`, path: `fill, lift "${lift.name}", standing` };
    reading.faults.add(
      place,
      'a standing lift after one that is placed',
      'standing lifts first, as the lowest',
    );
  });
}

function refuseSlopeOfStep(reading: Reading, { limits, pairs, points }: ReadParts): void {
  limits?.forEach((limit, i) => {
    if (!limit.result.startsWith('slope') || pairs === undefined || points === undefined) return;
    const { first, second, name } = pairs[limit.pair];
    if (points[first].x !== points[second].x) return;
    const place = { pointer: `/limits/${i}/result`, path: `limit "${limit.name}", result` };
    reading.faults.add(
      place,
      `a slope of the pair "${name}", both points of which lie at one x`,
      'a differential settlement: a step has no slope',
    );
  });
}
