import { describe, expect, it } from 'vitest';
import {
  chanceBandText,
  chancePercentText,
  chanceText,
  fewerThan,
  sharePercentText,
  type Chance,
} from '../../../web/words/chanceText.ts';

const chance = (above: number, of: number, low = NaN, high = NaN): Chance => ({
  value: above / of,
  low,
  high,
  above,
  of,
});

describe('a chance in words', () => {
  it('is said of a hundred grounds', () => {
    expect(chanceText(chance(310, 1000))).toBe('31 of 100');
    expect(chanceText(chance(10, 1000))).toBe('1 of 100');
  });

  it('is said of more grounds when it is rare, so that none of it is ever said of a chance above zero', () => {
    expect(chanceText(chance(4, 1000))).toBe('4 of 1,000');
    expect(chanceText(chance(4, 10_000))).toBe('4 of 10,000');
    for (const of of [100, 1000, 30_000, 1_000_000]) expect(chanceText(chance(1, of))).not.toMatch(/^0 /);
  });

  it('is said of more grounds when it is nearly certain, so that all is never said of less than all', () => {
    expect(chanceText(chance(997, 1000))).toBe('997 of 1,000');
    for (const of of [101, 1000, 30_000]) {
      const [part, whole] = chanceText(chance(of - 1, of))
        .replaceAll(',', '')
        .split(' of ');
      expect(Number(part)).toBeLessThan(Number(whole));
    }
  });

  it('of none of 3,000 is fewer than 1 in 1,000, and of all of them all but that', () => {
    expect(chanceText(chance(0, 3000))).toBe('fewer than 1 in 1,000');
    expect(chanceText(chance(3000, 3000))).toBe('all but fewer than 1 in 1,000');
    expect(fewerThan(1000)).toBe('fewer than 1 in 333');
  });

  it('of no realisation at all is unknown', () => {
    expect(chanceText(chance(0, 0))).toBe('an unknown number');
  });
});

describe('the band of a chance', () => {
  it('is widened to whole grounds on the base of the chance itself', () => {
    expect(chanceBandText(chance(310, 1000, 0.2831, 0.3402))).toBe('28 to 35 of 100');
    expect(chanceBandText(chance(310, 1000, 0.28, 0.34))).toBe('28 to 34 of 100');
    expect(chanceBandText(chance(4, 1000, 0.0015, 0.0089))).toBe('1 to 9 of 1,000');
  });

  it('says neither 0 nor 100 at its ends', () => {
    expect(chanceBandText(chance(10, 1000, 0.002, 0.018))).toBe('up to 2 of 100');
    expect(chanceBandText(chance(980, 1000, 0.972, 0.996))).toBe('at least 97 of 100');
  });

  it('is silent where there is none', () => {
    expect(chanceBandText(chance(31, 100))).toBe('');
  });
});

describe('a chance in percent', () => {
  it('is never 0 % or 100 %', () => {
    expect(chancePercentText(chance(0, 3000))).toBe('< 0.1\u202f%');
    expect(chancePercentText(chance(3000, 3000))).toBe('> 99.9\u202f%');
    expect(sharePercentText(0.0001)).toBe('< 0.1\u202f%');
    expect(sharePercentText(0.9999)).toBe('> 99.9\u202f%');
  });

  it('has a decimal only where it is rare or nearly certain', () => {
    expect(chancePercentText(chance(310, 1000))).toBe('31\u202f%');
    expect(chancePercentText(chance(44, 1000))).toBe('4.4\u202f%');
    expect(chancePercentText(chance(956, 1000))).toBe('95.6\u202f%');
  });
});
