declare module 'comlink/dist/esm/node-adapter.mjs' {
  import type { Endpoint } from 'comlink';
  import type { MessagePort, Worker } from 'node:worker_threads';
  /** Wraps a worker thread, or the port to its parent, as an endpoint of comlink. */
  export default function nodeEndpoint(port: MessagePort | Worker): Endpoint;
}
