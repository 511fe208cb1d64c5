// Builds a command for Node from its TypeScript entries, when a source has changed, and runs it:
// node built.mjs NAME entry.ts [more entries] -- arguments
import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';

const root = fileURLToPath(new URL('../../', import.meta.url));
const split = process.argv.indexOf('--');
const [name, ...entries] = process.argv.slice(2, split < 0 ? undefined : split);
const words = split < 0 ? [] : process.argv.slice(split + 1);
const cache = join(root, 'node_modules', '.cache', 'slow-ground');
const DAY_MS = 86_400_000;
const shell = process.ppid;

/** Paths, sizes and times of all sources, as one hash. */
function stampOf(folders) {
  const hash = createHash('sha256');
  const visit = (path) => {
    for (const entry of readdirSync(path, { withFileTypes: true })) {
      const inside = join(path, entry.name);
      if (entry.isDirectory()) visit(inside);
      else {
        const { size, mtimeMs } = statSync(inside);
        hash.update(`${inside} ${size} ${mtimeMs}\n`);
      }
    }
  };
  folders.forEach((each) => visit(join(root, each)));
  return hash.update(readFileSync(join(root, 'package-lock.json'))).digest('hex');
}

/** Takes away builds that are older than a day; younger ones may be running. */
function forgetOldBuilds() {
  for (const each of readdirSync(cache)) {
    const path = join(cache, each);
    const made = statSync(path, { throwIfNoEntry: false })?.mtimeMs ?? Infinity;
    if (Date.now() - made > DAY_MS) rmSync(path, { recursive: true, force: true });
  }
}

const stamp = stampOf(['engine', 'workers', 'web/words', 'tests/bench']);
const folder = join(cache, `${name}-${stamp.slice(0, 16)}`);
if (!existsSync(folder)) {
  mkdirSync(cache, { recursive: true });
  forgetOldBuilds();
  // built apart and put in its place at once, because the tasks of an array job may all start together
  const draft = mkdtempSync(join(cache, 'draft-'));
  const input = Object.fromEntries(
    entries.map((entry) => [entry.replace(/^.*\//, '').replace(/\.ts$/, ''), join(root, entry)]),
  );
  await build({
    root,
    configFile: false,
    logLevel: 'error',
    publicDir: false,
    build: {
      ssr: true,
      target: 'node20',
      outDir: draft,
      emptyOutDir: true,
      minify: false,
      rollupOptions: { input, output: { entryFileNames: '[name].mjs', chunkFileNames: '[name]-[hash].mjs' } },
    },
    ssr: { noExternal: true },
  });
  writeFileSync(join(draft, 'package.json'), '{ "type": "module" }\n');
  try {
    renameSync(draft, folder);
  } catch (error) {
    rmSync(draft, { recursive: true, force: true });
    // another was quicker
    if (!existsSync(folder)) throw error;
  }
}
const main = join(folder, `${entries[0].replace(/^.*\//, '').replace(/\.ts$/, '')}.mjs`);
const child = spawn(process.execPath, [main, ...words], { stdio: 'inherit' });
// Ctrl-C reaches the child by itself; this process only waits for how it ends
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    if (signal !== 'SIGINT' || !process.stdin.isTTY) child.kill(signal);
  });
}
// npm passes a signal to its shell and not beyond: where the shell is gone, the command ends too
if (process.env.npm_lifecycle_event) {
  setInterval(() => {
    if (process.ppid !== shell) child.kill('SIGTERM');
  }, 100).unref();
}
child.on('close', (code, signal) => process.exit(code ?? (signal === 'SIGINT' ? 130 : 1)));
