import { quoted } from './describeFound.ts';
import type { Pair, Point } from './model.ts';
import { nearestWord } from './nearestWord.ts';
import { inWords, openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import { readMembers, readName, readNumber, readSwitch, readText } from './readValues.ts';
import { refuseSameNames, type Named } from './refuseSameNames.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export const POINT_KEYS = { required: ['name', 'x_m'], optional: ['note', 'fixed'] } as const;
export const PAIR_KEYS = { required: ['first', 'second'], optional: ['name', 'note'] } as const;

/** Names as the file has them, for what refers to them, and what stands behind, where all of it could be read. */
export interface ReadNamed<T> {
  readonly names: readonly (string | undefined)[];
  readonly members: readonly T[] | undefined;
}

export function readPoints(reading: Reading, project: OpenedObject): ReadNamed<Point> {
  const named: Named[] = [];
  const points = readMembers(
    reading,
    project,
    'points',
    { least: 1, most: MOST.points },
    'point',
    (place, value) => {
      const object = openObject(reading, place, value, POINT_KEYS);
      const name = object && readName(reading, object, 'name');
      named.push({ place, name });
      if (object === undefined) return undefined;
      readText(reading, object, 'note');
      return whole<Point>({
        name,
        x: readNumber(reading, object, 'x_m', PHYSICAL.position),
        fixed: orElse(object, 'fixed', false, () => readSwitch(reading, object, 'fixed')),
      });
    },
  );
  refuseSameNames(reading, 'point', named);
  return { names: named.map((point) => point.name), members: points && wholeList(points) };
}

/** Pairs of points, named 'first – second' where they have no name. */
export function readPairs(
  reading: Reading,
  project: OpenedObject,
  points: readonly (string | undefined)[],
): ReadNamed<Pair> {
  const named: Named[] = [];
  const pairs = readMembers(
    reading,
    project,
    'pairs',
    { least: 0, most: MOST.pairs },
    'pair',
    (place, value) => {
      const object = openObject(reading, place, value, PAIR_KEYS);
      if (object === undefined) {
        named.push({ place, name: undefined });
        return undefined;
      }
      readText(reading, object, 'note');
      const first = readReference(reading, object, 'first', points, 'point');
      const second = readReference(reading, object, 'second', points, 'point');
      const both =
        first === undefined || second === undefined ? undefined : `${points[first]} – ${points[second]}`;
      const name = orElse(object, 'name', both, () => readName(reading, object, 'name'));
      named.push({ place, name });
      if (first !== undefined && first === second) {
        reading.faults.add(place, `the point ${quoted(points[first]!)} twice`, 'two different points');
      }
      return whole<Pair>({ name, first, second });
    },
  );
  refuseSameNames(reading, 'pair', named);
  return { names: named.map((pair) => pair.name), members: pairs && wholeList(pairs) };
}

/** Place in a list of names of the one under a key. */
export function readReference(
  reading: Reading,
  object: OpenedObject,
  key: string,
  names: readonly (string | undefined)[],
  member: string,
): number | undefined {
  const value = object.entries.get(key);
  if (!object.entries.has(key)) return undefined;
  const index = typeof value === 'string' ? names.indexOf(value) : -1;
  if (index >= 0) return index;
  if (typeof value !== 'string') {
    readName(reading, object, key);
    return undefined;
  }
  const known = names.filter((name) => name !== undefined);
  const nearest = nearestWord(value, known);
  const most = known.slice(0, MOST_NAMED);
  const right =
    nearest !== null
      ? quoted(nearest)
      : `the name of a ${member}${most.length > 0 ? `: ${inWords(most)}` : ''}`;
  reading.faults.add(
    placeOfKey(object, key),
    `the text ${quoted(value)}, which no ${member} is called`,
    right,
  );
  return undefined;
}

const MOST_NAMED = 10;
