import { releaseProxy, type Remote } from 'comlink';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Model } from '../../engine/project/model.ts';
import type { Realisations } from '../../engine/settlement/realisations.ts';
import type { StudyEnd, StudyService } from '../../workers/protocol.ts';
import { WorkerHandle } from '../../workers/workerHandle.ts';
import { WorkerPool, type StudyRun } from '../../workers/workerPool.ts';

const MODEL = {} as Model;

/** Workers that answer when they are told to, each in the order of the questions. */
class Workshop {
  readonly workers: { handle: WorkerHandle; answers: (() => void)[]; isEnded: boolean }[] = [];

  readonly make = (): WorkerHandle => {
    const answers: (() => void)[] = [];
    let kept: number[] = [];
    let keptRun = -1;
    const later = <T>(answer: () => T) => new Promise<T>((resolve) => answers.push(() => resolve(answer())));
    const remote = {
      [releaseProxy]: () => undefined,
      replicate: (_: Model, replicate: number) => later(() => ({ replicate, inputs: [] })),
      central: () => later(() => ({ central: [], numericalError: null, warnings: [] })),
      keep: (run: number, { replicate }: Realisations) =>
        later(() => {
          if (run !== keptRun) [keptRun, kept] = [run, []];
          kept.push(replicate);
        }),
      chances: () => later(() => []),
      summary: (run: number) => later(() => ({ run, kept: [...kept].sort((a, b) => a - b) })),
    };
    const worker = {
      handle: new WorkerHandle(remote as unknown as Remote<StudyService>, () => {
        worker.isEnded = true;
        answers.length = 0;
      }),
      answers,
      isEnded: false,
    };
    this.workers.push(worker);
    return worker.handle;
  };

  get alive() {
    return this.workers.filter(({ isEnded, handle }) => !isEnded && !handle.isDead);
  }

  /** Lets one of the workers that have something to say say it; false when none has. */
  say(which: number): boolean {
    const able = this.alive.filter(({ answers }) => answers.length > 0);
    able[which % Math.max(1, able.length)]?.answers.shift()?.();
    return able.length > 0;
  }

  /** The same, and waits until it has been heard. */
  async answer(which: number): Promise<boolean> {
    const hasSaid = this.say(which);
    await turn();
    return hasSaid;
  }

  async kill(which: number): Promise<void> {
    const { alive } = this;
    const worker = alive[which % Math.max(1, alive.length)];
    if (worker !== undefined) worker.answers.length = 0;
    worker?.handle.died('killed on purpose');
    await turn();
  }
}

const turn = () => new Promise((resolve) => setImmediate(resolve));

const events = fc.array(
  fc.oneof(
    {
      weight: 1,
      arbitrary: fc.record({ does: fc.constant('start' as const), count: fc.integer({ min: 1, max: 6 }) }),
    },
    {
      weight: 1,
      arbitrary: fc.record({
        does: fc.constant('cancel' as const),
        which: fc.nat(9),
        asAnAnswerComes: fc.boolean(),
      }),
    },
    {
      weight: 2,
      arbitrary: fc.record({
        does: fc.constant('kill' as const),
        which: fc.nat(9),
        times: fc.constantFrom(1, 1, 1, 3),
      }),
    },
    { weight: 12, arbitrary: fc.record({ does: fc.constant('answer' as const), which: fc.nat(9) }) },
  ),
  { maxLength: 60, size: 'max' },
);

describe('a worker pool', () => {
  it('ends every run exactly once, whatever is started, cancelled and killed in whatever order', async () => {
    const seen = new Set<StudyEnd['kind']>();
    await fc.assert(
      fc.asyncProperty(events, fc.integer({ min: 1, max: 3 }), async (sequence, size) => {
        const workshop = new Workshop();
        const pool = new WorkerPool(workshop.make, size);
        const runs: {
          run: StudyRun;
          asked: number[];
          ends: StudyEnd[];
          toldAfter: number;
          isOver: boolean;
        }[] = [];
        let deaths = 0;
        for (const event of sequence) {
          if (event.does === 'start') {
            const asked = Array.from({ length: event.count }, (_, i) => i);
            const ends: StudyEnd[] = [];
            const entry = { run: null as unknown as StudyRun, asked, ends, toldAfter: 0, isOver: false };
            entry.run = pool.start({
              model: MODEL,
              replicates: asked,
              onProgress: () => (entry.toldAfter += Number(entry.isOver)),
              onReplicate: () => (entry.toldAfter += Number(entry.isOver)),
            });
            void entry.run.end.then((end) => {
              ends.push(end);
              entry.isOver = true;
            });
            runs.push(entry);
          } else if (event.does === 'cancel') {
            if (event.asAnAnswerComes) workshop.say(event.which);
            const cancelled = runs[event.which % Math.max(1, runs.length)];
            cancelled?.run.cancel();
            if (cancelled) cancelled.isOver = true;
          } else if (event.does === 'kill') {
            deaths += event.times;
            for (let i = 0; i < event.times; i += 1) await workshop.kill(event.which);
          } else await workshop.answer(event.which);
        }
        while (await workshop.answer(0));
        for (const [i, { asked, ends, toldAfter }] of runs.entries()) {
          expect(ends).toHaveLength(1);
          expect(toldAfter).toBe(0);
          const [end] = ends;
          seen.add(end.kind);
          if (end.kind === 'done') expect(end.summary).toEqual({ run: i + 1, kept: asked });
          if (end.kind === 'fault') expect(deaths).toBeGreaterThanOrEqual(3);
          if (end.kind === 'replaced') expect(i).toBeLessThan(runs.length - 1);
        }
        expect(workshop.alive.length).toBeLessThanOrEqual(size + 1);
        pool.dispose();
        expect(workshop.alive).toHaveLength(0);
      }),
      { seed: 3, numRuns: 400 },
    );
    expect([...seen].sort()).toEqual(['cancelled', 'done', 'fault', 'replaced']);
  });

  it('keeps two answers apart that come in another order', async () => {
    const workshop = new Workshop();
    const pool = new WorkerPool(workshop.make, 2);
    const { end } = pool.start({ model: MODEL, replicates: [4, 2, 7, 0] });
    for (let which = 1; await workshop.answer(which); which = 3 - which);
    expect(await end).toEqual({ kind: 'done', summary: { run: 1, kept: [0, 2, 4, 7] } });
  });

  it('runs only what is not given', async () => {
    const workshop = new Workshop();
    const pool = new WorkerPool(workshop.make, 1);
    const given = new Map(
      [0, 1, 2].map((replicate) => [replicate, { replicate, inputs: [] } as unknown as Realisations]),
    );
    const ran: number[] = [];
    const { end } = pool.start({
      model: MODEL,
      replicates: [0, 1, 2, 3],
      given,
      onReplicate: ({ replicate }) => ran.push(replicate),
    });
    while (await workshop.answer(0));
    expect(await end).toMatchObject({ kind: 'done', summary: { kept: [0, 1, 2, 3] } });
    expect(ran).toEqual([3]);
  });

  it('ends a run in a fault when the one who watches it throws', async () => {
    const workshop = new Workshop();
    const pool = new WorkerPool(workshop.make, 1);
    const { end } = pool.start({
      model: MODEL,
      replicates: [0, 1],
      onProgress: () => {
        throw new Error('the page is gone');
      },
    });
    while (await workshop.answer(0));
    expect(await end).toEqual({ kind: 'fault', message: 'the page is gone' });
  });

  it('ends a run in a fault when no worker can be made', async () => {
    const pool = new WorkerPool(() => {
      throw new Error('no more threads');
    }, 2);
    expect(await pool.start({ model: MODEL, replicates: [0] }).end).toEqual({
      kind: 'fault',
      message: 'no more threads',
    });
  });

  it('gives a run up, in a fault, after three deaths at one replicate', async () => {
    const workshop = new Workshop();
    const pool = new WorkerPool(workshop.make, 1);
    const { end } = pool.start({ model: MODEL, replicates: [0, 1] });
    // the first worker pools, the newest one runs the replicate
    for (let i = 0; i < 3; i += 1) await workshop.kill(1);
    while (await workshop.answer(0));
    expect(await end).toEqual({
      kind: 'fault',
      message: 'A worker died 3 times at replicate 0: killed on purpose.',
    });
  });

  it('finishes the next run though all its waiting workers have died', async () => {
    const workshop = new Workshop();
    const pool = new WorkerPool(workshop.make, 3);
    const study = async () => {
      const { end } = pool.start({ model: MODEL, replicates: [0, 1, 2] });
      while (await workshop.answer(0));
      return (await end).kind;
    };
    expect(await study()).toBe('done');
    expect(workshop.alive).toHaveLength(3);
    while (workshop.alive.length > 0) await workshop.kill(0);
    expect(await study()).toBe('done');
  });

  it('wants at least one worker', () => {
    for (const size of [0, -1, 1.5, NaN])
      expect(() => new WorkerPool(new Workshop().make, size)).toThrow(RangeError);
  });
});
