import { describe, expect, it } from 'vitest';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { likelyToGovern } from '../../../engine/settlement/likelyToGovern.ts';
import { plainModel, type Plain, type PlainCompressible } from './plainModel.ts';

/** Clay of one σ'p throughout, 4 m thick; fill of 20 kN/m³ with upright faces, 10 m wide. */
const clay = (stress: number): PlainCompressible => ({
  unitWeight: 19,
  compressionIndex: 0.5,
  recompressionIndex: 0.05,
  voidRatio: 1,
  profile: [
    [0, stress],
    [4, stress],
  ],
  cv: 1,
});
const given = (stress: number, thickness: number): Plain => ({
  layers: [{ thickness: 4, soil: clay(stress) }],
  lifts: [{ thickness, crestWidth: 10, slope: 0, unitWeight: 20, placing: [0, 0.1] }],
  wide: false,
  horizon: 10,
});
const judged = (plain: Plain) => {
  const model = plainModel(plain);
  return likelyToGovern(model, centralGround(model));
};

describe('what is likely to govern', () => {
  it('is stability where 5.14 · 0.22 σ′p is below 1.5 times the pressure of the fill, and not where it is above', () => {
    // 5.14 · 0.22 · 100 = 113.08 kPa against 1.5 · 20 · h: equal at h = 3.769 m
    expect(judged(given(100, 3.7)).stability).toBe(false);
    expect(judged(given(100, 3.8)).stability).toBe(true);
  });

  it('judges stability by the highest stage, a surcharge included', () => {
    const low = given(100, 2);
    const surcharge = {
      thickness: 2,
      crestWidth: 10,
      slope: 0,
      unitWeight: 20,
      placing: [1, 1.1],
      removal: [2, 2.1],
    } as const;
    expect(judged(low).stability).toBe(false);
    expect(judged({ ...low, lifts: [...low.lifts!, surcharge] }).stability).toBe(true);
  });

  it('is spreading where the base is narrower than four times the soft soil', () => {
    const wider = (thickness: number): Plain => ({
      ...given(100, 1),
      layers: [{ thickness, soil: clay(100) }],
    });
    expect(judged(wider(2.4)).spreading).toBe(false);
    expect(judged(wider(2.6)).spreading).toBe(true);
  });

  it('is seepage where the base head brings the effective stress below 5 kPa', () => {
    // at the base of 4 m: 4 · (19 − 9.81) = 36.76 kPa; 5 kPa are left at a head of 31.76/9.81 = 3.237 m
    expect(judged({ ...given(100, 1), baseExcessHead: 3.2 }).seepage).toBe(false);
    expect(judged({ ...given(100, 1), baseExcessHead: 3.3 }).seepage).toBe(true);
  });
});
