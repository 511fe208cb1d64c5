import { centralValue } from './centralValue.ts';
import { quoted } from './describeFound.ts';
import type { Remark } from './model.ts';
import type { UnremarkedModel } from './unremarkedModel.ts';

/** What stands oddly in time, in the central case. */
export function remarksOnDates(model: UnremarkedModel): Remark[] {
  const { lifts, surfaceLoads, vacuum, handover, horizon, boundaries } = model;
  const remarks: Remark[] = [];
  const handoverPointer = '/times/handover_year';
  for (const { name, placing, removal } of lifts) {
    if (placing !== null && centralValue(placing.end) > handover) {
      const sentence = `Handover lies before the placing of ${quoted(name)} ends: what it brings counts as after handover.`;
      remarks.push({ pointer: handoverPointer, sentence });
    }
    if (removal !== null && centralValue(removal.end) > handover) {
      const sentence = `Handover lies before the removal of ${quoted(name)} ends.`;
      remarks.push({ pointer: handoverPointer, sentence });
    }
  }
  if (vacuum !== null && centralValue(vacuum.end) > handover) {
    remarks.push({ pointer: handoverPointer, sentence: 'Handover lies before the vacuum ends.' });
  }
  if (vacuum !== null && boundaries.top === 'closed') {
    const sentence = 'The top boundary is closed: the vacuum works through the drains alone.';
    remarks.push({ pointer: '/boundaries/top', sentence });
  }
  const starts = [
    ...lifts.map(({ placing, removal }) => placing?.start ?? removal?.start),
    ...surfaceLoads.map(({ start }) => start),
    vacuum?.start,
  ].filter((start) => start !== undefined);
  const earliest = Math.min(...starts.map(centralValue));
  if (!(earliest < horizon)) {
    const sentence =
      starts.length === 0
        ? 'Nothing loads the ground: it does not settle.'
        : 'Nothing loads the ground before the horizon.';
    remarks.push({ pointer: '/fill', sentence });
  } else if (handover <= earliest) {
    remarks.push({ pointer: handoverPointer, sentence: 'Handover lies before anything loads the ground.' });
  }
  return remarks;
}
