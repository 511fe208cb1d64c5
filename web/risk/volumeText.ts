import { significantNumberText } from '../words/numberText.ts';

interface Volume {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

/** The volume of fill for a metre of embankment, and what of it is topping up. */
export function volumeText(placed: Volume, topUp: Volume): string {
  const each = (volume: Volume) => `${significantNumberText(volume.value, 3)}\u202fm³ per metre`;
  const placedText = `Fill placed: ${each(placed)} of embankment (mean)`;
  return topUp.value > 0 ? `${placedText}; to hold its level: ${each(topUp)} more.` : `${placedText}.`;
}
