import { keyInWords, unitOfKey } from './keyWords.ts';
import type { NumberRange } from './numberRange.ts';
import type { KnownKeys } from './openObject.ts';
import { MOST } from './physicalRanges.ts';

/** A JSON Schema, or a part of one. */
export type Schema = Readonly<Record<string, unknown>>;

export function numberSchema({ low, lowIncluded, high, highExcluded }: NumberRange): Schema {
  return {
    type: 'number',
    [lowIncluded ? 'minimum' : 'exclusiveMinimum']: low,
    [highExcluded ? 'exclusiveMaximum' : 'maximum']: high,
  };
}

export function wholeNumberSchema({ low, high }: NumberRange, step = 1): Schema {
  return { type: 'integer', minimum: low, maximum: high, ...(step === 1 ? {} : { multipleOf: step }) };
}

/** One line that is not blank. */
export const NAME_SCHEMA: Schema = {
  type: 'string',
  minLength: 1,
  maxLength: MOST.nameLength,
  pattern: '^[^\\u0000-\\u001f\\u007f]*$',
  allOf: [{ pattern: '\\S' }],
};

export const TEXT_SCHEMA: Schema = { type: 'string', maxLength: MOST.textLength };
export const SWITCH_SCHEMA: Schema = { type: 'boolean' };

export function choiceSchema(choices: readonly string[]): Schema {
  return { enum: choices };
}

export function listSchema(items: Schema, least: number, most: number): Schema {
  return { type: 'array', minItems: least, maxItems: most, items };
}

/**
 * An object of exactly the keys that the checker knows, each described in its own words.
 *
 * @throws RangeError when a known key has no schema, or one has that is not known
 */
export function objectSchema(
  keys: KnownKeys,
  properties: Readonly<Record<string, Schema>>,
  more: Schema = {},
): Schema {
  const known = [...keys.required, ...(keys.optional ?? [])];
  const given = Object.keys(properties);
  const stray = [
    ...known.filter((key) => !given.includes(key)),
    ...given.filter((key) => !known.includes(key)),
  ];
  if (stray.length > 0)
    throw new RangeError(`objectSchema: keys and properties must be the same, got ${stray.join(', ')}`);
  const described = known.map((key) => [key, { description: describedKey(key), ...properties[key] }]);
  return {
    type: 'object',
    required: keys.required,
    properties: Object.fromEntries(described) as Schema,
    additionalProperties: false,
    ...more,
  };
}

function describedKey(key: string): string {
  const unit = unitOfKey(key);
  return unit === '1' ? keyInWords(key) : `${keyInWords(key)}, ${unit}`;
}

/** Exactly one of the keys is there. */
export function exactlyOneOf(...keys: readonly string[]): Schema {
  return { oneOf: keys.map((key) => ({ required: [key] })) };
}

/** Not more than one of the keys is there. */
export function notBoth(first: string, second: string): Schema {
  return { not: { required: [first, second] } };
}
