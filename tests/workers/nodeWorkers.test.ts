import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { centralStudy, runReplicate } from '../../engine/study.ts';
import { summarise } from '../../engine/summary/summarise.ts';
import { nodeWorkers } from '../../workers/nodeWorkers.ts';
import type { StudyProgress } from '../../workers/protocol.ts';
import { summaryFile } from '../../workers/summaryFile.ts';
import { WorkerPool } from '../../workers/workerPool.ts';
import { smallProject } from '../browser/smallProject.ts';
import { modelOf } from '../modelOf.ts';
import { buildForNode } from './buildForNode.ts';

const REPLICATES = [0, 1, 2];
const model = modelOf(smallProject('invented small project', 300));
let folder = '';

beforeAll(async () => {
  folder = await buildForNode(['workers/study.node.ts', 'tests/workers/dyingStudy.node.ts']);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const entry = (name: string, query = '') => new URL(`${pathToFileURL(join(folder, name)).href}${query}`);

/** What a whole study says, by the engine in this process. */
const expected = () =>
  summaryFile(
    summarise(
      model,
      REPLICATES.map((replicate) => runReplicate(model, replicate)),
      centralStudy(model),
    ),
  );

async function studyWith(file: URL, size: number, onProgress?: (progress: StudyProgress) => void) {
  const pool = new WorkerPool(nodeWorkers(file), size);
  const end = await pool.start({ model, replicates: REPLICATES, onProgress }).end;
  pool.dispose();
  return end.kind === 'done' ? summaryFile(end.summary) : end;
}

describe('a study on worker threads', () => {
  it('gives the bytes of the engine alone with 1, 2 and 7 workers', async () => {
    const alone = expected();
    for (const size of [1, 2, 7]) {
      expect((await studyWith(entry('study.node.mjs'), size)) === alone, `${size} workers`).toBe(true);
    }
  });

  it('tells how far it has come, with a coarse answer after the first replicate', async () => {
    const told: StudyProgress[] = [];
    await studyWith(entry('study.node.mjs'), 1, (progress) => told.push(progress));
    const counts = told.filter(({ summary }) => summary === null).map((each) => each.replicatesDone);
    expect(counts).toEqual([1, 2, 3]);
    const first = told.find(({ summary }) => summary !== null);
    expect(first?.summary?.provenance.realisations).toBeGreaterThanOrEqual(100);
    expect(first?.summary?.provenance.realisations).toBeLessThan(300);
  });

  it.each(['exit', 'throw'])(
    'replaces a worker that dies by %s at a replicate, and does it again',
    async (how) => {
      const mark = join(folder, `mark-${how}`);
      const query = `?at=replicate&how=${how}&mark=${encodeURIComponent(mark)}`;
      expect((await studyWith(entry('dyingStudy.node.mjs', query), 2)) === expected()).toBe(true);
    },
  );

  it('replaces the worker that pools, and does again what died with it', async () => {
    const query = `?at=keep&how=exit&mark=${encodeURIComponent(join(folder, 'mark-keep'))}`;
    expect((await studyWith(entry('dyingStudy.node.mjs', query), 2)) === expected()).toBe(true);
  });

  it('ends in a fault when workers die again and again at one replicate', async () => {
    expect(await studyWith(entry('dyingStudy.node.mjs', '?at=replicate&how=exit&always'), 2)).toEqual({
      kind: 'fault',
      message: 'A worker died 3 times at replicate 1: a worker ended with 3.',
    });
  });

  it('ends in a fault when the worker that pools dies again and again', async () => {
    const end = await studyWith(entry('dyingStudy.node.mjs', '?at=keep&how=exit&always'), 2);
    expect(end).toMatchObject({ kind: 'fault' });
  });

  it('ends in a fault with the words of the engine when it throws', async () => {
    expect(await studyWith(entry('dyingStudy.node.mjs', '?at=central'), 2)).toEqual({
      kind: 'fault',
      message: 'centralStudy: thrown on purpose',
    });
  });

  it('ends in a fault when no worker can be started', async () => {
    expect(await studyWith(entry('missing.mjs'), 2)).toMatchObject({ kind: 'fault' });
  });

  it('stops within 100 ms of being cancelled, in the middle of a replicate', async () => {
    // 40 points: a replicate takes far longer than the test waits
    const long = modelOf({
      ...smallProject('invented long project', 300),
      points: Array.from({ length: 40 }, (_, i) => ({ name: `p${i}`, x_m: i / 2 })),
      pairs: [],
      limits: [],
    });
    const stops: Promise<number>[] = [];
    let cancelledAt = NaN;
    const pool = new WorkerPool(
      nodeWorkers(entry('study.node.mjs'), (worker) =>
        stops.push(
          new Promise((resolve) => worker.on('exit', () => resolve(performance.now() - cancelledAt))),
        ),
      ),
      2,
    );
    let done = 0;
    const run = pool.start({ model: long, replicates: REPLICATES, onProgress: () => (done += 1) });
    await new Promise((resolve) => setTimeout(resolve, 400));
    cancelledAt = performance.now();
    run.cancel();
    expect(await run.end).toEqual({ kind: 'cancelled' });
    expect(performance.now() - cancelledAt).toBeLessThan(100);
    expect(done).toBe(0);
    expect(stops).toHaveLength(3);
    expect(Math.max(...(await Promise.all(stops)))).toBeLessThan(100);
    pool.dispose();
  });

  it('replaces a run by a newer one, which is right', async () => {
    const pool = new WorkerPool(nodeWorkers(entry('study.node.mjs')), 2);
    const older = pool.start({ model, replicates: REPLICATES });
    await new Promise((resolve) => setTimeout(resolve, 100));
    const newer = pool.start({ model, replicates: REPLICATES });
    expect(await older.end).toEqual({ kind: 'replaced' });
    const end = await newer.end;
    expect(end.kind === 'done' && summaryFile(end.summary) === expected()).toBe(true);
    pool.dispose();
  });
});
