import { describe, it, expect } from 'vitest';
import type { CompressibleSoil, Soil } from '../../../engine/project/soil.ts';
import type { UncertainNumber } from '../../../engine/project/uncertainNumber.ts';
import { numbersOfSoil, soilThickness } from '../../../engine/sampling/soilThickness.ts';
import { lognormalMarginal } from './inventedMarginals.ts';
import { evenThickness, fixedNumber, inventedModel } from './inventedModel.ts';

const clay = (parts: Partial<CompressibleSoil>): CompressibleSoil => ({
  behaviour: 'compressible',
  name: 'invented clay',
  unitWeight: fixedNumber(16),
  compressionIndex: fixedNumber(0.9),
  recompression: { given: 'ratio', number: fixedNumber(0.1) },
  swelling: null,
  initialVoidRatio: fixedNumber(1.8),
  preconsolidation: { kind: 'ocr', ocr: fixedNumber(1.4) },
  permeability: { kind: 'cv', verticalCoefficient: fixedNumber(1.2), permeabilityIndex: null },
  horizontalRatio: fixedNumber(2),
  preYieldFactor: fixedNumber(1.1),
  secondary: null,
  ...parts,
});

const SOILS: readonly (readonly [string, Soil])[] = [
  ['a clay with an OCR', clay({})],
  [
    'a clay with everything that can be given',
    clay({
      swelling: { given: 'index', number: fixedNumber(0.12) },
      secondary: { given: 'ratio', number: fixedNumber(0.04) },
      preconsolidation: {
        kind: 'profile',
        upper: { depth: 1, stress: fixedNumber(40) },
        lower: { depth: 9, stress: fixedNumber(90) },
      },
      permeability: { kind: 'k0', permeability: fixedNumber(1e-9), permeabilityIndex: fixedNumber(0.8) },
    }),
  ],
  [
    'a clay with a pre-overburden pressure',
    clay({ preconsolidation: { kind: 'pop', pop: fixedNumber(15) } }),
  ],
  [
    'a stiff free-draining soil',
    {
      behaviour: 'stiff_free_draining',
      name: 'sand',
      unitWeight: fixedNumber(19),
      modulus: fixedNumber(3e4),
    },
  ],
  [
    'a stiff poorly draining soil',
    {
      behaviour: 'stiff_poorly_draining',
      name: 'till',
      unitWeight: fixedNumber(21),
      modulus: fixedNumber(2e4),
      verticalCoefficient: fixedNumber(9),
      horizontalRatio: fixedNumber(1.5),
    },
  ],
];

/** Every number found by looking into every part of the soil. */
function everyNumberIn(part: unknown): UncertainNumber[] {
  if (typeof part !== 'object' || part === null) return [];
  if ('marginal' in part) return [part as UncertainNumber];
  return Object.values(part).flatMap(everyNumberIn);
}

describe('numbersOfSoil', () => {
  for (const [name, soil] of SOILS) {
    it(`leaves out no number of ${name}`, () => {
      expect(new Set(numbersOfSoil(soil))).toEqual(new Set(everyNumberIn(soil)));
      expect(numbersOfSoil(soil)).toHaveLength(everyNumberIn(soil).length);
    });
  }
});

describe('soilThickness', () => {
  it('sums all layers of the soil and takes the mean over the points', () => {
    const model = inventedModel({
      inputs: [],
      x: [0, 10, 20],
      layers: [evenThickness(2), { kind: 'borings', x: [0, 20], thickness: [1, 5], factor: fixedNumber(1) }],
    });
    expect(soilThickness(model, 0)).toBeCloseTo(2 + (1 + 3 + 5) / 3, 14);
  });

  it('takes an uncertain thickness at its median', () => {
    const marginal = lognormalMarginal(3, 0.4);
    const thickness = { ...fixedNumber(3), marginal, index: 0 };
    const model = inventedModel({ inputs: [], layers: [{ kind: 'even', thickness }] });
    expect(soilThickness(model, 0)).toBeCloseTo(3 / Math.sqrt(1.16), 13);
  });

  it('is 0 for a soil without a layer', () => {
    const model = inventedModel({ inputs: [], layers: [evenThickness(2)] });
    expect(soilThickness({ ...model, layers: [] }, 0)).toBe(0);
  });
});
