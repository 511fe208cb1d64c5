import { existsSync, writeFileSync } from 'node:fs';
import { parentPort } from 'node:worker_threads';
import { expose } from 'comlink';
import nodeEndpoint from 'comlink/dist/esm/node-adapter.mjs';
import { studyService } from '../../workers/studyService.ts';

// A study worker that ends itself as the environment variable DEATH says: `at` a replicate or while it pools (keep),
// `always` or once (then it leaves the file `mark`), by leaving or by an error that nobody catches.
const { at, how, mark } = JSON.parse(process.env.DEATH ?? '{}') as Partial<Death>;
const service = studyService();

export interface Death {
  readonly at: 'replicate' | 'keep' | 'central';
  readonly how: 'exit' | 'throw';
  /** Empty: always. */
  readonly mark: string;
}

function die(): void {
  if (mark) {
    if (existsSync(mark)) return;
    writeFileSync(mark, 'died');
  }
  if (how === 'exit') process.exit(3);
  // after this call, so that nothing can catch it
  process.nextTick(() => {
    throw new Error('thrown on purpose');
  });
}

if (parentPort === null) throw new Error('dyingStudy: is to be run as a worker thread');
expose(
  {
    ...service,
    replicate(...words: Parameters<typeof service.replicate>) {
      if (at === 'replicate' && words[1] === 1) die();
      return service.replicate(...words);
    },
    keep(...words: Parameters<typeof service.keep>) {
      if (at === 'keep' && words[1].replicate === 1) die();
      service.keep(...words);
    },
    central(model: Parameters<typeof service.central>[0]) {
      if (at === 'central') throw new RangeError('centralStudy: thrown on purpose');
      return service.central(model);
    },
  },
  nodeEndpoint(parentPort),
);
