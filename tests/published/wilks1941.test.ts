import { describe, expect, it } from 'vitest';
import { orderStatisticRanks } from '../../engine/summary/orderStatisticRanks.ts';

/**
 * Wilks, S.S. (1941) Determination of sample sizes for setting tolerance limits, Annals of Mathematical Statistics
 * 12; David & Nagaraja, Order Statistics. The sizes 59, 93, 299, 473, 459 and 662 are the classical ones; all were
 * computed again with the binomial distribution of scipy 1.17.1. Whole numbers, so no tolerance.
 */
describe('Wilks (1941), sizes of a sample whose largest value bounds a percentile', () => {
  // one-sided confidence c; the interval of both sides that leaves 1 − c beyond each end has 2c − 1
  it.each([
    [0.95, 0.95, 59],
    [0.99, 0.95, 299],
    [0.99, 0.99, 459],
    [0.9, 0.95, 29],
    [0.9, 0.9, 22],
  ])('share %f at a confidence of %f: %i, and one fewer does not', (share, confidence, size) => {
    const upper = (count: number) => orderStatisticRanks(count, share, 2 * confidence - 1)[1];
    expect(upper(size)).toBe(size);
    // past the last: none bounds it
    expect(upper(size - 1)).toBe(size);
  });

  it.each([
    [0.95, 0.95, 59],
    [0.99, 0.95, 299],
  ])(
    'the smallest value bounds the percentile of 1 less share %f at %f from %i on',
    (share, confidence, size) => {
      const lower = (count: number) => orderStatisticRanks(count, 1 - share, 2 * confidence - 1)[0];
      expect([lower(size - 1), lower(size)]).toEqual([0, 1]);
    },
  );
});

describe('order statistics about a percentile, two-sided 95 %', () => {
  it.each([
    [100, 0.5, 40, 61],
    [100, 0.9, 84, 96],
    [1000, 0.5, 469, 532],
    [1000, 0.95, 936, 964],
    [1000, 0.99, 983, 997],
    [10_000, 0.95, 9457, 9543],
  ])('of %i realisations about the share %f are the ranks %i and %i', (count, share, lower, upper) => {
    expect(orderStatisticRanks(count, share, 0.95)).toEqual([lower, upper]);
  });
});
