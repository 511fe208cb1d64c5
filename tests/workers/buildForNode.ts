import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));

/**
 * Builds entries for Node into a new folder, as `npm run analyse` does.
 *
 * @param entries paths from the root; `a/b.ts` becomes `b.mjs`
 */
export async function buildForNode(entries: readonly string[]): Promise<string> {
  const folder = mkdtempSync(join(tmpdir(), 'slow-ground-built-'));
  await build({
    root: ROOT,
    configFile: false,
    logLevel: 'error',
    publicDir: false,
    build: {
      ssr: true,
      target: 'node20',
      outDir: folder,
      minify: false,
      rollupOptions: {
        input: Object.fromEntries(entries.map((entry) => [basename(entry, '.ts'), join(ROOT, entry)])),
        output: { entryFileNames: '[name].mjs', chunkFileNames: '[name]-[hash].mjs' },
      },
    },
    ssr: { noExternal: true },
  });
  writeFileSync(join(folder, 'package.json'), '{ "type": "module" }\n');
  return folder;
}
