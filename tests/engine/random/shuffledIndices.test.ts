import { describe, it, expect } from 'vitest';
import { randomStream } from '../../../engine/random/randomStream.ts';
import { shuffledIndices } from '../../../engine/random/shuffledIndices.ts';

describe('shuffledIndices', () => {
  it('holds every number below the count once', () => {
    for (const count of [0, 1, 2, 100, 4097]) {
      const sorted = [...shuffledIndices(count, randomStream(1, count))].sort((a, b) => a - b);
      expect(sorted).toEqual(Array.from({ length: count }, (_, i) => i));
    }
  });

  it('gives each of the 24 orders of four equally often: chi-square below 49.7, the 99.9 % point of 23', () => {
    const stream = randomStream(11, 'orders');
    const times = new Map<string, number>();
    const trials = 24_000;
    for (let i = 0; i < trials; i += 1) {
      const order = shuffledIndices(4, stream).join('');
      times.set(order, (times.get(order) ?? 0) + 1);
    }
    expect(times.size).toBe(24);
    const chiSquare = [...times.values()].reduce((sum, n) => sum + (n - 1000) ** 2 / 1000, 0);
    expect(chiSquare).toBeLessThan(49.7);
  });

  it('puts each number at each place equally often among 20: chi-square within five standard errors', () => {
    const stream = randomStream(12, 'places');
    const trials = 8000;
    const times = new Float64Array(400);
    for (let i = 0; i < trials; i += 1) {
      shuffledIndices(20, stream).forEach((value, place) => (times[20 * place + value] += 1));
    }
    const expected = trials / 20;
    const chiSquare = times.reduce((sum, n) => sum + ((n - expected) * (n - expected)) / expected, 0);
    // (20 − 1)² = 361 degrees of freedom
    expect(Math.abs(chiSquare - 361)).toBeLessThan(5 * Math.sqrt(2 * 361));
  });
});
