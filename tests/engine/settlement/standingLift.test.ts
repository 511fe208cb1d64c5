import { describe, expect, it } from 'vitest';
import { columnOf } from './marchedColumn.ts';
import type { Plain, PlainCompressible } from './plainModel.ts';

const clay: PlainCompressible = {
  unitWeight: 16,
  compressionIndex: 0.6,
  recompressionIndex: 0.06,
  voidRatio: 1.8,
  cv: 2,
};
const coarse = { cells: 16, steps: 8 };

function columnWith(soil: Partial<PlainCompressible>, standing: boolean) {
  const bank = { thickness: 2, unitWeight: 20, standing: true };
  const plain: Plain = {
    layers: [
      { thickness: 1, soil: { modulus: 1e5, unitWeight: 18 } },
      { thickness: 5, soil: { ...clay, ...soil } },
    ],
    lifts: [...(standing ? [bank] : []), { thickness: 1, unitWeight: 20, placing: [0, 1] }],
    horizon: 5,
  };
  return columnOf(plain, coarse);
}

describe('a fill that stands already', () => {
  it('is part of the initial stress', () => {
    const [bare, under] = [columnWith({}, false), columnWith({}, true)];
    bare.law.initialStress.forEach((stress, i) =>
      expect(under.law.initialStress[i]).toBeCloseTo(stress + 40, 9),
    );
  });

  it.each([
    ['OCR', { ocr: 4 }],
    ['POP', { pop: 90 }],
  ])('leaves the preconsolidation stress that %s states for the ground before it', (_, soil) => {
    const [bare, under] = [columnWith(soil, false), columnWith(soil, true)];
    bare.law.yieldStress.forEach((stress, i) => {
      if (bare.law.initialStress[i] + 40 < stress) expect(under.law.yieldStress[i]).toBeCloseTo(stress, 9);
    });
  });

  it('raises the preconsolidation stress to the stress under it where that is higher, without counting it', () => {
    const under = columnWith({ ocr: 1.1 }, true);
    const cell = under.cells.part.indexOf(1);
    expect(under.law.yieldStress[cell]).toBe(under.law.initialStress[cell]);
    expect(under.clamps.preconsolidationRaised).toBe(false);
  });

  it('does not settle the ground any more: time begins with the first new lift', () => {
    expect(columnWith({}, true).timeZero).toBe(0);
  });
});
