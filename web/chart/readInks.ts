import type { Ink } from './chartPicture.ts';

/** The page's colours as they stand now, for a canvas, which knows no CSS variables. */
export interface Inks {
  readonly paper: string;
  readonly grid: string;
  readonly text: string;
  readonly font: string;
  readonly of: Readonly<Record<Ink, string>>;
}

/** Reads the inks off an element's CSS variables; each is a six-digit hex colour. */
export function readInks(element: Element): Inks {
  const style = getComputedStyle(element);
  const read = (name: string) => style.getPropertyValue(name).trim();
  return {
    paper: read('--paper'),
    grid: read('--hairline'),
    text: read('--ink-soft'),
    font: style.fontFamily,
    of: {
      probability: read('--probability'),
      limit: read('--limit'),
      selected: read('--selected'),
      plain: read('--ink'),
      quiet: read('--ink-soft'),
    },
  };
}

/** A six-digit hex colour with an opacity from 0 to 1. */
export function withStrength(hex: string, strength: number): string {
  const digits = Math.round(Math.min(1, Math.max(0, strength)) * 255);
  return hex + digits.toString(16).padStart(2, '0');
}
