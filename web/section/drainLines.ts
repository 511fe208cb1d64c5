import type { Drains } from '../../engine/project/model.ts';

/** Where drains are drawn along the section, and every how many of them. */
export interface DrainLines {
  readonly x: readonly number[];
  readonly every: number;
}

/**
 * The drains between two ends of the drawing; where they stand closer than `apart` only every second, fifth,
 * tenth … is drawn.
 *
 * @param apart least distance between two lines, m
 */
export function drainLines(drains: Drains, from: number, to: number, apart: number): DrainLines {
  const [left, right] = [Math.max(drains.from, from), Math.min(drains.to, to)];
  let every = 1;
  const steps = [2, 2.5, 2];
  for (let i = 0; drains.spacing * every < apart; i += 1) every *= steps[i % 3];
  const step = drains.spacing * every;
  const count = Math.max(0, Math.floor((right - left) / step + 1e-9));
  const first = (left + right - count * step) / 2;
  return { x: Array.from({ length: count + 1 }, (_, i) => first + i * step), every };
}
