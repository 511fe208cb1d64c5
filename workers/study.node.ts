import { parentPort } from 'node:worker_threads';
import { expose } from 'comlink';
import nodeEndpoint from 'comlink/dist/esm/node-adapter.mjs';
import { studyService } from './studyService.ts';

if (parentPort === null) throw new Error('study.node: is to be run as a worker thread');
expose(studyService(), nodeEndpoint(parentPort));
