import { fileURLToPath } from 'node:url';
import { svelte } from '@sveltejs/vite-plugin-svelte';
import type { Plugin } from 'vite';
import { defineConfig } from 'vitest/config';

const folder = (path: string) => fileURLToPath(new URL(path, import.meta.url));

/** The development server puts styles into the page as elements; the built page loads them and stays strict. */
const stylesOfTheDevServer: Plugin = {
  name: 'styles-of-the-dev-server',
  apply: 'serve',
  transformIndexHtml: (html) => html.replace("style-src 'self'", "style-src 'self' 'unsafe-inline'"),
};

export default defineConfig({
  root: folder('web'),
  // relative, so that the built files work from any sub-path
  base: './',
  publicDir: folder('public'),
  cacheDir: folder('node_modules/.vite'),
  plugins: [svelte({ configFile: false }), stylesOfTheDevServer],
  worker: { format: 'es' },
  build: { outDir: folder('dist'), emptyOutDir: true, sourcemap: false, target: 'es2022' },
  server: { port: 5173, fs: { allow: [folder('.')] } },
  preview: { port: 5173 },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          root: folder('.'),
          include: ['tests/**/*.test.ts'],
          exclude: ['tests/browser/**'],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'browser',
          root: folder('.'),
          include: ['tests/browser/**/*.test.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
