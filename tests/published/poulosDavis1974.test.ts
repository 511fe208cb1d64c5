/**
 * Poulos & Davis (1974), Elastic Solutions for Soil and Rock Mechanics, sections on strip and embankment loading (strip:
 * Michell, Carothers; embankment: Gray 1936, Osterberg 1957). Closed form: strip six digits, embankment five, both
 * checked by quadrature. In their form of the embankment the sign of x(α1 − α3) depends on which slope is called 1.
 */
import { describe, expect, it } from 'vitest';
import { liftPressure } from '../../engine/load/fillSection.ts';
import { stressIncrease } from '../../engine/load/stressIncrease.ts';

const ENDLESS = { from: -Infinity, to: Infinity };
const DEPTHS = [0.25, 0.5, 1, 1.5, 2, 3, 4, 6];
/** x/b, σz/q at each z/b, b half the width. */
const STRIP: readonly (readonly [number, readonly number[]])[] = [
  [0.0, [0.993835, 0.959481, 0.81831, 0.668159, 0.549815, 0.395819, 0.305751, 0.208373]],
  [0.5, [0.97879, 0.902232, 0.734653, 0.607064, 0.510497, 0.379094, 0.29761, 0.205683]],
  [1.0, [0.499593, 0.496917, 0.47974, 0.447956, 0.409155, 0.334079, 0.274908, 0.197909]],
  [1.5, [0.02005, 0.089226, 0.213736, 0.270501, 0.287621, 0.273502, 0.242108, 0.185868]],
  [2.0, [0.002961, 0.019309, 0.083922, 0.145661, 0.184838, 0.211246, 0.204746, 0.170721]],
  [3.0, [0.000355, 0.002676, 0.017177, 0.042494, 0.070585, 0.113877, 0.134247, 0.13617]],
];
/** Half the crest, width of a slope, z, σz/(γH) at the centre, shoulder, mid-slope, toe and 2 m beyond the toe. */
const EMBANKMENT: readonly (readonly [number, number, number, readonly number[]])[] = [
  [5, 4, 0.5, [0.99982, 0.9604, 0.49999, 0.03958, 0.0007]],
  [5, 4, 1, [0.99858, 0.92189, 0.49992, 0.07793, 0.00502]],
  [5, 4, 2, [0.98958, 0.85141, 0.49937, 0.14716, 0.02833]],
  [5, 4, 4, [0.93788, 0.74275, 0.49533, 0.24683, 0.10229]],
  [5, 4, 8, [0.76464, 0.60615, 0.47117, 0.33173, 0.21648]],
  [5, 4, 15, [0.51805, 0.45163, 0.39673, 0.33531, 0.2742]],
  [10, 6, 0.5, [0.99997, 0.97353, 0.5, 0.02646, 0.0005]],
  [10, 6, 1, [0.99979, 0.94741, 0.49999, 0.05256, 0.00358]],
  [10, 6, 2, [0.99833, 0.89744, 0.4999, 0.10235, 0.02058]],
  [10, 6, 4, [0.98784, 0.81172, 0.49923, 0.18661, 0.07885]],
  [10, 6, 8, [0.92881, 0.69683, 0.49433, 0.29101, 0.18923]],
  [10, 6, 15, [0.76419, 0.58211, 0.47075, 0.35652, 0.28723]],
  [2.5, 14, 0.5, [0.99971, 0.9886, 0.49999, 0.01136, 0.00022]],
  [2.5, 14, 1, [0.99784, 0.97703, 0.49996, 0.02268, 0.00161]],
  [2.5, 14, 2, [0.9862, 0.95278, 0.49968, 0.04506, 0.00944]],
  [2.5, 14, 4, [0.93662, 0.89848, 0.49755, 0.08772, 0.03809]],
  [2.5, 14, 8, [0.80541, 0.77766, 0.48397, 0.15896, 0.10335]],
  [2.5, 14, 15, [0.60621, 0.59233, 0.43514, 0.22957, 0.18253]],
  [15, 4, 0.5, [0.99999, 0.96042, 0.5, 0.03958, 0.00071]],
  [15, 4, 1, [0.99991, 0.92201, 0.49999, 0.07797, 0.00506]],
  [15, 4, 2, [0.9993, 0.85236, 0.49996, 0.14755, 0.02859]],
  [15, 4, 4, [0.99469, 0.74959, 0.49966, 0.24971, 0.1043]],
  [15, 4, 8, [0.96458, 0.64448, 0.49739, 0.35021, 0.22985]],
  [15, 4, 15, [0.85413, 0.56566, 0.48522, 0.40433, 0.32841]],
];

describe('Poulos & Davis 1974, uniform strip', () => {
  it.each(STRIP)('at x/b = %f the stress at eight depths is %j of the pressure', (x, expected) => {
    const pieces = [{ x1: -2, q1: 1, x2: 2, q2: 1 }];
    DEPTHS.forEach((z, i) => {
      expect(Math.abs(stressIncrease(pieces, ENDLESS, false, 2 * x, 2 * z) - expected[i])).toBeLessThan(1e-6);
    });
  });
});

describe('Poulos & Davis 1974, symmetrical embankment', () => {
  it.each(EMBANKMENT)(
    'with half crest %f m and slope %f m, %f m deep, the stress across is %j',
    (half, slope, z, expected) => {
      const thickness = 4;
      const side = slope / thickness;
      const lift = { crestCentre: 0, crestWidth: 2 * half, leftSlope: side, rightSlope: side, thickness };
      const pieces = liftPressure(lift, 20, [], 0);
      [0, half, half + 0.5 * slope, half + slope, half + slope + 2].forEach((x, i) => {
        const ratio = stressIncrease(pieces, ENDLESS, false, x, z) / (20 * thickness);
        expect(Math.abs(ratio - expected[i])).toBeLessThan(1e-5);
      });
    },
  );
});
