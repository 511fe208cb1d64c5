/** Which of the page's inks a mark is drawn with; the colours are CSS variables. */
export type Ink = 'probability' | 'limit' | 'selected' | 'plain' | 'quiet';

/** A line, a band between two lines, or horizontal bars, in numbers. */
export type Series =
  | {
      readonly kind: 'line';
      readonly name: string;
      readonly ink: Ink;
      readonly width: number;
      readonly dashed: boolean;
      /** A step holds its value until the next x. */
      readonly stepped: boolean;
      readonly x: readonly number[];
      readonly y: readonly number[];
    }
  | {
      readonly kind: 'band';
      readonly name: string;
      readonly ink: Ink;
      /** 0 (unseen) to 1 (full). */
      readonly strength: number;
      readonly stepped: boolean;
      readonly x: readonly number[];
      readonly low: readonly number[];
      readonly high: readonly number[];
    };

/** A straight line across the chart with its name. */
export interface Mark {
  readonly axis: 'x' | 'y';
  readonly value: number;
  readonly label: string;
  readonly ink: Ink;
  readonly dashed: boolean;
}

export interface Axis {
  readonly title: string;
  readonly from: number;
  readonly to: number;
  /** Values grow downwards (or to the left). */
  readonly reversed: boolean;
  readonly tickText: (value: number) => string;
}

/** All that a curve chart shows: numbers and words, nothing of where they come from. */
export interface ChartPicture {
  readonly x: Axis;
  readonly y: Axis;
  readonly series: readonly Series[];
  readonly marks: readonly Mark[];
}

/** Bars that run sideways from zero, the longest first. */
export interface BarPicture {
  readonly axisTitle: string;
  readonly from: number;
  readonly to: number;
  readonly bars: readonly { readonly label: string; readonly value: number }[];
}
