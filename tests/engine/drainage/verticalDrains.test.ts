import { describe, expect, it } from 'vitest';
import { smearedDrainFactor, wayToOutlet, wellResistance } from '../../../engine/drainage/verticalDrains.ts';

describe('the way of water along a drain', () => {
  it('is half the drain at most where both ends are outlets', () => {
    expect(wayToOutlet(3, [0, 10], 0, 10)).toEqual({ distance: 3, longest: 5 });
    expect(wayToOutlet(9, [0, 10], 0, 10)).toEqual({ distance: 1, longest: 5 });
  });

  it('is the whole drain at most where one end is blind', () => {
    expect(wayToOutlet(3, [0], 0, 10)).toEqual({ distance: 3, longest: 10 });
    expect(wayToOutlet(3, [10], 2, 10)).toEqual({ distance: 7, longest: 8 });
  });

  it('ends at the seams that the drain crosses', () => {
    expect(wayToOutlet(5, [0, 4, 4.5, 12], 0, 12)).toEqual({ distance: 0.5, longest: 3.75 });
  });

  it('does not exist where the drain has no outlet', () => expect(wayToOutlet(3, [], 0, 10)).toBeNull());
});

describe('the resistance of a well', () => {
  it('vanishes at the outlet, is largest at the blind end, and two thirds of that in the mean', () => {
    const [l, capacity] = [8, 50];
    expect(wellResistance(0, l, capacity)).toBe(0);
    const largest = wellResistance(l, l, capacity);
    expect(largest).toBeCloseTo((Math.PI * l * l) / capacity, 12);
    let sum = 0;
    for (let i = 0; i < 1000; i += 1) sum += wellResistance((l * (i + 0.5)) / 1000, l, capacity) / 1000;
    expect(sum / largest).toBeCloseTo(2 / 3, 5);
  });

  it('is none for a drain of any capacity', () => expect(wellResistance(4, 8, Infinity)).toBe(0));
});

describe('the drain factor', () => {
  it('does not depend on a smear zone as permeable as the clay', () => {
    expect(smearedDrainFactor(20, 3, 1)).toBeCloseTo(smearedDrainFactor(20, 1, 1), 12);
  });

  it('refuses a drain as wide as its cylinder, a smear zone inside the drain or beyond the cylinder, and no number', () => {
    expect(() => smearedDrainFactor(1, 1, 1)).toThrow(RangeError);
    expect(() => smearedDrainFactor(10, 0.9, 1)).toThrow(RangeError);
    expect(() => smearedDrainFactor(10, 11, 1)).toThrow(RangeError);
    expect(() => smearedDrainFactor(NaN, 1, 1)).toThrow(RangeError);
    expect(() => smearedDrainFactor(10, NaN, 1)).toThrow(RangeError);
  });
});
