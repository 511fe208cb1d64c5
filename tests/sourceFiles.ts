import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, normalize, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('..', import.meta.url));

/** A source file and what it imports: paths from the top of the checkout, or names of packages. */
export interface SourceFile {
  readonly path: string;
  readonly text: string;
  readonly imports: readonly string[];
}

/** All TypeScript and Svelte files below some folders. */
export function sourceFiles(...folders: readonly string[]): SourceFile[] {
  return folders.flatMap((folder) =>
    readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
      .filter((name) => /\.(ts|svelte)$/.test(name) && !name.includes('node_modules'))
      .map((name) => {
        const path = `${folder}/${name.split(sep).join('/')}`;
        const text = readFileSync(join(root, path), 'utf8');
        return { path, text, imports: importsOf(path, text) };
      }),
  );
}

/** What a text imports, static, dynamic and by `new URL`, types included. */
export function importsOf(path: string, text: string): string[] {
  const found = [
    ...text.matchAll(/\b(?:import|export)\b[^'"`;]*?\bfrom\s*['"]([^'"]+)['"]/g),
    ...text.matchAll(/\bimport\s*\(?\s*['"]([^'"]+)['"]/g),
    ...text.matchAll(/new URL\(\s*['"]([^'"]+\.ts)['"]/g),
  ].map((match) => match[1]);
  return found.map((name) =>
    name.startsWith('.')
      ? normalize(join(dirname(path), name))
          .split(sep)
          .join('/')
      : name,
  );
}

/** The folder or file right below the first folder of a path: 'engine/project' of 'engine/project/model.ts'. */
export function placeOf(path: string): string {
  const parts = path.split('/');
  return parts.length > 2 ? parts.slice(0, 2).join('/') : path.replace(/\.ts$/, '');
}
