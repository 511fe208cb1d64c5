import { openObject, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import { placeWithin } from './place.ts';
import { numberFrom, readList, readNumber } from './readValues.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export interface ReadTimes {
  readonly handover: number;
  readonly horizon: number;
  readonly outputTimes: readonly number[];
}

export const TIMES_KEYS = {
  required: ['handover_year', 'horizon_year'],
  optional: ['output_years', 'note'],
} as const;

/** Handover, horizon and output times: handover before the horizon, output times rising up to it. */
export function readTimes(reading: Reading, project: OpenedObject): ReadTimes | undefined {
  if (!project.entries.has('times')) return undefined;
  const object = openObject(reading, placeOfKey(project, 'times'), project.entries.get('times'), TIMES_KEYS);
  if (object === undefined) return undefined;
  const horizon = readNumber(reading, object, 'horizon_year', PHYSICAL.year);
  const handover = readNumber(reading, object, 'handover_year', PHYSICAL.year);
  if (handover !== undefined && horizon !== undefined && !(handover < horizon)) {
    reading.faults.add(
      placeOfKey(object, 'handover_year'),
      `the year ${handover}`,
      `a year before the horizon, ${horizon}`,
    );
  }
  return whole<ReadTimes>({ handover, horizon, outputTimes: readOutputTimes(reading, object, horizon) });
}

function readOutputTimes(
  reading: Reading,
  object: OpenedObject,
  horizon: number | undefined,
): number[] | undefined {
  if (!object.entries.has('output_years')) return [];
  const list = readList(reading, object, 'output_years', { least: 0, most: MOST.outputTimes });
  const place = placeOfKey(object, 'output_years');
  let last = -Infinity;
  const times = list?.map((value, i) => {
    const where = placeWithin(place, i, `number ${i + 1}`);
    const time = numberFrom(reading, where, value, PHYSICAL.year);
    if (time === undefined) return undefined;
    if (horizon !== undefined && time > horizon) {
      reading.faults.add(where, `the year ${time}`, `a year up to the horizon, ${horizon}`);
    }
    if (!(time > last)) reading.faults.add(where, `the year ${time} after ${last}`, 'output times that rise');
    last = time;
    return time;
  });
  return times && wholeList(times);
}
