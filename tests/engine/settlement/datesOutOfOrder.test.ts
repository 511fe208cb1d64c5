import { describe, expect, it } from 'vitest';
import { columnOf, marchedModel } from './marchedColumn.ts';
import type { Plain } from './plainModel.ts';

const plain: Plain = { layers: [{ thickness: 6, soil: { modulus: 1000, cv: 10 } }], horizon: 10 };
const coarse = { cells: 16, steps: 8 };

describe('dates drawn out of order', () => {
  it('are set equal to the one that they must follow, and counted', () => {
    const column = columnOf(
      { ...plain, lifts: [{ thickness: 2, placing: [1, 0.4], removal: [0.7, 0.5] }] },
      coarse,
    );
    expect(column.loads[0].period).toEqual({ start: 1, end: 1, removalStart: 1, removalEnd: 1 });
    expect(column.clamps.datesPutInOrder).toBe(true);
  });

  it('leave the settlement finite', () => {
    const lifts = [
      { thickness: 2, placing: [1, 0.4] as const },
      { thickness: 1, placing: [0.2, 0.3] as const },
    ];
    const { settlementAt } = marchedModel({ ...plain, lifts }, coarse);
    expect(settlementAt(10)).toBeCloseTo((60 * 6) / 1000, 3);
  });

  it('are not counted where they are in order', () => {
    const column = columnOf(
      { ...plain, lifts: [{ thickness: 2, placing: [1, 1], removal: [2, 2] }] },
      coarse,
    );
    expect(column.clamps.datesPutInOrder).toBe(false);
  });
});
