import { describeFound, quoted } from './describeFound.ts';
import { nearestWord } from './nearestWord.ts';
import { isInRange, rangeInWords, type NumberRange } from './numberRange.ts';
import { inWords, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST } from './physicalRanges.ts';
import { placeWithin, type Place } from './place.ts';
import type { Reading } from './reading.ts';

const CONTROL_CHARACTERS = /[\u0000-\u001f\u007f]/;

/** A number in a range; −0 is read as 0. Undefined, with a fault, where it is anything else. */
export function numberFrom(
  reading: Reading,
  place: Place,
  value: unknown,
  range: NumberRange,
): number | undefined {
  if (typeof value === 'number' && isInRange(range, value)) return value + 0;
  reading.faults.add(place, describeFound(value), `a number ${rangeInWords(range)}`);
  return undefined;
}

/** The number under a key; undefined, without a fault, where the key is missing (it has been named already). */
export function readNumber(
  reading: Reading,
  object: OpenedObject,
  key: string,
  range: NumberRange,
): number | undefined {
  if (!object.entries.has(key)) return undefined;
  return numberFrom(reading, placeOfKey(object, key), object.entries.get(key), range);
}

/** A whole number in a range, a multiple of `step`. */
export function readWholeNumber(
  reading: Reading,
  object: OpenedObject,
  key: string,
  range: NumberRange,
  step = 1,
): number | undefined {
  if (!object.entries.has(key)) return undefined;
  const value = object.entries.get(key);
  if (typeof value === 'number' && isInRange(range, value) && value % step === 0) return value + 0;
  const right = step === 1 ? 'a whole number' : `a multiple of ${step}`;
  reading.faults.add(placeOfKey(object, key), describeFound(value), `${right} ${rangeInWords(range)}`);
  return undefined;
}

/** A name: one line that is not blank, at most 100 characters. */
export function readName(reading: Reading, object: OpenedObject, key: string): string | undefined {
  if (!object.entries.has(key)) return undefined;
  const value = object.entries.get(key);
  if (typeof value === 'string' && isName(value)) return value;
  const right = `a name in one line, of 1 to ${MOST.nameLength} characters`;
  reading.faults.add(placeOfKey(object, key), describeFound(value), right);
  return undefined;
}

function isName(text: string): boolean {
  if (text.length > 2 * MOST.nameLength || /^\s*$/.test(text) || CONTROL_CHARACTERS.test(text)) return false;
  return [...text].length <= MOST.nameLength;
}

/** A text of any length up to 100,000 characters; '' where the key is missing. */
export function readText(reading: Reading, object: OpenedObject, key: string): string | undefined {
  if (!object.entries.has(key)) return '';
  const value = object.entries.get(key);
  if (
    typeof value === 'string' &&
    value.length <= 2 * MOST.textLength &&
    [...value].length <= MOST.textLength
  ) {
    return value;
  }
  const found = typeof value === 'string' ? `a text of ${value.length} characters` : describeFound(value);
  reading.faults.add(placeOfKey(object, key), found, `a text of at most ${MOST.textLength} characters`);
  return undefined;
}

/** true or false under a key. */
export function readSwitch(reading: Reading, object: OpenedObject, key: string): boolean | undefined {
  if (!object.entries.has(key)) return undefined;
  const value = object.entries.get(key);
  if (typeof value === 'boolean') return value;
  reading.faults.add(placeOfKey(object, key), describeFound(value), 'true or false');
  return undefined;
}

/** One of several words under a key. */
export function readChoice<Choice extends string>(
  reading: Reading,
  object: OpenedObject,
  key: string,
  choices: readonly Choice[],
): Choice | undefined {
  if (!object.entries.has(key)) return undefined;
  const value = object.entries.get(key);
  const choice = choices.find((each) => each === value);
  if (choice !== undefined) return choice;
  const nearest = typeof value === 'string' ? nearestWord(value, choices) : null;
  const right = nearest === null ? inWords(choices) : quoted(nearest);
  reading.faults.add(placeOfKey(object, key), describeFound(value), right);
  return undefined;
}

/** A list under a key, of at least and at most so many; its members are not looked at. */
export function readList(
  reading: Reading,
  object: OpenedObject,
  key: string,
  count: { readonly least: number; readonly most: number },
): readonly unknown[] | undefined {
  if (!object.entries.has(key)) return undefined;
  const value = object.entries.get(key);
  if (Array.isArray(value) && value.length >= count.least && value.length <= count.most) return value;
  const right = `a list of ${count.least} to ${count.most} in brackets`;
  reading.faults.add(placeOfKey(object, key), describeFound(value), right);
  return undefined;
}

/**
 * Reads each member of the list under a key; [] where the key is missing.
 *
 * @param memberWords how a member is called, such as 'soil'
 */
export function readMembers<T>(
  reading: Reading,
  object: OpenedObject,
  key: string,
  count: { readonly least: number; readonly most: number },
  memberWords: string,
  read: (place: Place, value: unknown, index: number) => T | undefined,
): (T | undefined)[] | undefined {
  if (!object.entries.has(key)) return count.least === 0 ? [] : undefined;
  const list = readList(reading, object, key, count);
  const { pointer, path } = placeOfKey(object, key);
  const parent = { pointer, path: object.place.pointer === '' ? '' : `${object.place.path}, ` };
  return list?.map((value, index) => {
    const words = `${parent.path}${memberWords} ${nameOf(value) ?? index + 1}`;
    return read({ ...placeWithin({ pointer, path }, index, ''), path: words }, value, index);
  });
}

/** The name of a member in quotation marks, where it has a usable one. */
function nameOf(value: unknown): string | null {
  if (typeof value !== 'object' || value === null || !Object.hasOwn(value, 'name')) return null;
  const { name } = value as { name: unknown };
  return typeof name === 'string' && isName(name) ? quoted(name) : null;
}
