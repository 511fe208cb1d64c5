import { describe, expect, it } from 'vitest';
import { layersOfUniformClay } from '../../published/uniformClay.ts';
import { marchedModel } from './marchedColumn.ts';
import type { Plain } from './plainModel.ts';

/**
 * With all lengths λ times as long: strains at the same share of depth and of the time H²/c_v are the same where
 * stresses are, or grow λ times everywhere (Cr, Cc and k by c_v know ratios of stress only). So settlements are λ
 * times, times λ² as large, exactly, on a grid that scales too.
 */
const times = [0.05, 0.3, 1, 2, 4, 10];
const coarse = { cells: 60, steps: 8 };

describe('doubling all lengths under the same stresses', () => {
  const given = (scale: number): Plain => ({
    layers: layersOfUniformClay({
      thickness: 5 * scale,
      initialStress: 60,
      compressionIndex: 0.8,
      recompressionIndex: 0.1,
      voidRatio: 2,
      ocr: 1.3,
      cv: 1.2,
      horizontalRatio: 2,
      secondaryIndex: 0.03,
    }),
    loads: [
      { pressure: 70, start: 0 },
      { pressure: 30, start: 1 * scale * scale, end: 2 * scale * scale },
    ],
    // the water of 5 m more has λ² times as far to go for λ times as much: q_w grows λ² times
    drains: {
      spacing: 3 * scale,
      diameter: 0.1 * scale,
      smearRatio: 2,
      permeabilityRatio: 3,
      dischargeCapacity: 4 * scale * scale,
      top: 1,
      foot: 1 + 4 * scale,
    },
    secondary: true,
    base: 'closed',
    horizon: 10 * scale * scale,
  });

  it('doubles the settlement at four times the time', () => {
    const [one, two] = [marchedModel(given(1), coarse), marchedModel(given(2), coarse)];
    for (const time of times) {
      expect(two.settlementAt(4 * time) / (2 * one.settlementAt(time))).toBeCloseTo(1, 6);
    }
  });
});

describe('doubling all lengths and loads', () => {
  const given = (scale: number): Plain => ({
    layers: [
      { thickness: scale, soil: { modulus: 1e4 * scale, unitWeight: 19 } },
      {
        thickness: 6 * scale,
        soil: {
          unitWeight: 16,
          compressionIndex: 0.8,
          recompressionIndex: 0.1,
          voidRatio: 2,
          pop: 20 * scale,
          cv: 1.2,
          secondaryIndex: 0.03,
        },
      },
    ],
    waterDepth: 0.5 * scale,
    lifts: [{ thickness: 3 * scale, crestWidth: 12 * scale, placing: [0, 0.4 * scale * scale] }],
    wide: false,
    heldUntil: 5 * scale * scale,
    submergence: true,
    secondary: true,
    horizon: 10 * scale * scale,
  });

  it('doubles the settlement at four times the time, the weight of the fill and the water included', () => {
    const [one, two] = [marchedModel(given(1), coarse), marchedModel(given(2), coarse)];
    for (const time of times) {
      expect(two.settlementAt(4 * time) / (2 * one.settlementAt(time))).toBeCloseTo(1, 6);
    }
    expect(two.track.toppedUp / (2 * one.track.toppedUp)).toBeCloseTo(1, 6);
  });
});
