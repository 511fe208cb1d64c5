import { describe, expect, it } from 'vitest';
import { marchedModel } from './marchedColumn.ts';
import type { Plain, PlainCompressible } from './plainModel.ts';

const clay: PlainCompressible = {
  unitWeight: 15.5,
  compressionIndex: 0.8,
  recompressionIndex: 0.1,
  voidRatio: 2,
  pop: 20,
  cv: 4,
};
const resolution = { cells: 60, steps: 24 };
const drains = { spacing: 1, diameter: 0.066, foot: 6 };

describe('a vacuum', () => {
  it('settles a column with a closed base as much in the end as a wide load of its size', () => {
    const given: Plain = { layers: [{ thickness: 6, soil: clay }], base: 'closed', drains, horizon: 20 };
    // at the working steps the two differ by 1e-5, because σ' overshoots a little on its way to rest
    const finer = { cells: 60, steps: 96 };
    const vacuum = marchedModel({ ...given, vacuum: { pressure: 70 } }, finer).settlementAt(20);
    const load = marchedModel({ ...given, loads: [{ pressure: 70 }] }, finer).settlementAt(20);
    expect(vacuum / load).toBeCloseTo(1, 5);
  });

  it('does not lower an inner seam, nor what lies below it', () => {
    const seam = { modulus: 3e4, unitWeight: 19 };
    const { column, track } = marchedModel(
      {
        layers: [
          { thickness: 4, soil: clay },
          { thickness: 0.5, soil: seam },
          { thickness: 4, soil: clay },
        ],
        base: 'closed',
        vacuum: { pressure: 70 },
        horizon: 100,
      },
      resolution,
    );
    // u = σ′v0 − σ′ where nothing but the vacuum acts
    const pore = track.final.stress.map((stress, i) => column.law.initialStress[i] - stress);
    column.cells.part.forEach((part, i) => {
      if (part > 0) expect(Math.abs(pore[i])).toBeLessThan(1e-9);
    });
    expect(pore[0]).toBeLessThan(-65);
  });

  it('leaves a drained base at rest, with the suction falling from the top to it', () => {
    const { column, track } = marchedModel(
      { layers: [{ thickness: 6, soil: { modulus: 1e3, cv: 5 } }], vacuum: { pressure: 60 }, horizon: 100 },
      resolution,
    );
    column.cells.middle.forEach((z, i) => {
      const pore = column.law.initialStress[i] - track.final.stress[i];
      expect(pore).toBeCloseTo(-60 * (1 - z / 6), 4);
    });
  });

  it('lets the ground rebound on Cs when it ends', () => {
    const given: Plain = { layers: [{ thickness: 6, soil: clay }], base: 'closed', drains, horizon: 20 };
    const { settlementAt } = marchedModel({ ...given, vacuum: { pressure: 70, end: 8 } }, resolution);
    expect(settlementAt(20)).toBeLessThan(settlementAt(8));
    expect(settlementAt(20)).toBeGreaterThan(0.5 * settlementAt(8));
  });
});
