import { describe, expect, it } from 'vitest';
import { valueAtDate } from '../../../engine/settlement/settlementHistory.ts';
import { layersOfUniformClay } from '../../published/uniformClay.ts';
import { endOfPrimary, marchedModel } from './marchedColumn.ts';
import type { Plain } from './plainModel.ts';

const [THICKNESS, INITIAL, INDEX] = [4, 50, 0.04];
/** Cα/(1 + e0) H of one logarithmic cycle, m. */
const CYCLE = (INDEX / 3) * THICKNESS;
const resolution = { cells: 60, steps: 32 };

function clay(ocr: number, cv = 200): Plain['layers'] {
  return layersOfUniformClay({
    thickness: THICKNESS,
    initialStress: INITIAL,
    compressionIndex: 0.9,
    recompressionIndex: 0.18,
    voidRatio: 2,
    ocr,
    cv,
    secondaryIndex: INDEX,
  });
}

function secondaryOf(plain: Plain): (date: number) => number {
  const { track } = marchedModel({ secondary: true, ...plain }, resolution);
  return (date) => valueAtDate(track, track.secondary, date);
}

describe('secondary compression', () => {
  it('goes on along the logarithm of time after primary', () => {
    const at = secondaryOf({ layers: clay(1), loads: [{ pressure: 50 }], horizon: 50 });
    expect(at(50) - at(5)).toBeCloseTo(CYCLE, 5);
  });

  it('begins when the mean gain of effective stress is 95 % of the load', () => {
    const plain: Plain = { layers: clay(1, 2), loads: [{ pressure: 50 }], horizon: 50 };
    const begin = endOfPrimary(plain, resolution);
    const at = secondaryOf(plain);
    expect(at(50) / (CYCLE * Math.log10(50 / begin))).toBeCloseTo(1, 2);
    expect(Math.abs(at(0.95 * begin))).toBeLessThan(0.01 * CYCLE);
  });

  it('runs Cr/Cc times as fast before σ′p is passed', () => {
    const at = secondaryOf({ layers: clay(4), loads: [{ pressure: 50 }], horizon: 50 });
    expect(at(50) - at(5)).toBeCloseTo(CYCLE * 0.2, 6);
  });

  it('does not jump when a later lift passes σ′p, and goes on at the new rate', () => {
    const lifts = [
      { thickness: 2.5, unitWeight: 20, placing: [0, 0] as const },
      { thickness: 6, unitWeight: 20, placing: [2, 2] as const },
    ];
    const { track } = marchedModel({ layers: clay(3), lifts, secondary: true, horizon: 50 }, resolution);
    let offset = 0;
    for (const interval of track.intervals.slice(0, -1)) {
      offset += interval.steps + 1;
      expect(track.secondary[offset]).toBe(track.secondary[offset - 1]);
    }
    const at = (date: number) => valueAtDate(track, track.secondary, date);
    expect(at(50) - at(5)).toBeCloseTo(CYCLE, 4);
  });

  it('is not put off by a lift that adds less than a tenth of the load, but by one that adds more', () => {
    const withLift = (thickness: number) =>
      secondaryOf({
        layers: clay(1),
        lifts: [
          { thickness: 5, unitWeight: 20, placing: [0, 0] },
          { thickness, unitWeight: 20, placing: [9, 10] },
        ],
        horizon: 40,
      })(9.99);
    expect(withLift(0.45)).toBeGreaterThan(CYCLE);
    expect(Math.abs(withLift(0.55))).toBeLessThan(1e-6);
  });

  it('is slower after a surcharge, by the effective stress reached over that left', () => {
    const at = secondaryOf({
      layers: clay(1),
      loads: [{ pressure: 50 }, { pressure: 20, end: 2 }],
      horizon: 50,
    });
    const reduced = 0.1 + 0.9 * Math.exp(-6 * (120 / 100 - 1));
    expect((at(50) - at(5)) / CYCLE).toBeCloseTo(reduced, 4);
    expect(at(1.9) - at(0.19)).toBeCloseTo(CYCLE, 3);
  });

  it('earns no credit from a surcharge that is taken off before the ground has felt it', () => {
    const at = secondaryOf({
      layers: clay(1, 0.5),
      loads: [{ pressure: 50 }, { pressure: 20, end: 0.05 }],
      horizon: 5_000,
    });
    expect((at(5_000) - at(500)) / CYCLE).toBeCloseTo(1, 3);
  });

  it('is not raised again by a later removal', () => {
    // 121 kPa of effective stress when 20 kPa are taken off, 101 left; then 1 kPa more is taken off
    const loads = [{ pressure: 50 }, { pressure: 20, end: 2 }, { pressure: 1, end: 4 }];
    const at = secondaryOf({ layers: clay(1), loads, horizon: 50 });
    const reduced = 0.1 + 0.9 * Math.exp(-6 * (121 / 101 - 1));
    expect((at(50) - at(5)) / CYCLE).toBeCloseTo(reduced, 4);
  });

  it('is the same when the layer is cut, because it goes by stratum', () => {
    const [sand, whole] = clay(1, 2);
    const cut = [sand, { thickness: 1, soil: whole.soil }, { thickness: 3, soil: whole.soil }];
    const plain = { loads: [{ pressure: 50 }], horizon: 50 };
    const [one, two] = [
      secondaryOf({ ...plain, layers: [sand, whole] }),
      secondaryOf({ ...plain, layers: cut }),
    ];
    expect(two(50) / one(50)).toBeCloseTo(1, 2);
  });

  it('is left out where it is switched off', () => {
    expect(
      secondaryOf({ layers: clay(1), loads: [{ pressure: 50 }], horizon: 50, secondary: false })(50),
    ).toBe(0);
  });
});
