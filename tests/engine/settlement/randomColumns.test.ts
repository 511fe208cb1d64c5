import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { centralGround } from '../../../engine/sampling/centralGround.ts';
import { realise } from '../../../engine/settlement/realise.ts';
import { plainModel, type Plain } from './plainModel.ts';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const soft = fc.record(
  {
    unitWeight: number(11, 20),
    compressionIndex: number(0.1, 4),
    recompressionIndex: number(0.01, 0.5),
    voidRatio: number(0.5, 8),
    ocr: number(0.7, 6),
    cv: number(0.01, 100),
    horizontalRatio: number(0.5, 5),
    preYieldFactor: number(1, 20),
    secondaryIndex: number(0, 0.4),
  },
  { requiredKeys: ['compressionIndex', 'recompressionIndex', 'voidRatio'] },
);
const stiff = fc.record(
  { modulus: number(500, 1e5), unitWeight: number(14, 22), cv: number(0.1, 50) },
  { requiredKeys: ['modulus'] },
);
const layer = fc.record({
  thickness: number(0.05, 15),
  soil: fc.oneof({ weight: 3, arbitrary: soft }, stiff),
});
const dates = fc.tuple(number(0, 3), number(0, 3)).map(([a, b]) => [Math.min(a, b), Math.max(a, b)] as const);
const lift = fc.record({
  thickness: number(0.2, 5),
  unitWeight: number(15, 22),
  placing: dates,
  slope: number(0, 3),
});
const surcharge = lift.map((each) => ({
  ...each,
  removal: [each.placing[1] + 0.5, each.placing[1] + 0.6] as const,
}));

const plain: fc.Arbitrary<Plain> = fc.record(
  {
    layers: fc.array(layer, { minLength: 1, maxLength: 5 }),
    waterDepth: number(-2, 6),
    baseExcessHead: number(-3, 2),
    top: fc.constantFrom('drained', 'closed'),
    base: fc.constantFrom('drained', 'closed'),
    lifts: fc.array(fc.oneof(lift, surcharge), { minLength: 1, maxLength: 3 }),
    drains: fc.record({
      spacing: number(0.8, 3),
      diameter: number(0.03, 0.3),
      foot: number(1, 20),
      smearRatio: number(1, 4),
      permeabilityRatio: number(1, 5),
    }),
    vacuum: fc.record({ pressure: number(10, 90), start: number(0, 1), end: number(1, 4) }),
    heldUntil: number(0, 10),
    submergence: fc.boolean(),
    wide: fc.boolean(),
    secondary: fc.boolean(),
    horizon: number(4, 100),
    handover: number(0, 4),
  },
  { requiredKeys: ['layers', 'lifts', 'horizon'] },
);

describe('random columns', () => {
  it('settle by a finite amount at every history time, and rates and topping up are finite too', () => {
    fc.assert(
      fc.property(plain, (given) => {
        const model = plainModel(given);
        const found = realise(model, centralGround(model));
        for (const values of [
          found.settlement,
          found.secondaryAfterHandover,
          found.rateAtHandover,
          found.topUp,
        ]) {
          for (const value of values) expect(Number.isFinite(value)).toBe(true);
        }
      }),
      { seed: 20_26, numRuns: 150 },
    );
  }, 60_000);

  it('give the same bytes twice', () => {
    const [given] = fc.sample(plain, { seed: 7, numRuns: 1 });
    const run = () => realise(plainModel(given), centralGround(plainModel(given))).settlement;
    expect([...run()]).toEqual([...run()]);
  });
});
