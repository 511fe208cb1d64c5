import { describeFound, quoted } from './describeFound.ts';
import { keyInWords } from './keyWords.ts';
import { nearestWord } from './nearestWord.ts';
import { placeWithin, type Place } from './place.ts';
import type { Reading } from './reading.ts';

/** An object of the file whose keys have been looked through; what stands under them has not. */
export interface OpenedObject {
  readonly place: Place;
  readonly entries: ReadonlyMap<string, unknown>;
}

/** The keys that an object must have and those that it may have. */
export interface KnownKeys {
  readonly required: readonly string[];
  readonly optional?: readonly string[];
}

/**
 * Opens a value as an object, with a fault for each missing and each unknown key; undefined where it is no
 * object at all.
 */
export function openObject(
  reading: Reading,
  place: Place,
  value: unknown,
  keys: KnownKeys,
): OpenedObject | undefined {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    reading.faults.add(place, describeFound(value), 'an object in braces');
    return undefined;
  }
  const entries = new Map<string, unknown>(Object.entries(value));
  const known = [...keys.required, ...(keys.optional ?? [])];
  const missing = keys.required.filter((key) => !entries.has(key));
  for (const key of entries.keys()) {
    if (known.includes(key)) continue;
    if (reading.faults.isFull) {
      reading.faults.add(place, 'a key that is not known here', 'none');
      continue;
    }
    const nearest = nearestWord(key, [...missing, ...known]);
    const right = nearest === null ? `one of the keys ${inWords(known)}` : `the key ${quoted(nearest)}`;
    reading.faults.add(placeWithin(place, key, `key ${quoted(key)}`), 'a key that is not known here', right);
  }
  for (const key of missing) {
    reading.faults.add(
      placeWithin(place, key, keyInWords(key)),
      'nothing',
      `the key ${quoted(key)} with a value`,
    );
  }
  return { place, entries };
}

/** Place of what stands under a key. */
export function placeOfKey(object: OpenedObject, key: string): Place {
  return placeWithin(object.place, key, keyInWords(key));
}

/**
 * The one of several keys that is there.
 *
 * @returns undefined, with a fault, where none or more than one is
 */
export function exactlyOneKey<Key extends string>(
  reading: Reading,
  object: OpenedObject,
  keys: readonly Key[],
): Key | undefined {
  const present = keys.filter((key) => object.entries.has(key));
  if (present.length === 1) return present[0];
  const found = present.length === 0 ? 'none of them' : present.map(quoted).join(' and ');
  reading.faults.add(object.place, found, `exactly one of the keys ${inWords(keys)}`);
  return undefined;
}

/** Reads what stands under a key, or takes the fallback where the key is not there. */
export function orElse<T>(
  object: OpenedObject,
  key: string,
  fallback: T,
  read: () => T | undefined,
): T | undefined {
  return object.entries.has(key) ? read() : fallback;
}

/** Keys in quotation marks, joined by commas and a last 'or'. */
export function inWords(keys: readonly string[]): string {
  const quotedKeys = keys.map(quoted);
  return quotedKeys.length < 2
    ? quotedKeys.join('')
    : `${quotedKeys.slice(0, -1).join(', ')} or ${quotedKeys[quotedKeys.length - 1]}`;
}
