import { median, type Marginal } from '../marginals/marginal.ts';
import { describeFound, quoted } from './describeFound.ts';
import { keyInWords, keyWithoutUnit, unitOfKey } from './keyWords.ts';
import type { Source, Spread, UncertainNumber } from './uncertainNumber.ts';
import { nearestWord } from './nearestWord.ts';
import { isInRange, rangeInWords, type NumberRange } from './numberRange.ts';
import { inWords, openObject, orElse, placeOfKey, type OpenedObject } from './openObject.ts';
import { physicalMarginal } from './physicalMarginal.ts';
import { placeWithin, type Place } from './place.ts';
import { MARGINAL_KEYS, MARGINAL_KINDS, readMarginal, type MarginalKind } from './readMarginal.ts';
import { readSpread } from './readSpread.ts';
import { readChoice, readText, numberFrom } from './readValues.ts';
import { whole, type Reading } from './reading.ts';

/** How one uncertain number is called and what it may be. */
export interface UncertainSpec {
  /** Start of the permanent name and of the label: 'soil/soft clay', 'soft clay'. */
  readonly owner: { readonly name: string; readonly label: string };
  readonly range: NumberRange;
  /** What the median may be; as `range` unless given. */
  readonly central?: NumberRange;
  /** Last part of the permanent name; the key without its unit unless given. */
  readonly called?: string;
  /** In words, the key's own words unless given. */
  readonly words?: string;
  /** Whether it may vary from place to place, and how; not at all unless given. */
  readonly varies?: 'in the ground' | 'along the section';
  /** Whether an average over a layer keeps the mean; it does unless given. */
  readonly keepsMean?: boolean;
  /** Marginals that may stand here, all unless given. */
  readonly kinds?: readonly MarginalKind[];
}

export const SOURCE_KINDS = ['test', 'correlation', 'published range', 'judgement'] as const;
const NOT_STATED: Source = { kind: 'not stated', text: '' };

/** The uncertain number under a key: a plain number, or a marginal with what belongs to it. */
export function readUncertain(
  reading: Reading,
  object: OpenedObject,
  key: string,
  spec: UncertainSpec,
): UncertainNumber | undefined {
  if (!object.entries.has(key)) return undefined;
  const name = `${spec.owner.name}/${spec.called ?? keyWithoutUnit(key)}`;
  const described = {
    name,
    label:
      spec.owner.label === ''
        ? (spec.words ?? keyInWords(key))
        : `${spec.words ?? keyInWords(key)} of ${spec.owner.label}`,
    unit: unitOfKey(key),
    keepsMean: spec.keepsMean ?? true,
  };
  const place = placeOfKey(object, key);
  const read = numberOrMarginal(reading, place, object.entries.get(key), spec);
  if (read !== undefined) return reading.enter(place, { ...described, ...read });
  reading.brokenNames.add(name);
  return undefined;
}

type Read = Pick<UncertainNumber, 'marginal' | 'spread' | 'source' | 'note'>;

function numberOrMarginal(
  reading: Reading,
  place: Place,
  value: unknown,
  spec: UncertainSpec,
): Read | undefined {
  if (typeof value === 'number') {
    const number = numberFrom(reading, place, value, spec.central ?? spec.range);
    if (number === undefined) return undefined;
    return { marginal: { kind: 'fixed', value: number }, spread: null, source: NOT_STATED, note: '' };
  }
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    const right = `a number ${rangeInWords(spec.central ?? spec.range)}, or an object with the key "marginal"`;
    reading.faults.add(place, describeFound(value), right);
    return undefined;
  }
  const kind = marginalKind(reading, place, value, spec.kinds ?? MARGINAL_KINDS);
  if (kind === undefined) return undefined;
  const keys = MARGINAL_KEYS[kind];
  const opened = openObject(reading, place, value, {
    required: ['marginal', ...keys.required],
    optional: [...keys.optional, 'varies', 'source', 'note'],
  })!;
  const entered = readMarginal(reading, opened, kind, (kind === 'fixed' && spec.central) || spec.range);
  return whole<Read>({
    marginal:
      entered && centralMarginal(reading, place, physicalMarginal(reading, place, entered, spec.range), spec),
    spread: orElse<Spread | null>(opened, 'varies', null, () => spreadOf(reading, opened, kind, spec)),
    source: orElse(opened, 'source', NOT_STATED, () => readSource(reading, opened)),
    note: readText(reading, opened, 'note'),
  });
}

function marginalKind(
  reading: Reading,
  place: Place,
  value: object,
  kinds: readonly MarginalKind[],
): MarginalKind | undefined {
  const given: unknown = Object.hasOwn(value, 'marginal')
    ? (value as { marginal: unknown }).marginal
    : undefined;
  const kind = kinds.find((each) => each === given);
  if (kind !== undefined) return kind;
  const nearest = typeof given === 'string' ? nearestWord(given, kinds) : null;
  const right = nearest === null ? inWords(kinds) : quoted(nearest);
  reading.faults.add(placeWithin(place, 'marginal', 'marginal'), describeFound(given), right);
  return undefined;
}

function spreadOf(
  reading: Reading,
  object: OpenedObject,
  kind: MarginalKind,
  spec: UncertainSpec,
): Spread | undefined {
  const place = placeOfKey(object, 'varies');
  if (spec.varies === undefined) {
    reading.faults.add(
      place,
      'a spread from place to place',
      'none here: it has one value for the whole section',
    );
    return undefined;
  }
  if (kind === 'fixed') {
    reading.faults.add(place, 'a spread of a fixed number', 'none, or a marginal that is not fixed');
    return undefined;
  }
  return readSpread(reading, place, object.entries.get('varies'), spec.varies);
}

function readSource(reading: Reading, object: OpenedObject): Source | undefined {
  const place = placeOfKey(object, 'source');
  const opened = openObject(reading, place, object.entries.get('source'), {
    required: ['kind'],
    optional: ['text'],
  });
  return (
    opened &&
    whole<Source>({
      kind: readChoice(reading, opened, 'kind', SOURCE_KINDS),
      text: readText(reading, opened, 'text'),
    })
  );
}

/** The marginal; undefined, with a fault, where its median is not what a central value may be. */
function centralMarginal(
  reading: Reading,
  place: Place,
  marginal: Marginal | undefined,
  { central }: UncertainSpec,
): Marginal | undefined {
  if (marginal === undefined || central === undefined || isInRange(central, median(marginal)))
    return marginal;
  reading.faults.add(
    place,
    `a median of ${shortNumber(median(marginal))}`,
    `a median ${rangeInWords(central)}`,
  );
  return undefined;
}

/** A number to four digits, for a sentence. */
export function shortNumber(value: number): string {
  return String(Number(value.toPrecision(4)));
}
