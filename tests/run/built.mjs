// Builds a command for Node from its TypeScript entries, when a source has changed, and runs it:
// node built.mjs NAME entry.ts [more entries] -- arguments
import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';

const root = fileURLToPath(new URL('../../', import.meta.url));
const split = process.argv.indexOf('--');
const [name, ...entries] = process.argv.slice(2, split < 0 ? undefined : split);
const words = split < 0 ? [] : process.argv.slice(split + 1);
const folder = join(root, 'node_modules', '.cache', 'slow-ground', name);

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

const stampFile = join(folder, 'stamp');
const stamp = stampOf(['engine', 'workers', 'web/words', 'tests/bench']);
if (!existsSync(stampFile) || readFileSync(stampFile, 'utf8') !== stamp) {
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
      outDir: folder,
      emptyOutDir: true,
      minify: false,
      rollupOptions: { input, output: { entryFileNames: '[name].mjs', chunkFileNames: '[name]-[hash].mjs' } },
    },
    ssr: { noExternal: true },
  });
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, 'package.json'), '{ "type": "module" }\n');
  writeFileSync(stampFile, stamp);
}
const main = join(folder, `${entries[0].replace(/^.*\//, '').replace(/\.ts$/, '')}.mjs`);
const child = spawn(process.execPath, [main, ...words], { stdio: 'inherit' });
// Ctrl-C reaches the child by itself; this process only waits for how it ends
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    if (signal !== 'SIGINT' || !process.stdin.isTTY) child.kill(signal);
  });
}
child.on('close', (code, signal) => process.exit(code ?? (signal === 'SIGINT' ? 130 : 1)));
