import type { SectionScale } from './sectionScale.ts';
import type { Corner } from './sectionShape.ts';

/** A closed SVG path through corners in metres. */
export function pathOf(corners: readonly Corner[], scale: SectionScale): string {
  const pixel = (value: number) => String(Math.round(value * 100) / 100);
  return (
    corners
      .map(([x, height], i) => `${i === 0 ? 'M' : 'L'}${pixel(scale.x(x))} ${pixel(scale.y(height))}`)
      .join('') + 'Z'
  );
}
