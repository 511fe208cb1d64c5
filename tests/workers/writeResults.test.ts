import { mkdtempSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { centralStudy, runReplicate } from '../../engine/study.ts';
import { summarise } from '../../engine/summary/summarise.ts';
import { Ending, INTERRUPTED, NOT_FINISHED } from '../../workers/ending.ts';
import { writeResults } from '../../workers/writeResults.ts';
import { smallProject } from '../browser/smallProject.ts';
import { modelOf } from '../modelOf.ts';

const model = modelOf(smallProject('invented small project', 100));
const replicate = runReplicate(model, 0);
const summary = summarise(model, [replicate], centralStudy(model));
const results = { summary, every: [replicate], toJoin: 'the project' };
const FILES = [
  'exceedance.csv',
  'realisations.csv',
  'replicates.bin',
  'settlement-with-time.csv',
  'summary.json',
];

let folder = '';
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'slow-ground-write-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

/** Interrupts after some pieces have been written. */
function after(pieces: number) {
  let written = 0;
  return {
    onInterrupt: () => undefined,
    check: async () => {
      written += 1;
      if (written > pieces) throw new Ending(INTERRUPTED, 'Interrupted.');
    },
  };
}

describe('the results of a run', () => {
  it('appear all at once, open to whom new folders are', async () => {
    const out = join(folder, 'results');
    await writeResults(out, results, after(Infinity));
    expect(readdirSync(folder)).toEqual(['results']);
    expect(readdirSync(out).sort()).toEqual(FILES);
    expect(statSync(out).mode & 0o777).toBe(0o777 & ~process.umask());
  });

  it('leave nothing behind when interrupted after any piece, and what was there before stays', async () => {
    const out = join(folder, 'results');
    await writeResults(out, results, after(Infinity));
    writeFileSync(join(out, 'summary.json'), 'of before');
    for (let pieces = 0; pieces < 8; pieces += 1) {
      await expect(writeResults(out, results, after(pieces))).rejects.toMatchObject({ code: INTERRUPTED });
      await expect(writeResults(join(folder, 'new'), results, after(pieces))).rejects.toBeInstanceOf(Ending);
    }
    expect(readdirSync(folder)).toEqual(['results']);
    expect(readFileSync(join(out, 'summary.json'), 'utf8')).toBe('of before');
  });

  it('say in a sentence that they could not be written', async () => {
    writeFileSync(join(folder, 'file'), '');
    await expect(
      writeResults(join(folder, 'file', 'results'), results, after(Infinity)),
    ).rejects.toMatchObject({
      code: NOT_FINISHED,
    });
    expect(readdirSync(folder)).toEqual(['file']);
  });

  it('hold one line for each realisation, with a unit in each name of a result', async () => {
    const out = join(folder, 'results');
    await writeResults(out, results, after(Infinity));
    const [head, ...rows] = readFileSync(join(out, 'realisations.csv'), 'utf8').trimEnd().split('\r\n');
    const names = head.split(',');
    expect(rows).toHaveLength(100);
    for (const row of rows) expect(row.split(',')).toHaveLength(names.length);
    const column = names.indexOf('settlement_at_horizon@crest m');
    const last = replicate.historyTimes.length - 1;
    expect(Number(rows[7].split(',')[column])).toBe(replicate.settlement[last * 100 + 7]);
  });
});
