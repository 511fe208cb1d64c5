import { describe, expect, it } from 'vitest';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { realise } from '../../../engine/settlement/realise.ts';
import type { ClampCounts } from '../../../engine/settlement/realisations.ts';
import { plainModel, type Plain, type PlainCompressible } from './plainModel.ts';

const clay: PlainCompressible = {
  unitWeight: 16,
  compressionIndex: 0.6,
  recompressionIndex: 0.06,
  voidRatio: 1.5,
  ocr: 1.3,
  cv: 2,
};
const given = (soil: PlainCompressible, pressure: number): Plain => ({
  layers: [
    { thickness: 1, soil: { modulus: 2e4, unitWeight: 18 } },
    { thickness: 4, soil },
  ],
  waterDepth: 0.5,
  loads: [{ pressure }],
  horizon: 30,
});
const counted = (plain: Plain): ClampCounts => {
  const model = plainModel(plain);
  return realise(model, centralGround(model)).counts;
};

describe('the counts of what was clamped', () => {
  it('are all zero where nothing was', () => {
    expect(Object.values(counted(given(clay, 40))).every((count) => count === 0)).toBe(true);
  });

  it('count a realisation once for each clamp, whatever the number of cells', () => {
    expect(counted(given({ ...clay, ocr: 0.9 }, 40)).preconsolidationRaised).toBe(1);
    expect(counted(given({ ...clay, recompressionIndex: 0.7 }, 40)).recompressionSetToCompression).toBe(1);
  });

  it('count a strain above 30 % and a void ratio below 0.1', () => {
    // C_c/(1 + e0) = 0.24 a decade; 1000 kPa on 15 to 35 kPa are 1.5 to 1.8 decades, strain 0.32 to 0.40;
    // e = 1.5 − 2.5 · 0.40 = 0.5 at least; with twice the C_c, 1.5 − 2.5 · 0.8 is below 0
    const strained = counted(given(clay, 1000));
    expect(strained.strainAboveThirtyPercent).toBe(1);
    expect(strained.voidRatioBelowTenth).toBe(0);
    expect(counted(given({ ...clay, compressionIndex: 1.2 }, 1000)).voidRatioBelowTenth).toBe(1);
  });
});
