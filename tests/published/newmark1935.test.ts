/**
 * Newmark (1935), Simplified computation of vertical pressures in elastic foundations, Univ. Illinois Eng. Exp. Sta.
 * Circular 24; Fadum (1948). Closed form, six digits, checked by double quadrature of the point load. Newmark's own
 * form needs +π in the arctangent where m²n² > m² + n² + 1.
 * Four-figure values as tabulated in most textbooks (Das, Craig, Holtz & Kovacs): values from memory, 1.5e-4.
 */
import { describe, expect, it } from 'vitest';
import { cornerInfluence } from '../../engine/load/stressIncrease.ts';

const N = [0.1, 0.2, 0.4, 0.6, 0.8, 1.0, 1.4, 2.0, 3.0, 5.0, 10.0];
/** m, influence at each n. */
const INFLUENCE: readonly (readonly [number, readonly number[]])[] = [
  [
    0.1,
    [
      0.004696, 0.009169, 0.016784, 0.022228, 0.025757, 0.027935, 0.03007, 0.031108, 0.031497, 0.031603,
      0.031619,
    ],
  ],
  [
    0.2,
    [
      0.009169, 0.017903, 0.032798, 0.043475, 0.050418, 0.054714, 0.058939, 0.061001, 0.061777, 0.061987,
      0.062021,
    ],
  ],
  [
    0.4,
    [
      0.016784, 0.032798, 0.060237, 0.080089, 0.093136, 0.101292, 0.109408, 0.113423, 0.114951, 0.115369,
      0.115436,
    ],
  ],
  [
    0.6,
    [
      0.022228, 0.043475, 0.080089, 0.106884, 0.124735, 0.136048, 0.147488, 0.153263, 0.155499, 0.156119,
      0.156219,
    ],
  ],
  [
    0.8,
    [
      0.025757, 0.050418, 0.093136, 0.124735, 0.14607, 0.15978, 0.173894, 0.181185, 0.18407, 0.184884,
      0.185016,
    ],
  ],
  [
    1.0,
    [
      0.027935, 0.054714, 0.101292, 0.136048, 0.15978, 0.175221, 0.191389, 0.199941, 0.203406, 0.204402,
      0.204566,
    ],
  ],
  [
    1.4,
    [
      0.03007, 0.058939, 0.109408, 0.147488, 0.173894, 0.191389, 0.210204, 0.220584, 0.224994, 0.22632,
      0.226544,
    ],
  ],
  [
    2.0,
    [
      0.031108, 0.061001, 0.113423, 0.153263, 0.181185, 0.199941, 0.220584, 0.232466, 0.23782, 0.23954,
      0.239847,
    ],
  ],
  [
    3.0,
    [
      0.031497, 0.061777, 0.114951, 0.155499, 0.18407, 0.203406, 0.224994, 0.23782, 0.24394, 0.246083,
      0.246505,
    ],
  ],
  [
    5.0,
    [
      0.031603, 0.061987, 0.115369, 0.156119, 0.184884, 0.204402, 0.22632, 0.23954, 0.246083, 0.248574,
      0.249138,
    ],
  ],
  [
    10.0,
    [
      0.031619, 0.062021, 0.115436, 0.156219, 0.185016, 0.204566, 0.226544, 0.239847, 0.246505, 0.249138,
      0.249815,
    ],
  ],
];
/** m, n, influence. */
const TEXTBOOK: readonly (readonly [number, number, number])[] = [
  [0.2, 0.2, 0.0179],
  [0.2, 0.4, 0.0328],
  [0.4, 0.4, 0.0602],
  [0.5, 0.5, 0.084],
  [0.6, 0.6, 0.1069],
  [1, 1, 0.1752],
  [1, 2, 0.1999],
  [2, 2, 0.2325],
  [1.0, 10.0, 0.2046],
];

describe('Newmark 1935, below the corner of a rectangle', () => {
  it.each(INFLUENCE)('for m = %f the influence at eleven n is %j', (m, expected) => {
    const z = 3;
    N.forEach((n, i) => expect(Math.abs(cornerInfluence(m * z, n * z, z) - expected[i])).toBeLessThan(1e-6));
  });

  it.each(TEXTBOOK)('for m = %f and n = %f textbooks print %f', (m, n, expected) => {
    expect(Math.abs(cornerInfluence(m, n, 1) - expected)).toBeLessThan(1.5e-4);
  });
});
