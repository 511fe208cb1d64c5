import type { QuantitySummary } from '../../engine/summary/summary.ts';
import { chanceBandText, chanceText } from '../words/chanceText.ts';
import { measure, measureText } from '../words/measure.ts';
import { readExceedance } from './exceedancePicture.ts';

/** What the curve says at a value: 'Above 84 mm: 43 of 100 grounds (90 % band 40 to 46 of 100).' */
export function exceedanceReading(
  { quantity, exceedance }: QuantitySummary,
  value: number,
  of: number,
): string {
  const { share, low, high } = readExceedance(exceedance, value, of);
  const chance = { value: share, low, high, above: Math.round(share * of), of };
  const band = chanceBandText(chance);
  const tail =
    value >= exceedance.unresolvedAbove && chance.above > 0
      ? ' Fewer than 10 realisations lie beyond: unresolved.'
      : '';
  const bandText = band === '' ? '' : ` (90\u202f% band ${band})`;
  return `Above ${measureText(measure(value, quantity.unit))}: ${chanceText(chance)} grounds${bandText}.${tail}`;
}
