import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { Summary } from '../../../engine/summary/summary.ts';
import { inventedModel } from '../invented/inventedModel.ts';
import { inventedSummary } from '../invented/inventedSummary.ts';

/** Studies that end and report only when the test says so. */
const started: { report: (progress: unknown) => void; end: (end: unknown) => void; cancelled: boolean }[] =
  [];

vi.mock('../../../web/state/startBrowserStudy.ts', () => ({
  replicatesOf: () => 10,
  startBrowserStudy: (_model: unknown, report: (progress: unknown) => void) => {
    let end: (value: unknown) => void = () => undefined;
    const result = new Promise((resolve) => (end = resolve));
    const study = { report, end, cancelled: false };
    started.push(study);
    return {
      result,
      cancel: () => {
        study.cancelled = true;
        end({ kind: 'cancelled' });
      },
    };
  },
}));

const { CurrentStudy } = await import('../../../web/state/currentStudy.svelte.ts');

const settled = () => new Promise((resolve) => setTimeout(resolve));
const other = (name: string): Summary => ({ ...inventedSummary, warnings: [name] });

beforeEach(() => {
  started.length = 0;
});

describe('the study on screen', () => {
  it('belongs to the inputs on screen only while their digests agree', async () => {
    const study = new CurrentStudy();
    void study.start(inventedModel);
    expect(study.belongsTo(inventedModel)).toBe(false);
    started[0].end({ kind: 'done', summary: inventedSummary });
    await settled();
    expect(study.belongsTo(inventedModel)).toBe(true);
    expect(study.belongsTo({ ...inventedModel, digest: 'f'.repeat(32) })).toBe(false);
    expect(study.belongsTo(null)).toBe(false);
  });

  it('sharpens while replicates come in', () => {
    const study = new CurrentStudy();
    void study.start(inventedModel);
    started[0].report({ replicatesDone: 3, replicates: 10, summary: other('coarse') });
    expect(study.summary?.warnings).toEqual(['coarse']);
    expect(study.replicatesDone).toBe(3);
    started[0].report({ replicatesDone: 4, replicates: 10, summary: null });
    expect(study.summary?.warnings).toEqual(['coarse']);
  });

  it('is ended by a newer one, and what the older still reports is thrown away', async () => {
    const study = new CurrentStudy();
    void study.start(inventedModel);
    void study.start(inventedModel);
    expect(started[0].cancelled).toBe(true);
    started[0].report({ replicatesDone: 9, replicates: 10, summary: other('older') });
    await settled();
    expect(study.summary).toBeNull();
    expect(study.state).toBe('running');
    started[1].end({ kind: 'done', summary: other('newer') });
    await settled();
    expect(study.summary?.warnings).toEqual(['newer']);
    expect(study.state).toBe('done');
  });

  it('keeps what it has answered when it is cancelled, and says a fault', async () => {
    const study = new CurrentStudy();
    void study.start(inventedModel);
    started[0].report({ replicatesDone: 3, replicates: 10, summary: other('coarse') });
    study.cancel();
    await settled();
    expect(study.state).toBe('cancelled');
    expect(study.summary?.warnings).toEqual(['coarse']);
    void study.start(inventedModel);
    started[1].end({ kind: 'fault', message: 'A worker died twice.' });
    await settled();
    expect(study.state).toBe('fault');
    expect(study.faultSentence).toBe('A worker died twice.');
  });
});
