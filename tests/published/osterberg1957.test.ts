/**
 * Osterberg (1957), Influence values for vertical stresses in a semi-infinite mass due to an embankment loading, 4th
 * ICSMFE London 1:393–394. Closed form, five digits, checked by quadrature of the load.
 * Chart readings in published solutions: Das & Sobhan problem 10.14; CEG 4012 course notes (two); Das, embankment
 * example (from memory: H = 7 m, γ = 17.5 kN/m³, crest 5 m, slopes 14 m wide, 5 m deep: 109.03 kPa of 122.5). Charts
 * read low by up to 0.009: tolerance 0.01.
 */
import { describe, expect, it } from 'vitest';
import { stressIncrease } from '../../engine/load/stressIncrease.ts';

const CRESTS = [0, 0.2, 0.5, 1, 1.5, 2, 3];
/** a/z, influence at each b/z. */
const HALF_EMBANKMENT: readonly (readonly [number, readonly number[]])[] = [
  [0.2, [0.06283, 0.1794, 0.31144, 0.42315, 0.4651, 0.48204, 0.49367]],
  [0.5, [0.14758, 0.24703, 0.35242, 0.4385, 0.47117, 0.48474, 0.4944]],
  [1.0, [0.25, 0.32206, 0.39546, 0.45483, 0.47795, 0.48792, 0.49533]],
  [2.0, [0.35242, 0.39434, 0.43671, 0.47138, 0.48535, 0.49163, 0.49654]],
  [3.0, [0.39758, 0.42631, 0.45539, 0.47936, 0.48918, 0.49367, 0.49728]],
  [5.0, [0.43717, 0.45459, 0.47227, 0.48692, 0.49298, 0.4958, 0.49812]],
];
/** a/z, b/z, influence read off the chart. */
const READINGS: readonly (readonly [number, number, number])[] = [
  [3.0, 0, 0.39],
  [0.889, 2.222, 0.481],
  [0.889, 0, 0.23],
  [2.8, 0.5, 0.445],
];

/** σz/q below the upright end of half an embankment: slope a, crest b, depth 1. */
function influence(slope: number, crest: number): number {
  const pieces = [{ x1: -slope, q1: 0, x2: 0, q2: 1 }];
  if (crest > 0) pieces.push({ x1: 0, q1: 1, x2: crest, q2: 1 });
  return stressIncrease(pieces, { from: -Infinity, to: Infinity }, false, crest, 1);
}

describe('Osterberg 1957, half an embankment', () => {
  it.each(HALF_EMBANKMENT)('for a/z = %f the influence at seven b/z is %j', (slope, expected) => {
    CRESTS.forEach((crest, i) => expect(Math.abs(influence(slope, crest) - expected[i])).toBeLessThan(1e-5));
  });

  it.each(READINGS)('for a/z = %f and b/z = %f the chart is read as %f', (slope, crest, read) => {
    expect(Math.abs(influence(slope, crest) - read)).toBeLessThan(0.01);
  });

  it('below the centre of the embankment in Das the increase is 109.03 kPa', () => {
    expect(Math.abs(2 * 122.5 * influence(14 / 5, 2.5 / 5) - 109.03)).toBeLessThan(2 * 122.5 * 0.01);
  });
});
