import { chromium, type Browser } from 'playwright-core';
import { findBrowser } from '../run/browser.mjs';

/** A browser of its own for a test file: the one that `npm test` found, or one that is installed. */
export async function openChromium(): Promise<Browser> {
  const executablePath = findBrowser();
  if (executablePath === null) throw new Error('openChromium: no browser found; `npm test` installs one');
  const isRoot = typeof process.getuid === 'function' && process.getuid() === 0;
  return chromium.launch({ executablePath, args: isRoot ? ['--no-sandbox'] : [] });
}
