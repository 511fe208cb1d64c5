// Finds a browser for the tests: an environment variable, then an installed Chromium, Chrome or Edge, then
// Playwright's own, then Debian's package where it may be installed.
import { execFileSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { chromium } from 'playwright-core';

const INSTALLED = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
  '/usr/bin/microsoft-edge',
  '/snap/bin/chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe',
];

/** Path of a browser, or null. One that is named but not there is an error, not a reason to take another. */
export function findBrowser() {
  const named = process.env.SLOW_GROUND_BROWSER;
  if (named) return existsSync(named) ? named : null;
  const candidates = [...INSTALLED, chromium.executablePath()];
  return candidates.find((path) => path && existsSync(path)) ?? null;
}

/** Path of a browser; installs Debian's where that can be done without asking. */
export function requireBrowser() {
  const found = findBrowser();
  if (found) return found;
  const named = process.env.SLOW_GROUND_BROWSER;
  if (named) {
    console.error(`SLOW_GROUND_BROWSER names ${named}, which is not there.`);
    process.exit(1);
  }
  const isRoot = typeof process.getuid === 'function' && process.getuid() === 0;
  if (isRoot && existsSync('/usr/bin/apt-get')) {
    console.error('Installing Chromium for the browser tests (once) …');
    const options = {
      stdio: ['ignore', 'ignore', 'inherit'],
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    };
    try {
      execFileSync('apt-get', ['update', '-qq'], options);
      execFileSync('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium'], options);
    } catch {
      // apt-get has said why; what is to be done follows
    }
    const now = findBrowser();
    if (now) return now;
  }
  console.error(
    'The browser tests need Chromium, Chrome or Edge: install one, or name its path in SLOW_GROUND_BROWSER.',
  );
  process.exit(1);
}
