import { describe, expect, it } from 'vitest';
import { actingShare, changesOf } from '../../../engine/load/programme.ts';

describe('the share of a load that acts', () => {
  const period = { start: 1, end: 3, removalStart: 10, removalEnd: 12 };

  it('grows evenly over its placing and falls evenly over its removal', () => {
    const shares = [0, 1, 2, 3, 5, 10, 11, 12, 20].map((date) => actingShare(period, date, 1));
    expect(shares).toEqual([0, 0, 0.5, 1, 1, 1, 0.5, 0, 0]);
    expect(shares).toEqual([0, 1, 2, 3, 5, 10, 11, 12, 20].map((date) => actingShare(period, date, -1)));
  });

  it('jumps where it comes or goes at once, and only there differs before and after', () => {
    const sudden = { start: 1, end: 1, removalStart: 10, removalEnd: 10 };
    expect([actingShare(sudden, 1, -1), actingShare(sudden, 1, 1)]).toEqual([0, 1]);
    expect([actingShare(sudden, 10, -1), actingShare(sudden, 10, 1)]).toEqual([1, 0]);
  });

  it('is whole at all dates for what stands already and stays', () => {
    const standing = { start: -Infinity, end: -Infinity, removalStart: Infinity, removalEnd: Infinity };
    expect(actingShare(standing, -5, -1)).toBe(1);
    expect(actingShare(standing, 500, 1)).toBe(1);
    expect(changesOf(standing)).toEqual([]);
  });
});
