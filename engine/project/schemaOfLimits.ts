import { PHYSICAL } from './physicalRanges.ts';
import { LIMITED_RESULTS } from './readLimits.ts';
import { NAME_SCHEMA, numberSchema, objectSchema, TEXT_SCHEMA, type Schema } from './schemaParts.ts';

/** A limit has the keys that its result asks for. */
export function limitSchema(): Schema {
  const variants = Object.entries(LIMITED_RESULTS).map(([result, { of, key, range }]) => {
    const isStillToCome = result === 'settlement_still_to_come';
    return objectSchema(
      { required: ['result', of, key], optional: ['name', 'note', ...(isStillToCome ? ['date_year'] : [])] },
      {
        result: { const: result },
        [of]: NAME_SCHEMA,
        [key]: numberSchema(range),
        name: NAME_SCHEMA,
        note: TEXT_SCHEMA,
        ...(isStillToCome ? { date_year: numberSchema(PHYSICAL.year) } : {}),
      },
    );
  });
  return { oneOf: variants };
}
