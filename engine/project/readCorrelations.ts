import { firstBreakingPair, linkedTo } from './correlationMatrix.ts';
import { describeFound, quoted } from './describeFound.ts';
import type { RankCorrelation } from './model.ts';
import { nearestRankCorrelations } from './nearestCorrelation.ts';
import { nearestWord } from './nearestWord.ts';
import { betweenBoth } from './numberRange.ts';
import { openObject, placeOfKey, type OpenedObject } from './openObject.ts';
import { MOST } from './physicalRanges.ts';
import { placeWithin, type Place } from './place.ts';
import { readList, readMembers, readNumber, readText } from './readValues.ts';
import { whole, wholeList, type Reading } from './reading.ts';

export const CORRELATION_KEYS = { required: ['between', 'rank_correlation'], optional: ['note'] } as const;
/** Of a rank correlation; ±1 would make one input of two. */
export const RANK = betweenBoth(-1, 1);
const MOST_INPUTS = 150;

/** Rank correlations between inputs, whose matrix is positive definite on the scores. */
export function readCorrelations(reading: Reading, project: OpenedObject): RankCorrelation[] | undefined {
  const paired = new Set<string>();
  const places: Place[] = [];
  const count = { least: 0, most: MOST.correlations };
  const members = readMembers(
    reading,
    project,
    'rank_correlations',
    count,
    'rank correlation',
    (place, value) => {
      places.push(place);
      const object = openObject(reading, place, value, CORRELATION_KEYS);
      if (object === undefined) return undefined;
      readText(reading, object, 'note');
      const rank = readNumber(reading, object, 'rank_correlation', RANK);
      const inputs = readList(reading, object, 'between', { least: 2, most: 2 })?.map((name, i) =>
        readInput(reading, placeWithin(placeOfKey(object, 'between'), i, `input ${i + 1}`), name),
      );
      const [first, second] = inputs ?? [];
      if (first === undefined || second === undefined) return undefined;
      const pair = first < second ? `${first} ${second}` : `${second} ${first}`;
      if (first === second) {
        reading.faults.add(placeOfKey(object, 'between'), 'an input with itself', 'two different inputs');
      } else if (paired.has(pair)) {
        reading.faults.add(
          placeOfKey(object, 'between'),
          'a pair that stands above already',
          'each pair once',
        );
      }
      paired.add(pair);
      return whole<RankCorrelation>({ first, second, rank });
    },
  );
  const correlations = members && wholeList(members);
  if (correlations !== undefined && paired.size === correlations.length)
    refuseIndefinite(reading, correlations, places);
  return correlations;
}

/** Place among the inputs of the one that a permanent name names. */
function readInput(reading: Reading, place: Place, name: unknown): number | undefined {
  if (typeof name !== 'string') {
    reading.faults.add(
      place,
      describeFound(name),
      'the permanent name of an input, such as "soil/<name>/compression_index"',
    );
    return undefined;
  }
  const index = reading.inputs.findIndex((input) => input.name === name);
  if (index >= 0) return index;
  if (reading.brokenNames.has(name)) return undefined;
  if (reading.fixedNames.has(name)) {
    reading.faults.add(
      place,
      `${quoted(name)}, which is fixed`,
      'an input with a marginal that is not fixed',
    );
    return undefined;
  }
  const names = reading.inputs.map((input) => input.name);
  const nearest = nearestWord(name, names);
  const right =
    nearest !== null
      ? quoted(nearest)
      : `the permanent name of an input${names.length > 0 ? `, such as ${quoted(names[0])}` : '; this project has none'}`;
  reading.faults.add(place, `${quoted(name)}, which no input is called`, right);
  return undefined;
}

function refuseIndefinite(
  reading: Reading,
  correlations: readonly RankCorrelation[],
  places: readonly Place[],
): void {
  const named = new Set(correlations.flatMap(({ first, second }) => [first, second]));
  if (named.size > MOST_INPUTS) {
    const where = { pointer: '/rank_correlations', path: 'rank correlations' };
    reading.faults.add(where, `${named.size} inputs that are correlated`, `at most ${MOST_INPUTS}`);
    return;
  }
  const breaking = firstBreakingPair(correlations);
  if (breaking < 0) return;
  const name = (input: number) => reading.inputs[input].name;
  const pairInWords = ({ first, second, rank }: RankCorrelation) =>
    `${name(first)} with ${name(second)} ${rank}`;
  const linked = linkedTo(correlations, breaking);
  const offer = nearestRankCorrelations(linked);
  const right =
    offer === null
      ? 'a weaker correlation, so that the matrix of all pairs is positive definite'
      : `correlations that can be, the nearest of which are: ${offer.map(pairInWords).join('; ')}`;
  const found = `${pairInWords(correlations[breaking])}, with which the matrix is no longer positive definite`;
  reading.faults.add(places[breaking], found, right);
}
