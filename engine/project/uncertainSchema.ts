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

/** Where an uncertain number may vary, if anywhere; the names of the definitions in `SPREAD_SCHEMAS`. */
export type Varies = 'varies_in_ground' | 'varies_along_section' | 'does_not_vary';

const SCALE = numberSchema(PHYSICAL.scaleOfFluctuation);
const SHARE = numberSchema(PHYSICAL.varianceShare);

/** Definitions that the schema of every uncertain number refers to. */
export const SHARED_DEFINITIONS: Readonly<Record<string, Schema>> = {
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

/**
 * A plain number, or a marginal of one of the kinds.
 *
 * @param range of every value that is stated
 * @param fixedRange of a number that is fixed
 */
export function uncertainSchema(
  range: NumberRange,
  varies: Varies = 'does_not_vary',
  kinds: readonly MarginalKind[] = MARGINAL_KINDS,
  fixedRange: NumberRange = range,
): Schema {
  const ofKind = (kind: MarginalKind) => marginalSchema(kind, kind === 'fixed' ? fixedRange : range, varies);
  return { oneOf: [numberSchema(fixedRange), ...kinds.map(ofKind)] };
}

function marginalSchema(kind: MarginalKind, range: NumberRange, varies: Varies): Schema {
  const { required, optional } = MARGINAL_KEYS[kind];
  const mayVary = varies !== 'does_not_vary' && kind !== 'fixed';
  const keys = { required: ['marginal', ...required], optional: [...optional, ...(mayVary ? ['varies'] : []), 'source', 'note'] };
  const own = [...required, ...optional].map((key) => [key, valueSchema(kind, key, range)]);
  return objectSchema(
    keys,
    {
      marginal: { const: kind },
      ...(Object.fromEntries(own) as Record<string, Schema>),
      ...(mayVary ? { varies: { $ref: `#/$defs/${varies}` } } : {}),
      source: { $ref: '#/$defs/source' },
      note: TEXT_SCHEMA,
    },
    keysTogether(kind),
  );
}

function valueSchema(kind: MarginalKind, key: string, range: NumberRange): Schema {
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
      return numberSchema(kind === 'normal' ? ANY_NUMBER : kind === 'lognormal' ? POSITIVE_NUMBER : range);
    case 'values':
      return listSchema(numberSchema(range), 2, MOST.tableRows);
    case 'cumulative':
      return listSchema(numberSchema(CUMULATIVE), 2, MOST.tableRows);
    default:
      return numberSchema(range);
  }
}

/** Which of a marginal's keys may stand beside each other. */
function keysTogether(kind: MarginalKind): Schema {
  switch (kind) {
    case 'normal':
      return exactlyOneOf('cov', 'deviation');
    case 'lognormal':
      return { allOf: [exactlyOneOf('mean', 'median'), exactlyOneOf('cov', 'deviation'), notBoth('median', 'deviation')] };
    case 'beta':
      return {
        oneOf: [
          { required: ['alpha', 'beta'], not: { anyOf: ['mean', 'cov', 'deviation'].map((key) => ({ required: [key] })) } },
          {
            required: ['mean'],
            allOf: [exactlyOneOf('cov', 'deviation')],
            not: { anyOf: ['alpha', 'beta'].map((key) => ({ required: [key] })) },
          },
        ],
      };
    default:
      return {};
  }
}
