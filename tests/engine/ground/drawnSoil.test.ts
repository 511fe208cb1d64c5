import { describe, expect, it } from 'vitest';
import { drawnSoil, preconsolidationStress } from '../../../engine/ground/drawnSoil.ts';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { plainModel, type PlainCompressible } from '../settlement/plainModel.ts';

const clay: PlainCompressible = { compressionIndex: 0.5, recompressionIndex: 0.05, voidRatio: 1.5, cv: 1 };

function drawn(soil: PlainCompressible) {
  const model = plainModel({ layers: [{ thickness: 1, soil }], horizon: 1 });
  const found = drawnSoil(model.soils[0], centralGround(model), 0, 0);
  if (found.behaviour !== 'compressible') throw new Error('a compressible soil was given');
  return found;
}

describe('a drawn soil', () => {
  it('swells on Cr where Cs is not given', () => {
    expect(drawn(clay).swellingIndex).toBe(0.05);
    expect(drawn({ ...clay, swellingIndex: 0.03 }).swellingIndex).toBe(0.03);
  });

  it('has Cr set to Cc where it was drawn above it, and says so', () => {
    const above = drawn({ ...clay, recompressionIndex: 0.7 });
    expect(above.recompressionIndex).toBe(0.5);
    expect(above.recompressionSetToCompression).toBe(true);
    expect(drawn(clay).recompressionSetToCompression).toBe(false);
  });

  it('has no secondary compression where none is given', () => expect(drawn(clay).secondaryIndex).toBe(0));
});

describe('the preconsolidation stress', () => {
  const at = (soil: Partial<PlainCompressible>, stress: number, depth: number) =>
    preconsolidationStress(drawn({ ...clay, ...soil }).preconsolidation, stress, depth);

  it('by OCR is a multiple of the initial stress', () => expect(at({ ocr: 1.4 }, 50, 3)).toBeCloseTo(70, 12));

  it('by POP lies a constant above it', () => expect(at({ pop: 25 }, 50, 3)).toBe(75));

  it('by two depths is straight between and beyond them', () => {
    const profile = [
      [2, 60],
      [6, 100],
    ] as const;
    expect(at({ profile }, 50, 4)).toBe(80);
    expect(at({ profile }, 50, 8)).toBe(120);
    expect(at({ profile }, 50, 0)).toBe(40);
  });
});
