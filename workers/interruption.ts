import { INTERRUPTED, Ending } from './ending.ts';

/** Ctrl-C and its kin: they end the command once what it has begun is taken back. */
export interface Interruption {
  /** What is to be done at once; of several the last one set. */
  onInterrupt: () => void;
  /** Lets signals in. @throws Ending when there was one */
  readonly check: () => Promise<void>;
}

export function listenForInterruption(): Interruption {
  let happened = false;
  const interruption: Interruption = {
    onInterrupt: () => undefined,
    async check() {
      await new Promise((resolve) => setImmediate(resolve));
      if (happened) throw new Ending(INTERRUPTED, 'Interrupted; nothing was written.');
    },
  };
  const interrupt = () => {
    happened = true;
    interruption.onInterrupt();
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, interrupt);
  return interruption;
}
