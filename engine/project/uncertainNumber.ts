import type { Marginal } from '../marginals/marginal.ts';

/** A number of the model, fixed or drawn. */
export interface UncertainNumber {
  /** Permanent name, such as 'soil/soft clay/compression_index'; seeds the input's own stream. */
  readonly name: string;
  /** In words, such as 'compression index of soft clay'. */
  readonly label: string;
  /** Unit of the values of `marginal`, '1' for a pure number. */
  readonly unit: string;
  readonly marginal: Marginal;
  /** Place in `Model.inputs`, −1 when fixed. */
  readonly index: number;
  /** How it varies from place to place; null when it does not. */
  readonly spread: Spread | null;
  /** Whether the value at a point keeps the marginal's mean by a ratio (not so for c_v, k0, c_h/c_v). */
  readonly keepsMean: boolean;
  readonly source: Source;
  readonly note: string;
}

export interface Source {
  readonly kind: 'test' | 'correlation' | 'published range' | 'judgement' | 'not stated';
  readonly text: string;
}

export interface Spread {
  /** Share of the variance that varies from place to place, above 0 and at most 1. */
  readonly share: number;
  /** Vertical scale of fluctuation, m; null for a thickness, of which nothing is averaged (Γ² = 1). */
  readonly verticalScale: number | null;
  /** Horizontal scale of fluctuation, m. */
  readonly horizontalScale: number;
}
