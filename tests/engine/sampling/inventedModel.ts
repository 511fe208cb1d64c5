import type { Layer, Model, Point } from '../../../engine/project/model.ts';
import type { CompressibleSoil } from '../../../engine/project/soil.ts';
import type { Spread, UncertainNumber } from '../../../engine/project/uncertainNumber.ts';
import type { Marginal } from '../../../engine/marginals/marginal.ts';
import { fixedMarginal } from './inventedMarginals.ts';

/** An input of an invented model; its place in the model's list is set by `inventedModel`. */
export interface InventedInput {
  readonly name: string;
  readonly marginal: Marginal;
  readonly spread?: Spread;
  readonly keepsMean?: boolean;
}

export interface Invented {
  readonly inputs: readonly InventedInput[];
  /** Names of two inputs and their rank correlation. */
  readonly correlations?: readonly (readonly [string, string, number])[];
  readonly x?: readonly number[];
  /** Layers of the soil that carries the inputs; thickness of each, m. */
  readonly layers?: readonly Layer['thickness'][];
  readonly seed?: number;
}

export const evenThickness = (metres: number): Layer['thickness'] => ({
  kind: 'even',
  thickness: fixedNumber(metres),
});

/**
 * A model, invented, that holds what sampling reads: one soil whose compression index, initial void ratio,
 * unit weight, OCR, c_v, c_h/c_v, Cr and factor before yield are the inputs in this order (any further ones
 * stand outside the soil), its layers, points and correlations.
 */
export function inventedModel({ inputs, correlations = [], x = [0], layers, seed = 11 }: Invented): Model {
  const numbers = inputs.map((input, index) => uncertain(input, index));
  const at = (place: number): UncertainNumber => numbers[place] ?? fixedNumber(1);
  const soil: CompressibleSoil = {
    behaviour: 'compressible',
    name: 'invented clay',
    compressionIndex: at(0),
    initialVoidRatio: at(1),
    unitWeight: at(2),
    preconsolidation: { kind: 'ocr', ocr: at(3) },
    permeability: { kind: 'cv', verticalCoefficient: at(4), permeabilityIndex: null },
    horizontalRatio: at(5),
    recompression: { given: 'index', number: at(6) },
    swelling: null,
    preYieldFactor: at(7),
    secondary: null,
  };
  const place = (name: string): number => inputs.findIndex((input) => input.name === name);
  return {
    ...EMPTY,
    soils: [soil],
    layers: (layers ?? [evenThickness(6)]).map((thickness, i) => ({
      name: `layer ${i}`,
      soil: 0,
      thickness,
    })),
    points: x.map((position, i): Point => ({ name: `point ${i}`, x: position, fixed: false })),
    inputs: numbers,
    correlations: correlations.map(([first, second, rank]) => ({
      first: place(first),
      second: place(second),
      rank,
    })),
    sampling: { realisations: 1000, seed },
  };
}

const BARE = { label: '', unit: '1', source: { kind: 'not stated', text: '' }, note: '' } as const;

export function uncertain(input: InventedInput, index: number): UncertainNumber {
  const { name, marginal, spread = null, keepsMean = true } = input;
  return { ...BARE, name, marginal, spread, keepsMean, index };
}

export function fixedNumber(value: number): UncertainNumber {
  return { ...BARE, name: 'fixed', marginal: fixedMarginal(value), spread: null, keepsMean: true, index: -1 };
}

const EMPTY: Model = {
  name: 'invented',
  notes: '',
  digest: '0'.repeat(32),
  soils: [],
  layers: [],
  water: { depth: fixedNumber(0), baseExcessHead: fixedNumber(0) },
  boundaries: { top: 'drained', base: 'drained' },
  lifts: [],
  surfaceLoads: [],
  drains: null,
  vacuum: null,
  couplings: { heldUntil: null, topUpUnitWeight: null, submergence: false },
  wideFill: true,
  secondary: { included: false, reductionFloor: 0.1, reductionExponent: 6 },
  points: [],
  pairs: [],
  handover: 1,
  horizon: 10,
  outputTimes: [10],
  limits: [],
  modelFactors: { settlement: fixedNumber(1), rate: fixedNumber(1) },
  sampling: { realisations: 1000, seed: 1 },
  results: { percentiles: [50], degreeOfConsolidation: null },
  inputs: [],
  correlations: [],
  remarks: [],
};
