import { describe, expect, it } from 'vitest';
import { drainageOfParts, drainOutlets } from '../../../engine/drainage/boundaries.ts';

const [free, clay] = [true, false];

describe('strata', () => {
  it('are neighbouring poorly draining layers, so that cutting one changes none', () => {
    expect(drainageOfParts([free, clay, clay, free, clay], true).stratum).toEqual([-1, 0, 0, -1, 1]);
    expect(drainageOfParts([free, clay, clay, clay, free, clay], true).strata).toBe(2);
  });

  it('meet the drained top or a free-draining layer joined to it, or else lie deeper', () => {
    expect(drainageOfParts([clay, free, clay], true).meetsTop).toEqual([true, false]);
    expect(drainageOfParts([clay], false).meetsTop).toEqual([false]);
    expect(drainageOfParts([free, free, clay, free], true).joinedToTop).toEqual([true, true, false, false]);
    expect(drainageOfParts([free, free, clay, free], true).meetsTop).toEqual([true]);
  });
});

describe('the outlets of a drain', () => {
  const both = { base: 12, topDrained: true, baseDrained: true };

  it('are its ends at drained boundaries', () => {
    expect(drainOutlets({ top: 0, foot: 12 }, [], both)).toEqual([0, 12]);
    expect(drainOutlets({ top: 0, foot: 8 }, [], both)).toEqual([0]);
    expect(drainOutlets({ top: 1, foot: 8 }, [], both)).toEqual([]);
    expect(drainOutlets({ top: 0, foot: 12 }, [], { ...both, topDrained: false })).toEqual([12]);
  });

  it('are its ends in free-draining layers and both faces of those that it crosses', () => {
    const seams = [
      { top: 0, base: 2 },
      { top: 6, base: 6.2 },
      { top: 9, base: 12 },
    ];
    const found = drainOutlets({ top: 1, foot: 10 }, seams, {
      ...both,
      topDrained: false,
      baseDrained: false,
    });
    expect(found).toEqual([1, 2, 6, 6.2, 9, 10]);
  });
});
