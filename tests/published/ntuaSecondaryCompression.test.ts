/**
 * NTUA teaching note, On practical matters of calculating secondary compression and reduction of secondary compression
 * by surcharging: S = H0 Cα/(1 + e0) log(t/tp), tp in practice at 95 %; the same as Hp Cα/(1 + ep) log(t/tp). Definition
 * read; own numbers: Cα = 0.04, e0 = 2.2, H0 = 10 m. Closed form, 1e-5 m.
 * Tolerance: between two times after tp 1e-5 m; from tp itself 5e-4 of the degree at 95 % shifts tp by 0.36 %, which is
 * 2e-4 m.
 */
import { describe, expect, it } from 'vitest';
import { valueAtDate } from '../../engine/settlement/settlementHistory.ts';
import { endOfPrimary, marchedModel } from '../engine/settlement/marchedColumn.ts';
import type { Plain } from '../engine/settlement/plainModel.ts';
import { layersOfUniformClay } from './uniformClay.ts';

const EXPECTED: readonly (readonly [number, number])[] = [
  [2, 0.03763],
  [5, 0.08737],
  [10, 0.125],
  [20, 0.16263],
];

const given: Plain = {
  layers: layersOfUniformClay({
    thickness: 10,
    initialStress: 60,
    compressionIndex: 0.9,
    recompressionIndex: 0.1,
    voidRatio: 2.2,
    cv: 40,
    secondaryIndex: 0.04,
  }),
  loads: [{ pressure: 40 }],
  secondary: true,
  horizon: 1,
};
const end = endOfPrimary({ ...given, secondary: false });
const { track } = marchedModel({ ...given, horizon: 21 * end });
const secondaryAt = (times: number) => valueAtDate(track, track.secondary, times * end);

describe('NTUA note, secondary compression after the end of primary', () => {
  it.each(EXPECTED)('after %f times the time of primary it is %f m', (times, expected) => {
    expect(Math.abs(secondaryAt(times) - expected)).toBeLessThan(2e-4);
  });

  it.each([5, 10, 20])(
    'between twice and %f times that time it grows by the difference of the printed values',
    (times) => {
      const [first] = EXPECTED;
      const [, later] = EXPECTED.find(([of]) => of === times)!;
      // two values of five digits each
      expect(Math.abs(secondaryAt(times) - secondaryAt(2) - (later - first[1]))).toBeLessThan(2e-5);
    },
  );

  it('nothing comes before it', () => expect(Math.abs(secondaryAt(0.99))).toBeLessThan(2e-4));
});
