import { describe, expect, it } from 'vitest';
import { findResult, shownPoint, ShownResult } from '../../../web/state/shownResult.svelte.ts';
import { inventedSummary } from '../invented/inventedSummary.ts';

describe('the result on screen', () => {
  it('is the first one with a limit until another is asked for', () => {
    const shown = new ShownResult();
    expect(findResult(inventedSummary, shown.pointQuantity, false)).toBe(inventedSummary.quantities[0]);
    expect(findResult(inventedSummary, shown.pairQuantity, true)).toBe(inventedSummary.quantities[2]);
    shown.ask(inventedSummary.quantities[1]);
    expect(findResult(inventedSummary, shown.pointQuantity, false)).toBe(inventedSummary.quantities[1]);
    expect(findResult(inventedSummary, shown.asked, null)).toBe(inventedSummary.quantities[1]);
  });

  it('survives a new answer, because it is kept by name', () => {
    const shown = new ShownResult();
    shown.ask(inventedSummary.quantities[1]);
    const newer = { ...inventedSummary, quantities: [...inventedSummary.quantities].reverse(), limits: [] };
    expect(findResult(newer, shown.pointQuantity, false)?.quantity.id).toBe(
      inventedSummary.quantities[1].quantity.id,
    );
  });

  it('shows the point it belongs to, and never that of a fixed point by itself', () => {
    const shown = new ShownResult();
    expect(shownPoint(inventedSummary, shown)).toBe(2);
    expect(shownPoint({ ...inventedSummary, quantities: [], limits: [] }, shown)).toBe(1);
    shown.point = 0;
    expect(shownPoint(inventedSummary, shown)).toBe(0);
  });
});
