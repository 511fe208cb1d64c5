import { makeBeta, makeBetaFromMoments } from '../marginals/beta.ts';
import { makeTable } from '../marginals/cumulativeTable.ts';
import { makeFixed } from '../marginals/fixed.ts';
import { makeLognormal, makeLognormalFromMedian } from '../marginals/lognormal.ts';
import type { Marginal } from '../marginals/marginal.ts';
import { makeNormal } from '../marginals/normal.ts';
import { makePert } from '../marginals/pert.ts';
import { makeTriangular } from '../marginals/triangular.ts';
import { makeUniform } from '../marginals/uniform.ts';
import { describeFound } from './describeFound.ts';
import { aboveUpTo, fromTo, type NumberRange } from './numberRange.ts';
import { exactlyOneKey, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST } from './physicalRanges.ts';
import { placeWithin } from './place.ts';
import { numberFrom, readList, readNumber } from './readValues.ts';
import { whole, type Reading } from './reading.ts';

export const MARGINAL_KINDS = [
  'fixed',
  'normal',
  'lognormal',
  'uniform',
  'triangular',
  'pert',
  'beta',
  'table',
] as const;
export type MarginalKind = (typeof MARGINAL_KINDS)[number];

/** The keys of each kind of marginal, beside 'marginal' and those that any uncertain number may have. */
export const MARGINAL_KEYS: Readonly<
  Record<MarginalKind, { readonly required: readonly string[]; readonly optional: readonly string[] }>
> = {
  fixed: { required: ['value'], optional: [] },
  normal: { required: ['mean'], optional: ['cov', 'deviation', 'low', 'high'] },
  lognormal: { required: [], optional: ['mean', 'median', 'cov', 'deviation'] },
  uniform: { required: ['low', 'high'], optional: [] },
  triangular: { required: ['low', 'best', 'high'], optional: [] },
  pert: { required: ['low', 'best', 'high'], optional: [] },
  beta: { required: ['low', 'high'], optional: ['alpha', 'beta', 'mean', 'cov', 'deviation'] },
  table: { required: ['values', 'cumulative'], optional: [] },
};

/** Any number of a marginal. */
export const ANY_NUMBER = fromTo(-1e12, 1e12);
/** What must lie above 0. */
export const POSITIVE_NUMBER = aboveUpTo(0, 1e12);
/** Coefficient of variation. */
export const VARIATION = aboveUpTo(0, 10);
/** Shares of a cumulative table. */
export const CUMULATIVE = fromTo(0, 1);
/** Shapes of a beta distribution. */
export const BETA_SHAPE = fromTo(0.05, 1e5);

/**
 * The marginal of an object that has been opened with the keys of its kind; undefined, with faults, if it is
 * none.
 *
 * @param range in which every value that the file states must lie; a mean of a normal or lognormal need not
 */
export function readMarginal(
  reading: Reading,
  object: OpenedObject,
  kind: MarginalKind,
  range: NumberRange,
): Marginal | undefined {
  const made = marginalOfKind({ reading, object, range }, kind);
  if (typeof made !== 'string') return made;
  reading.faults.add(object.place, `a ${kind} marginal of ${numbersIn(object)}`, `one of which ${made}`);
  return undefined;
}

interface Source {
  readonly reading: Reading;
  readonly object: OpenedObject;
  readonly range: NumberRange;
}

function marginalOfKind(source: Source, kind: MarginalKind): Marginal | string | undefined {
  const value = (key: string) => readNumber(source.reading, source.object, key, source.range);
  const threeNumbers = () => ({ low: value('low'), mode: value('best'), high: value('high') });
  switch (kind) {
    case 'fixed':
      return made({ value: value('value') }, makeFixed);
    case 'normal':
      return normal(source);
    case 'lognormal':
      return lognormal(source);
    case 'uniform':
      return made({ low: value('low'), high: value('high') }, makeUniform);
    case 'triangular':
      return made(threeNumbers(), makeTriangular);
    case 'pert':
      return made(threeNumbers(), makePert);
    case 'beta':
      return beta(source);
    case 'table':
      return made({ values: column(source, 'values'), cumulative: column(source, 'cumulative') }, makeTable);
  }
}

function made<T extends object>(
  parts: { [Key in keyof T]: T[Key] | undefined },
  make: (input: T) => Marginal | string,
): Marginal | string | undefined {
  const input = whole<T>(parts);
  return input === undefined ? undefined : make(input);
}

function normal({ reading, object, range }: Source): Marginal | string | undefined {
  const mean = readNumber(reading, object, 'mean', ANY_NUMBER);
  const deviation = deviationBeside(reading, object, mean);
  const cuts = (['low', 'high'] as const).filter((key) => object.entries.has(key));
  const read = cuts.map((key) => [key, readNumber(reading, object, key, range)] as const);
  if (read.some(([, value]) => value === undefined)) return undefined;
  return made({ mean, deviation }, (input) => makeNormal({ ...input, ...Object.fromEntries(read) }));
}

function lognormal({ reading, object }: Source): Marginal | string | undefined {
  const middle = exactlyOneKey(reading, object, ['mean', 'median']);
  if (middle !== 'median') {
    const mean = middle && readNumber(reading, object, middle, POSITIVE_NUMBER);
    return made({ mean, deviation: deviationBeside(reading, object, mean) }, makeLognormal);
  }
  const median = readNumber(reading, object, 'median', POSITIVE_NUMBER);
  if (object.entries.has('deviation')) {
    reading.faults.add(placeOfKey(object, 'deviation'), 'a deviation beside a median', 'the key "cov"');
    return undefined;
  }
  if (!object.entries.has('cov')) {
    reading.faults.add(placeOfKey(object, 'cov'), 'nothing', 'the key "cov" with a value');
  }
  return made({ median, cov: readNumber(reading, object, 'cov', VARIATION) }, makeLognormalFromMedian);
}

function beta({ reading, object, range }: Source): Marginal | string | undefined {
  const limits = {
    low: readNumber(reading, object, 'low', range),
    high: readNumber(reading, object, 'high', range),
  };
  const form = exactlyOneKey(reading, object, ['alpha', 'mean']);
  const strangers = form === 'alpha' ? ['mean', 'cov', 'deviation'] : ['alpha', 'beta'];
  const needed = form === 'alpha' ? 'beta' : null;
  for (const key of strangers) {
    if (form === undefined || !object.entries.has(key)) continue;
    reading.faults.add(
      placeOfKey(object, key),
      `a ${key} beside the ${form}`,
      'either alpha and beta, or mean and cov or deviation',
    );
    return undefined;
  }
  if (needed !== null && !object.entries.has(needed)) {
    reading.faults.add(placeOfKey(object, needed), 'nothing', `the key "${needed}" with a value`);
  }
  if (form === 'alpha') {
    const shape = (key: string) => readNumber(reading, object, key, BETA_SHAPE);
    return made({ ...limits, alpha: shape('alpha'), beta: shape('beta') }, makeBeta);
  }
  const mean = form && readNumber(reading, object, form, range);
  const deviation = form && deviationBeside(reading, object, mean);
  return made({ ...limits, mean, deviation }, makeBetaFromMoments);
}

/** The deviation, given by itself or as a share of the mean. */
function deviationBeside(
  reading: Reading,
  object: OpenedObject,
  mean: number | undefined,
): number | undefined {
  const key = exactlyOneKey(reading, object, ['cov', 'deviation']);
  if (key === undefined) return undefined;
  const value = readNumber(reading, object, key, key === 'cov' ? VARIATION : POSITIVE_NUMBER);
  if (value === undefined || mean === undefined || key === 'deviation') return value;
  if (mean > 0) return value * mean;
  reading.faults.add(
    placeOfKey(object, 'cov'),
    `a cov beside a mean of ${mean}`,
    'a mean above 0, or the key "deviation"',
  );
  return undefined;
}

function column({ reading, object, range }: Source, key: 'values' | 'cumulative'): number[] | undefined {
  const list = readList(reading, object, key, { least: 2, most: MOST.tableRows });
  const allowed = key === 'values' ? range : CUMULATIVE;
  const numbers = list?.map((value, i) => {
    const place = placeWithin(placeOfKey(object, key), i, `row ${i + 1}`);
    return numberFrom(reading, place, value, allowed);
  });
  return numbers?.includes(undefined) === false ? (numbers as number[]) : undefined;
}

function numbersIn(object: OpenedObject): string {
  const numbers = [...object.entries].filter(
    ([, value]) => typeof value === 'number' || Array.isArray(value),
  );
  return numbers
    .map(([key, value]) => `${key} ${typeof value === 'number' ? value : describeFound(value)}`)
    .join(', ');
}
