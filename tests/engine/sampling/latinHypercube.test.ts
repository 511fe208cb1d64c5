import { describe, it, expect } from 'vitest';
import fc from 'fast-check';
import { latinHypercube } from '../../../engine/sampling/latinHypercube.ts';
import { randomStream } from '../../../engine/random/randomStream.ts';

describe('latinHypercube', () => {
  it('puts exactly one probability into each stratum, whatever the count and the stream', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), fc.nat(), (count, seed) => {
        const column = latinHypercube(randomStream(seed, 'test'), count);
        const strata = Array.from(column, (p) => Math.floor(p * count)).sort((a, b) => a - b);
        expect(strata).toEqual(Array.from({ length: count }, (_, i) => i));
        expect(Math.min(...column)).toBeGreaterThan(0);
        expect(Math.max(...column)).toBeLessThan(1);
      }),
      { seed: 3, numRuns: 200 },
    );
  });

  it('keeps a probability in its stratum where the random number is next to 1 or next to 0', () => {
    for (const extreme of [1 - 2 ** -53, 2 ** -53]) {
      const column = latinHypercube({ next: () => extreme }, 100);
      const strata = Array.from(column, (p) => Math.floor(p * 100)).sort((a, b) => a - b);
      expect(strata).toEqual(Array.from({ length: 100 }, (_, i) => i));
      expect(Math.max(...column)).toBeLessThan(1);
      expect(Math.min(...column)).toBeGreaterThan(0);
    }
  });

  it('places the probability uniformly within its stratum', () => {
    const count = 100;
    const places: number[] = [];
    for (let study = 0; study < 100; study++) {
      for (const p of latinHypercube(randomStream(5, study), count))
        places.push(p * count - Math.floor(p * count));
    }
    const mean = places.reduce((sum, place) => sum + place, 0) / places.length;
    // Four standard errors of the mean of 10,000 uniform numbers.
    expect(Math.abs(mean - 0.5)).toBeLessThan(4 / Math.sqrt(12 * places.length));
    places.sort((a, b) => a - b);
    // Kolmogorov's bound at a chance of 1 in 1,000: 1.95/√n.
    const distance = Math.max(...places.map((place, i) => Math.abs(place - (i + 0.5) / places.length)));
    expect(distance).toBeLessThan(1.95 / Math.sqrt(places.length));
  });

  it('refuses a count that is not a whole number of at least 1', () => {
    for (const count of [0, -1, 1.5, NaN]) {
      expect(() => latinHypercube(randomStream(1), count)).toThrow(RangeError);
    }
  });
});
