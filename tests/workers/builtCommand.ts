import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buildForNode } from './buildForNode.ts';

export interface Ended {
  readonly code: number | null;
  readonly out: string;
  readonly err: string;
}

/** The headless command, built, with a folder to work in. */
export class BuiltCommand {
  readonly #built: string;
  /** Where it works; nothing else is in it at first. */
  readonly folder = mkdtempSync(join(tmpdir(), 'slow-ground-work-'));

  constructor(built: string) {
    this.#built = built;
  }

  static async build(): Promise<BuiltCommand> {
    return new BuiltCommand(await buildForNode(['workers/analyse.ts', 'workers/study.node.ts']));
  }

  start(words: readonly string[]): ChildProcess {
    return spawn(process.execPath, [join(this.#built, 'analyse.mjs'), ...words], { cwd: this.folder });
  }

  /** @param input what standard input holds */
  async run(words: readonly string[], input: string | Uint8Array = ''): Promise<Ended> {
    const child = this.start(words);
    // one that does not read its input may be gone before all of it is written
    child.stdin?.on('error', () => undefined);
    child.stdin?.end(input);
    return await ended(child);
  }

  /** Names of everything in the folder, hidden or not. */
  get names(): string[] {
    return readdirSync(this.folder).sort();
  }

  remove(): void {
    for (const folder of [this.#built, this.folder]) rmSync(folder, { recursive: true, force: true });
  }
}

export function ended(child: ChildProcess): Promise<Ended> {
  let [out, err] = ['', ''];
  child.stdout?.on('data', (data) => (out += data));
  child.stderr?.on('data', (data) => (err += data));
  return new Promise((resolve) => child.on('close', (code) => resolve({ code, out, err })));
}
