import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { radixOrder } from '../../../engine/summary/radixOrder.ts';
import { risingOrder } from '../../../engine/summary/risingOrder.ts';
import { sortedColumn } from '../../../engine/summary/sortedColumn.ts';

/** The order by its definition, through a comparison of each two. */
const slowOrder = (values: ArrayLike<number>) =>
  Array.from(values, (value, place) => ({ value, place }))
    .sort((a, b) => {
      if (Number.isNaN(a.value) || Number.isNaN(b.value)) {
        return Number(Number.isNaN(a.value)) - Number(Number.isNaN(b.value)) || a.place - b.place;
      }
      return a.value < b.value ? -1 : a.value > b.value ? 1 : a.place - b.place;
    })
    .map(({ place }) => place);

const anyNumber = fc.double();
const withTies = fc.oneof(
  fc.integer({ min: -3, max: 3 }),
  fc.constantFrom(-0, 0, Infinity, -Infinity, NaN, 1e-320),
);
const settlements = fc.double({ min: 0.1, max: 0.4, noNaN: true });

describe.each([
  ['risingOrder', risingOrder],
  ['radixOrder', radixOrder],
])('%s', (_, order) => {
  it.each([
    ['any numbers', anyNumber],
    ['ties, both zeros, infinities and NaN', withTies],
    ['settlements', settlements],
  ])('puts %s as a slow comparison does', (_name, arbitrary) => {
    fc.assert(
      fc.property(fc.array(arbitrary, { maxLength: 300 }), (values) => {
        expect([...order(Float64Array.from(values))]).toEqual(slowOrder(values));
      }),
      { seed: 17, numRuns: 300 },
    );
  });

  it('puts values right that crowd about one far from the rest', () => {
    const values = Float64Array.from({ length: 3000 }, (_, i) =>
      i === 7 ? 1e12 : ((i * 7919) % 3000) * 1e-9,
    );
    expect([...order(values)]).toEqual(slowOrder(values));
  });
});

describe('a sorted column', () => {
  it('is each replicate sorted by itself, and the whole sorted', () => {
    const column = fc.array(fc.array(fc.oneof(settlements, withTies), { maxLength: 30 }), { maxLength: 8 });
    fc.assert(
      fc.property(column, (own) => {
        const values = Float64Array.from(own.flat());
        const { sorted, ofReplicates } = sortedColumn(
          values,
          own.map((each) => each.length),
        );
        const plain = (list: ArrayLike<number>) => Array.from(list, (value) => value + 0);
        // zeros are ties here, and not so to the sort of typed arrays
        expect(plain(sorted)).toEqual([...Float64Array.from(plain(values)).sort()]);
        expect(ofReplicates.map(plain)).toEqual(
          own.map((each) => [...Float64Array.from(plain(each)).sort()]),
        );
      }),
      { seed: 18, numRuns: 200 },
    );
  });

  it('is refused when the replicates do not add up', () => {
    expect(() => sortedColumn(new Float64Array(5), [2, 2])).toThrow(
      'sortedColumn: counts must add to 5, got 4',
    );
  });
});
