import type { NumberRange } from './numberRange.ts';
import { MOST, PHYSICAL } from './physicalRanges.ts';
import {
  ANY_NUMBER,
  BETA_SHAPE,
  CUMULATIVE,
  MARGINAL_KEYS,
  MARGINAL_KINDS,
  POSITIVE_NUMBER,
  VARIATION,
  type MarginalKind,
} from './readMarginal.ts';
import { SOURCE_KINDS } from './readUncertain.ts';
import {
  choiceSchema,
  exactlyOneOf,
  listSchema,
  notBoth,
  numberSchema,
  objectSchema,
  TEXT_SCHEMA,
  type Schema,
} from './schemaParts.ts';

/** Whether a number may vary from place to place, and how. */
export type Varies = 'in_ground' | 'along_section' | 'nowhere';

/**
 * A plain number, or a marginal of one of the kinds.
 *
 * @param range of every value that is stated
 * @param fixedRange of a number that is fixed
 */
export function uncertainSchema(
  range: NumberRange,
  varies: Varies = 'nowhere',
  kinds: readonly MarginalKind[] = MARGINAL_KINDS,
  fixedRange: NumberRange = range,
): Schema {
  const value = numberSchema(range);
  const properties = {
    ...(kinds === MARGINAL_KINDS ? {} : { marginal: choiceSchema(kinds) }),
    value: numberSchema(fixedRange),
    low: value,
    best: value,
    high: value,
    values: { items: value },
  };
  return { oneOf: [numberSchema(fixedRange), { $ref: `#/$defs/marginal_${varies}`, properties }] };
}

const SCALE = numberSchema(PHYSICAL.scaleOfFluctuation);
const SHARE = numberSchema(PHYSICAL.varianceShare);

/** Definitions that the schema of every uncertain number refers to: the shapes of marginals, without ranges. */
export const SHARED_DEFINITIONS: Readonly<Record<string, Schema>> = {
  marginal_nowhere: marginalShape('nowhere'),
  marginal_in_ground: marginalShape('in_ground'),
  marginal_along_section: marginalShape('along_section'),
  source: objectSchema(
    { required: ['kind'], optional: ['text'] },
    { kind: choiceSchema(SOURCE_KINDS), text: TEXT_SCHEMA },
  ),
  varies_in_ground: objectSchema(
    { required: ['share_of_variance', 'vertical_scale_m', 'horizontal_scale_m'] },
    { share_of_variance: SHARE, vertical_scale_m: SCALE, horizontal_scale_m: SCALE },
  ),
  varies_along_section: objectSchema(
    { required: ['share_of_variance', 'horizontal_scale_m'] },
    { share_of_variance: SHARE, horizontal_scale_m: SCALE },
  ),
};

function marginalShape(varies: Varies): Schema {
  return { oneOf: MARGINAL_KINDS.map((kind) => shapeOfKind(kind, varies)) };
}

function shapeOfKind(kind: MarginalKind, varies: Varies): Schema {
  const { required, optional } = MARGINAL_KEYS[kind];
  const mayVary = varies !== 'nowhere' && kind !== 'fixed';
  const keys = {
    required: ['marginal', ...required],
    optional: [...optional, ...(mayVary ? ['varies'] : []), 'source', 'note'],
  };
  const own = [...required, ...optional].map((key) => [key, valueSchema(kind, key)]);
  return objectSchema(
    keys,
    {
      marginal: { const: kind },
      ...(Object.fromEntries(own) as Record<string, Schema>),
      ...(mayVary ? { varies: { $ref: `#/$defs/varies_${varies}` } } : {}),
      source: { $ref: '#/$defs/source' },
      note: TEXT_SCHEMA,
    },
    keysTogether(kind),
  );
}

function valueSchema(kind: MarginalKind, key: string): Schema {
  switch (key) {
    case 'cov':
      return numberSchema(VARIATION);
    case 'deviation':
    case 'median':
      return numberSchema(POSITIVE_NUMBER);
    case 'alpha':
    case 'beta':
      return numberSchema(BETA_SHAPE);
    case 'mean':
      return numberSchema(kind === 'lognormal' ? POSITIVE_NUMBER : ANY_NUMBER);
    case 'values':
      return listSchema(numberSchema(ANY_NUMBER), 2, MOST.tableRows);
    case 'cumulative':
      return listSchema(numberSchema(CUMULATIVE), 2, MOST.tableRows);
    default:
      return numberSchema(ANY_NUMBER);
  }
}

/** Which of a marginal's keys may stand beside each other. */
function keysTogether(kind: MarginalKind): Schema {
  const none = (...keys: string[]) => ({ not: { anyOf: keys.map((key) => ({ required: [key] })) } });
  switch (kind) {
    case 'normal':
      return exactlyOneOf('cov', 'deviation');
    case 'lognormal': {
      const together = [
        exactlyOneOf('mean', 'median'),
        exactlyOneOf('cov', 'deviation'),
        notBoth('median', 'deviation'),
      ];
      return { allOf: together };
    }
    case 'beta':
      return {
        oneOf: [
          { required: ['alpha', 'beta'], ...none('mean', 'cov', 'deviation') },
          { required: ['mean'], allOf: [exactlyOneOf('cov', 'deviation')], ...none('alpha', 'beta') },
        ],
      };
    default:
      return {};
  }
}
