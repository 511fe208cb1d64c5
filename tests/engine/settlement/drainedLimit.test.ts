import { describe, expect, it } from 'vitest';
import { layersOfUniformClay } from '../../published/uniformClay.ts';
import { marchedModel } from './marchedColumn.ts';
import type { Plain } from './plainModel.ts';

const WATER = 9.81;
const [THICKNESS, INITIAL, RATIO] = [5, 50, 0.3];
/** Reversible: Cr = Cs = Cc, because a column that sinks into the water unloads where it has drained early. */
const layers = layersOfUniformClay({
  thickness: THICKNESS,
  initialStress: INITIAL,
  compressionIndex: 3 * RATIO,
  recompressionIndex: 3 * RATIO,
  voidRatio: 2,
  cv: 20,
});
const given = { layers, horizon: 6 };
const fill = { lifts: [{ thickness: 3, unitWeight: 20 }] };
/** Of the settlement at rest, three times as many steps as in everyday work; 6 years are Tv = 19. */
const RELATIVE = 1e-4;
const resolution = { cells: 60, steps: 24 };

/** s = H CR log((σ0 + Δσ + perMetre s)/σ0), by repetition. */
function atRest(pressure: number, perMetre: number): number {
  let settlement = 0;
  for (let i = 0; i < 500; i += 1) {
    settlement = THICKNESS * RATIO * Math.log10((INITIAL + pressure + perMetre * settlement) / INITIAL);
  }
  return settlement;
}

function expectAtRest(plain: Partial<Plain>, pressure: number, perMetre: number): void {
  const { settlementAt } = marchedModel({ ...given, ...plain }, resolution);
  expect(Math.abs(settlementAt(6) / atRest(pressure, perMetre) - 1)).toBeLessThan(RELATIVE);
}

describe('settlement at rest', () => {
  it('without couplings is that of the law', () => expectAtRest(fill, 60, 0));

  it('of a fill held to level includes the weight of its topping up', () => {
    expectAtRest({ ...fill, heldUntil: 6, topUpUnitWeight: 18 }, 60, 18);
  });

  it('loses γw for every metre that the column sinks into the water', () => {
    expectAtRest({ ...fill, submergence: true }, 60, -WATER);
  });

  it('has both couplings together where both act', () => {
    expectAtRest({ ...fill, heldUntil: 6, submergence: true }, 60, 20 - WATER);
  });

  it('sinks under water also where no fill lies above the point, and nothing is topped up there', () => {
    expectAtRest(
      { loads: [{ pressure: 60 }], heldUntil: 6, topUpUnitWeight: 20, submergence: true },
      60,
      -WATER,
    );
  });

  it('loses nothing where the column lies under water with its fill', () => {
    const drowned = { waterDepth: -5, lifts: [{ thickness: 3, unitWeight: 20 + WATER }], submergence: true };
    expectAtRest(drowned, 60, 0);
  });

  it('is multiplied by the factor on settlement, which the couplings then see', () => {
    const factor = 1.3;
    const { settlementAt } = marchedModel(
      { ...given, ...fill, submergence: true, settlementFactor: factor },
      resolution,
    );
    let settlement = 0;
    for (let i = 0; i < 500; i += 1) {
      settlement = factor * THICKNESS * RATIO * Math.log10((INITIAL + 60 - WATER * settlement) / INITIAL);
    }
    expect(Math.abs(settlementAt(6) / settlement - 1)).toBeLessThan(RELATIVE);
  });
});

describe('topping up', () => {
  it('is as thick as the settlement at the date until which the fill is held, and stays', () => {
    const { track, settlementAt } = marchedModel({ ...given, ...fill, heldUntil: 0.4 }, resolution);
    expect(track.toppedUp).toBeCloseTo(settlementAt(0.4), 10);
    const { toppedUp } = track;
    const settled = THICKNESS * RATIO * Math.log10((INITIAL + 60 + 20 * toppedUp) / INITIAL);
    expect(Math.abs(settlementAt(6) / settled - 1)).toBeLessThan(RELATIVE);
  });

  it('stays when a surcharge goes', () => {
    const surcharge = { thickness: 1, unitWeight: 20, placing: [0, 0] as const, removal: [1, 1] as const };
    const { track } = marchedModel(
      { ...given, lifts: [...fill.lifts, surcharge], heldUntil: 0.4 },
      resolution,
    );
    const { column } = marchedModel(
      { ...given, lifts: [...fill.lifts, surcharge], heldUntil: 0.4 },
      resolution,
    );
    const cell = column.cells.part.indexOf(1);
    expect(track.final.stress[cell]).toBeCloseTo(INITIAL + 60 + 20 * track.toppedUp, 2);
  });

  it('spreads with depth as the placed fill does', () => {
    const narrow = { lifts: [{ thickness: 3, unitWeight: 20, crestWidth: 6 }], wide: false, heldUntil: 6 };
    const { column, track, settlementAt } = marchedModel({ ...given, ...narrow }, resolution);
    const [load] = column.loads;
    load.stress.forEach((stress, i) => {
      const influence = stress / load.pressure;
      const expected = column.law.initialStress[i] + influence * (60 + 20 * settlementAt(6));
      expect(Math.abs(track.final.stress[i] / expected - 1)).toBeLessThan(RELATIVE);
    });
  });
});
