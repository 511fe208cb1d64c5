import type { Column } from './column.ts';

/** The state of a column between two steps; arrays over the cells. */
export interface ColumnState {
  /** Excess pore pressure, kPa. */
  readonly pore: Float64Array;
  /** σ', kPa. */
  readonly stress: Float64Array;
  /** Largest σ' so far, kPa. */
  readonly largest: Float64Array;
  /** Primary strain. */
  readonly strain: Float64Array;
  /** σ' of a cell has fallen below 1 kPa, where swelling goes on straight. */
  swelledStraight: boolean;
  /** Secondary settlement so far, m, before the factor on settlement. */
  secondary: number;
  /** Settlement so far, m, with the factor. */
  settlement: number;
}

/** A column before anything acts. */
export function stateAtRest(column: Column): ColumnState {
  const { initialStress } = column.law;
  return {
    pore: new Float64Array(initialStress.length),
    stress: initialStress.slice(),
    largest: initialStress.slice(),
    strain: new Float64Array(initialStress.length),
    swelledStraight: false,
    secondary: 0,
    settlement: 0,
  };
}
