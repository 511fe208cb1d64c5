import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { centralStudy, runReplicate } from '../../engine/study.ts';
import { summarise } from '../../engine/summary/summarise.ts';
import { nodeWorkers } from '../../workers/nodeWorkers.ts';
import type { StudyProgress } from '../../workers/protocol.ts';
import { summaryFile } from '../../workers/summaryFile.ts';
import { WorkerPool } from '../../workers/workerPool.ts';
import { smallProject } from '../browser/smallProject.ts';
import { modelOf } from '../modelOf.ts';
import { buildForNode } from './buildForNode.ts';
import type { Death } from './dyingStudy.node.ts';

const REPLICATES = [0, 1, 2];
const model = modelOf(smallProject('invented small project', 300));
let folder = '';
/** What the whole study says by the engine in this process. */
let expected = '';

beforeAll(async () => {
  const replicates = REPLICATES.map((replicate) => runReplicate(model, replicate));
  expected = summaryFile(summarise(model, replicates, centralStudy(model)));
  folder = await buildForNode(['workers/study.node.ts', 'tests/workers/dyingStudy.node.ts']);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

afterEach(() => {
  delete process.env.DEATH;
});

const entry = (name: string) => pathToFileURL(join(folder, name));

/** The worker that dies; `once` names the mark that it leaves. */
function dying(at: Death['at'], how: Death['how'], once = ''): URL {
  process.env.DEATH = JSON.stringify({ at, how, mark: once && join(folder, once) } satisfies Death);
  return entry('dyingStudy.node.mjs');
}
const hasDied = (once: string) => existsSync(join(folder, once));

async function studyWith(file: URL, size: number, onProgress?: (progress: StudyProgress) => void) {
  const pool = new WorkerPool(nodeWorkers(file), size);
  const end = await pool.start({ model, replicates: REPLICATES, onProgress }).end;
  pool.dispose();
  return end.kind === 'done' ? summaryFile(end.summary) : end;
}

describe('a study on worker threads', () => {
  it('gives the bytes of the engine alone with 1, 2 and 7 workers', async () => {
    for (const size of [1, 2, 7]) {
      expect((await studyWith(entry('study.node.mjs'), size)) === expected, `${size} workers`).toBe(true);
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

  it.each(['exit', 'throw'] as const)(
    'replaces a worker that dies by %s at a replicate, and does it again',
    async (how) => {
      expect((await studyWith(dying('replicate', how, `${how} once`), 2)) === expected).toBe(true);
      expect(hasDied(`${how} once`)).toBe(true);
    },
  );

  it('replaces the worker that pools, and does again what died with it', async () => {
    expect((await studyWith(dying('keep', 'exit', 'keep once'), 2)) === expected).toBe(true);
    expect(hasDied('keep once')).toBe(true);
  });

  it('ends in a fault when workers die again and again at one replicate', async () => {
    expect(await studyWith(dying('replicate', 'exit'), 2)).toEqual({
      kind: 'fault',
      message: 'A worker died 3 times at replicate 1: a worker ended with 3.',
    });
  });

  it('ends in a fault when the worker that pools dies again and again', async () => {
    expect(await studyWith(dying('keep', 'exit'), 2)).toEqual({
      kind: 'fault',
      message: 'A worker died 3 times at the same work: a worker ended with 3.',
    });
  });

  it('ends in a fault with the words of the engine when it throws', async () => {
    expect(await studyWith(dying('central', 'throw'), 2)).toEqual({
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
    expect(end.kind === 'done' && summaryFile(end.summary) === expected).toBe(true);
    pool.dispose();
  });
});
