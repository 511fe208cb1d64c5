import type { Spread } from './uncertainNumber.ts';
import { openObject } from './openObject.ts';
import { PHYSICAL } from './physicalRanges.ts';
import type { Place } from './place.ts';
import { readNumber } from './readValues.ts';
import { whole, type Reading } from './reading.ts';

/** How a number varies from place to place; a thickness has no vertical scale. */
export function readSpread(
  reading: Reading,
  place: Place,
  value: unknown,
  varies: 'in the ground' | 'along the section',
): Spread | undefined {
  const inGround = varies === 'in the ground';
  const opened = openObject(reading, place, value, {
    required: ['share_of_variance', ...(inGround ? ['vertical_scale_m'] : []), 'horizontal_scale_m'],
  });
  if (opened === undefined) return undefined;
  const scale = (key: string) => readNumber(reading, opened, key, PHYSICAL.scaleOfFluctuation);
  return whole<Spread>({
    share: readNumber(reading, opened, 'share_of_variance', PHYSICAL.varianceShare),
    verticalScale: inGround ? scale('vertical_scale_m') : null,
    horizontalScale: scale('horizontal_scale_m'),
  });
}
