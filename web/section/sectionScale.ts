import type { SectionShape } from './sectionShape.ts';

/** Where the drawing lies in its frame: pixels for metres, both ways. */
export interface SectionScale {
  readonly width: number;
  readonly height: number;
  /** Where the highest thing drawn lies, px from above. */
  readonly top: number;
  /** Pixels for a metre along the section; a metre of height is `exaggeration` times as long. */
  readonly pixelsPerMetre: number;
  /** 1 where the drawing is true to scale. */
  readonly exaggeration: number;
  readonly x: (metres: number) => number;
  readonly y: (height: number) => number;
}

/** Room around the drawing for depths on the left and positions below, px. */
export const MARGINS = { left: 44, right: 16, bottom: 40 } as const;

/** Room above the drawing for the arrows of loads and so many rows of names, px. */
export function roomAbove(rows: number): number {
  return 30 + 16 * Math.max(rows, 1);
}

/**
 * Lays the section into a frame. True to scale where its height then lies between the two; a section so long
 * that it would be lower than `lowest` is stretched upwards by the least of 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 15 or 20 that reaches it.
 *
 * @param width of the frame, px
 * @param top room above the drawing, px
 */
export function sectionScale(
  shape: SectionShape,
  width: number,
  lowest: number,
  highest: number,
  top: number,
): SectionScale {
  const inner = Math.max(60, width - MARGINS.left - MARGINS.right);
  const rise = Math.max(shape.top - shape.base, 1e-3);
  const run = shape.to - shape.from;
  const pixelsPerMetre = Math.min(inner / run, highest / rise);
  const exaggeration =
    STRETCHES.find((stretch) => stretch * rise * pixelsPerMetre >= lowest) ?? STRETCHES[STRETCHES.length - 1];
  const drawn = rise * pixelsPerMetre * exaggeration;
  const left = MARGINS.left + (inner - run * pixelsPerMetre) / 2;
  return {
    width,
    height: drawn + top + MARGINS.bottom,
    top,
    pixelsPerMetre,
    exaggeration,
    x: (metres) => left + (metres - shape.from) * pixelsPerMetre,
    y: (height) => top + (shape.top - height) * pixelsPerMetre * exaggeration,
  };
}

const STRETCHES = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 15, 20] as const;

/** Whole multiples of 1, 2 or 5 times a power of ten from one end to the other, `apart` px from each other at least. */
export function ticks(from: number, to: number, pixelsPerMetre: number, apart: number): number[] {
  const step = niceStep(apart / pixelsPerMetre);
  const first = Math.ceil(from / step - 1e-9);
  const last = Math.floor(to / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => (first + i) * step);
}

/** The least of 1, 2 or 5 times a power of ten that is not below a positive length. */
export function niceStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return power * ([1, 2, 5].find((factor) => factor * power >= least * (1 - 1e-9)) ?? 10);
}
