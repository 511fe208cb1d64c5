import fc from 'fast-check';
import { mean, sumNthPowerDeviations } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { randomStream } from '../../../engine/random/randomStream.ts';
import { deviationsOf, equalBins, firstOrderShare } from '../../../engine/summary/firstOrderShare.ts';
import { risingOrder } from '../../../engine/summary/risingOrder.ts';

const shareOf = (input: Float64Array, result: Float64Array) =>
  firstOrderShare(equalBins(risingOrder(input)), deviationsOf(result));
const draw = (name: string, count: number) => {
  const stream = randomStream(12, name);
  return Float64Array.from({ length: count }, () => stream.next());
};

/** By its definition, from lists of the results in each bin, cut where the counts are most equal. */
function slowShare(input: readonly number[], result: readonly number[], bins: number): number {
  const pairs = input.map((value, i) => [value, result[i]]).sort((a, b) => a[0] - b[0]);
  const count = pairs.length;
  const within = Array.from({ length: bins }, (_, bin) =>
    pairs
      .slice(Math.floor((bin * count) / bins), Math.floor(((bin + 1) * count) / bins))
      .map(([, value]) => value),
  );
  const squares = within.reduce((sum, values) => sum + sumNthPowerDeviations(values, 2), 0);
  const total = sumNthPowerDeviations([...result], 2);
  return 1 - squares / (count - bins) / (total / (count - 1));
}

describe('the first-order share of the variance', () => {
  it('is that of its definition over 32 bins, or fewer of 20', () => {
    fc.assert(
      fc.property(fc.integer({ min: 40, max: 1500 }), fc.integer({ min: 0, max: 999 }), (count, name) => {
        const input = draw(`x ${name}`, count);
        const result = draw(`e ${name}`, count).map((value, i) => value + 2 * input[i] * input[i]);
        const bins = Math.min(32, Math.floor(count / 20));
        expect(shareOf(input, result)).toBeCloseTo(slowShare([...input], [...result], bins), 10);
      }),
      { seed: 21, numRuns: 60 },
    );
  });

  it('has no bias for an input that does nothing', () => {
    const shares = Array.from({ length: 60 }, (_, i) =>
      shareOf(draw(`alone ${i}`, 2000), draw(`result ${i}`, 2000)),
    );
    const scatter = Math.sqrt(sumNthPowerDeviations(shares, 2) / (shares.length - 1) / shares.length);
    expect(Math.abs(mean(shares))).toBeLessThan(3 * scatter);
    // without the correction it would be 31/1999
    expect(3 * scatter).toBeLessThan(31 / 1999);
  });

  it('is 1 of an input that alone makes the result, but for the slope within 32 bins', () => {
    const input = draw('whole', 3200);
    // variance left within a bin of a straight line: 1/32²
    expect(
      Math.abs(
        shareOf(
          input,
          input.map((value) => 5 - 3 * value),
        ) -
          (1 - 1 / 1024),
      ),
    ).toBeLessThan(2e-4);
  });

  it('does not feel a result moved or scaled', () => {
    const [input, noise] = [draw('moved', 1000), draw('noise', 1000)];
    const result = input.map((value, i) => value + noise[i]);
    const moved = result.map((value) => 1e6 - 1e3 * value);
    expect(shareOf(input, moved)).toBeCloseTo(shareOf(input, result), 8);
  });

  it('is not known of fewer than 40 realisations, nor of a result that varies by rounding alone', () => {
    expect(shareOf(draw('few', 39), draw('fewer', 39))).toBeNaN();
    const rounding = draw('r', 200).map((value) => 1 + (value > 0.5 ? 2 ** -52 : 0));
    expect(shareOf(draw('many', 200), rounding)).toBeNaN();
  });
});
