import type { UncertainNumber } from './uncertainNumber.ts';

export type Soil = CompressibleSoil | StiffFreeDrainingSoil | StiffPoorlyDrainingSoil;

export interface CompressibleSoil {
  readonly behaviour: 'compressible';
  readonly name: string;
  readonly unitWeight: UncertainNumber;
  readonly compressionIndex: UncertainNumber;
  readonly recompression: IndexOrRatio;
  /** Swelling index Cs; null: Cr serves. */
  readonly swelling: IndexOrRatio | null;
  readonly initialVoidRatio: UncertainNumber;
  readonly preconsolidation: Preconsolidation;
  readonly permeability: PermeabilityLaw;
  readonly horizontalRatio: UncertainNumber;
  /** Factor on k before first yield, 1 when there is none. */
  readonly preYieldFactor: UncertainNumber;
  /** Secondary compression index Cα, or Cα/Cc; null when none is given. */
  readonly secondary: IndexOrRatio | null;
}

export interface StiffFreeDrainingSoil {
  readonly behaviour: 'stiff_free_draining';
  readonly name: string;
  readonly unitWeight: UncertainNumber;
  /** Constrained modulus M, kPa. */
  readonly modulus: UncertainNumber;
}

export interface StiffPoorlyDrainingSoil {
  readonly behaviour: 'stiff_poorly_draining';
  readonly name: string;
  readonly unitWeight: UncertainNumber;
  readonly modulus: UncertainNumber;
  /** c_v, m²/year. */
  readonly verticalCoefficient: UncertainNumber;
  readonly horizontalRatio: UncertainNumber;
}

/** An index given by itself, or by its ratio to C_c. */
export interface IndexOrRatio {
  readonly given: 'index' | 'ratio';
  readonly number: UncertainNumber;
}

export type Preconsolidation =
  | { readonly kind: 'ocr'; readonly ocr: UncertainNumber }
  | { readonly kind: 'pop'; readonly pop: UncertainNumber }
  | {
      readonly kind: 'profile';
      readonly upper: { readonly depth: number; readonly stress: UncertainNumber };
      readonly lower: { readonly depth: number; readonly stress: UncertainNumber };
    };

export type PermeabilityLaw =
  | {
      /** c_v of virgin compression, m²/year; Ck = Cc unless given. */
      readonly kind: 'cv';
      readonly verticalCoefficient: UncertainNumber;
      readonly permeabilityIndex: UncertainNumber | null;
    }
  | {
      /** k at e0, m/s (as entered); Ck = 0.5 e0 unless given (Tavenas et al. 1983). */
      readonly kind: 'k0';
      readonly permeability: UncertainNumber;
      readonly permeabilityIndex: UncertainNumber | null;
    };
