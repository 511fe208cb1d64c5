import type { Limit, LimitedResult } from './model.ts';
import { exactlyOneKey, openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import type { NumberRange } from './numberRange.ts';
import { readReference } from './readPoints.ts';
import type { ReadTimes } from './readTimes.ts';
import { readChoice, readMembers, readName, readNumber, readText } from './readValues.ts';
import { refuseSameNames, type Named } from './refuseSameNames.ts';
import { whole, wholeList, type Reading } from './reading.ts';

const MILLIMETRES_IN_METRE = 1_000;

/** How the limit of each result is given, and whether the result belongs to a point or to a pair. */
export const LIMITED_RESULTS: Readonly<
  Record<
    LimitedResult,
    {
      readonly of: 'point' | 'pair';
      readonly key: string;
      readonly range: NumberRange;
      readonly words: string;
    }
  >
> = {
  settlement_at_horizon: ofSettlement('point', 'settlement at the horizon'),
  settlement_after_handover: ofSettlement('point', 'settlement after handover'),
  differential_at_horizon: ofSettlement('pair', 'differential settlement at the horizon'),
  differential_after_handover: ofSettlement('pair', 'differential settlement after handover'),
  slope_at_horizon: ofSlope('slope at the horizon'),
  slope_after_handover: ofSlope('slope after handover'),
  rate_at_handover: {
    of: 'point',
    key: 'limit_mm_per_year',
    range: PHYSICAL.limitRate,
    words: 'rate of settlement at handover',
  },
  settlement_still_to_come: ofSettlement('point', 'settlement still to come'),
};

function ofSettlement(of: 'point' | 'pair', words: string) {
  return { of, key: 'limit_mm', range: PHYSICAL.limitMillimetres, words };
}

function ofSlope(words: string) {
  return { of: 'pair', key: 'limit_m_per_m', range: PHYSICAL.limitSlope, words } as const;
}

export const LIMIT_KEYS = {
  required: ['result'],
  optional: ['name', 'note', 'point', 'pair', 'limit_mm', 'limit_m_per_m', 'limit_mm_per_year', 'date_year'],
} as const;

/** Limits, named after their result and point or pair where they have no name. */
export function readLimits(
  reading: Reading,
  project: OpenedObject,
  points: readonly (string | undefined)[],
  pairs: readonly (string | undefined)[],
  times: ReadTimes | undefined,
): Limit[] | undefined {
  const named: Named[] = [];
  const limits = readMembers(
    reading,
    project,
    'limits',
    { least: 0, most: MOST.limits },
    'limit',
    (place, value) => {
      const object = openObject(reading, place, value, LIMIT_KEYS);
      if (object === undefined) return undefined;
      readText(reading, object, 'note');
      const result = readChoice(reading, object, 'result', Object.keys(LIMITED_RESULTS) as LimitedResult[]);
      if (result === undefined) {
        readName(reading, object, 'name');
        return undefined;
      }
      const { of, key, range, words } = LIMITED_RESULTS[result];
      refuseStrangers(reading, object, result);
      for (const each of [of, key]) exactlyOneKey(reading, object, [each]);
      const names = of === 'point' ? points : pairs;
      const index = readReference(reading, object, of, names, of);
      const given = readNumber(reading, object, key, range);
      const unnamed = `${words}${index === undefined ? '' : ` at ${names[index]}`}${
        object.entries.has('date_year') ? ` from ${String(object.entries.get('date_year'))}` : ''
      }`;
      const name = orElse(object, 'name', unnamed, () => readName(reading, object, 'name'));
      named.push({ place, name });
      return whole<Limit>({
        name,
        result,
        point: of === 'point' ? index : -1,
        pair: of === 'pair' ? index : -1,
        value:
          given === undefined ? undefined : key === 'limit_m_per_m' ? given : given / MILLIMETRES_IN_METRE,
        date: readDate(reading, object, times),
      });
    },
  );
  refuseSameNames(reading, 'limit', named);
  return limits && wholeList(limits);
}

/** Refuses keys that belong to the limit of another result. */
function refuseStrangers(reading: Reading, object: OpenedObject, result: LimitedResult): void {
  const { of, key } = LIMITED_RESULTS[result];
  const right = `for ${result} the keys "${of}" and "${key}"${result === 'settlement_still_to_come' ? ' and "date_year"' : ''}`;
  for (const stranger of ['point', 'pair', 'limit_mm', 'limit_m_per_m', 'limit_mm_per_year', 'date_year']) {
    if (!object.entries.has(stranger) || stranger === of || stranger === key) continue;
    if (stranger === 'date_year' && result === 'settlement_still_to_come') continue;
    reading.faults.add(placeOfKey(object, stranger), `the key "${stranger}"`, right);
  }
}

/** Date of a settlement still to come, the handover unless given. */
function readDate(reading: Reading, object: OpenedObject, times: ReadTimes | undefined): number | undefined {
  return orElse(object, 'date_year', times?.handover, () => {
    const date = readNumber(reading, object, 'date_year', PHYSICAL.year);
    if (date === undefined || times === undefined || date < times.horizon) return date;
    const right = `a year before the horizon, ${times.horizon}`;
    reading.faults.add(placeOfKey(object, 'date_year'), `the year ${date}`, right);
    return undefined;
  });
}
