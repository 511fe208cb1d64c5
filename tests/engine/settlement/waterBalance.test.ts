import { describe, expect, it } from 'vitest';
import { emptyFlow, flowCoefficients } from '../../../engine/settlement/flow.ts';
import { marchedModel } from './marchedColumn.ts';
import type { Plain, PlainCompressible } from './plainModel.ts';

const resolution = { cells: 120, steps: 64 };
const clay: PlainCompressible = {
  unitWeight: 15.5,
  compressionIndex: 0.8,
  recompressionIndex: 0.1,
  voidRatio: 2,
  pop: 15,
  cv: 1.5,
  horizontalRatio: 2,
  preYieldFactor: 3,
};

/** Water that leaves a column at its horizon through its ends and drains, m/year. */
function outflow(plain: Plain): number {
  const { column, track } = marchedModel(plain, resolution);
  const { stress } = track.final;
  // u = σ′v0 + Δσ − σ′
  const pore = stress.map(
    (effective, i) => column.law.initialStress[i] + column.loads[0].stress[i] - effective,
  );
  const last = pore.length - 1;
  const flow = emptyFlow(last + 1);
  flowCoefficients(column, track.final, column.drains !== null, flow);
  let out = flow.between[0] * pore[0] + flow.between[last + 1] * pore[last];
  pore.forEach((pressure, i) => (out += flow.radial[i] * pressure));
  return out;
}

/** Its integral between two dates by Simpson's rule along √t, m. */
function waterOut(plain: Plain, from: number, to: number): number {
  const pieces = 24;
  const [a, b] = [Math.sqrt(from), Math.sqrt(to)];
  let sum = 0;
  for (let i = 0; i <= pieces; i += 1) {
    const root = a + ((b - a) * i) / pieces;
    const weight = i === 0 || i === pieces ? 1 : i % 2 === 1 ? 4 : 2;
    sum += weight * 2 * root * outflow({ ...plain, horizon: root * root });
  }
  return (sum * (b - a)) / (3 * pieces);
}

/** 0.2 % of the settlement: half of the error allowed to a grid, and Simpson's. */
const SHARE = 0.002;

describe('the water that leaves the ends and the drains', () => {
  it.each([
    ['drained at both ends', {}],
    ['closed at the base', { base: 'closed' as const }],
    ['closed at the top', { top: 'closed' as const }],
    [
      'with drains',
      {
        base: 'closed' as const,
        drains: { spacing: 2, diameter: 0.066, smearRatio: 2, permeabilityRatio: 2, foot: 6 },
      },
    ],
  ])('is the settlement of a layer %s', (_, more) => {
    const plain: Plain = {
      layers: [{ thickness: 8, soil: clay }],
      loads: [{ pressure: 60 }],
      horizon: 2,
      ...more,
    };
    const { settlementAt } = marchedModel(plain, resolution);
    const settled = settlementAt(2) - settlementAt(0.02);
    expect(Math.abs(waterOut(plain, 0.02, 2) / settled - 1)).toBeLessThan(SHARE);
  });
});
