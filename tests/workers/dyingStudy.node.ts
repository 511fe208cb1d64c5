import { existsSync, writeFileSync } from 'node:fs';
import { parentPort } from 'node:worker_threads';
import { expose } from 'comlink';
import nodeEndpoint from 'comlink/dist/esm/node-adapter.mjs';
import { studyService } from '../../workers/studyService.ts';

// A study worker that ends itself: at `replicate` or while it pools (`keep`), `always` or once (then it leaves a
// mark in `mark`), by leaving (`exit`) or by an error that nobody catches (`throw`).
const asked = new URL(import.meta.url).searchParams;
const at = asked.get('at');
const mark = asked.get('mark') ?? '';
const service = studyService();

function dieIfAsked(): void {
  if (!asked.has('always')) {
    if (existsSync(mark)) return;
    writeFileSync(mark, 'died');
  }
  if (asked.get('how') !== 'throw') process.exit(3);
  setImmediate(() => {
    throw new Error('thrown on purpose');
  });
  // nothing answers until then
  Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 5);
}

if (parentPort === null) throw new Error('dyingStudy: is to be run as a worker thread');
expose(
  {
    ...service,
    replicate(...words: Parameters<typeof service.replicate>) {
      if (at === 'replicate' && words[1] === 1) dieIfAsked();
      return service.replicate(...words);
    },
    keep(...words: Parameters<typeof service.keep>) {
      if (at === 'keep' && words[1].replicate === 2) dieIfAsked();
      service.keep(...words);
    },
    central(model: Parameters<typeof service.central>[0]) {
      if (at === 'central') throw new RangeError('centralStudy: thrown on purpose');
      return service.central(model);
    },
  },
  nodeEndpoint(parentPort),
);
