import { describe, expect, it } from 'vitest';
import type { Limit } from '../../../engine/project/model.ts';
import { binomialInterval } from '../../../engine/summary/confidenceBand.ts';
import { boundWhenNone, summariseLimit } from '../../../engine/summary/summariseLimit.ts';

const limit: Limit = {
  name: 'invented',
  result: 'settlement_at_horizon',
  point: 0,
  pair: -1,
  value: 0.1,
  date: 1,
};
const replicates = (values: readonly number[], count = 10) =>
  Array.from({ length: count }, () => Float64Array.from(values));

describe('the chance of passing a limit', () => {
  it('counts what lies above the limit, and not what lies on it', () => {
    const { above, of, chance } = summariseLimit(limit, 4, replicates([0.05, 0.1, 0.1000001, -0.3]));
    expect([above, of, chance.value]).toEqual([10, 40, 0.25]);
  });

  it('takes the differential settlement of a pair without its sign', () => {
    const ofPair: Limit = { ...limit, result: 'differential_at_horizon', point: -1, pair: 0 };
    expect(summariseLimit(ofPair, 4, replicates([0.05, 0.1, 0.1000001, -0.3])).above).toBe(20);
  });

  it('does not count a settlement upward as large as the limit', () => {
    expect(summariseLimit(limit, 4, replicates([-0.3])).above).toBe(0);
  });

  it('has a bound where none pass, one where all do, and none between', () => {
    const none = summariseLimit(limit, 4, replicates(Array<number>(30).fill(0)));
    const all = summariseLimit(limit, 4, replicates(Array<number>(30).fill(1)));
    const one = summariseLimit(limit, 4, replicates([0, 1]));
    // P(none of N) = 0.05 at the bound
    expect((1 - none.boundWhenNone) ** 300).toBeCloseTo(0.05, 12);
    expect(all.boundWhenNone ** 300).toBeCloseTo(0.05, 12);
    expect(one.boundWhenNone).toBeNaN();
    // the band's own end is the same one-sided 95 % limit, as it leaves 5 % beyond each end
    expect(none.boundWhenNone).toBeCloseTo(binomialInterval(0, 300)[1], 12);
    expect(none.chance.high).toBe(binomialInterval(0, 300)[1]);
    expect(none.boundWhenNone).toBeLessThan(3 / 300);
  });

  // upper one-sided 95 % limits of Clopper & Pearson (1934) for none of N, computed with scipy 1.17.1
  it.each([
    [100, 0.029513049607039932],
    [1000, 0.0029912495450953314],
    [10_000, 0.00029952835977664627],
  ])('has for none of %i the limit by the beta quantile', (of, expected) => {
    expect(Math.abs(boundWhenNone(0, of) / expected - 1)).toBeLessThan(1e-10);
  });
});
