// Installs what is missing: runs before `npm start`, `npm test` and the other commands. A stamp tells whether
// node_modules belongs to this lock file, platform and Node version.
import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';

const root = new URL('../../', import.meta.url);
const stampFile = new URL('node_modules/.slow-ground-stamp', root);
const [major] = process.versions.node.split('.');
if (Number(major) < 20) {
  console.error(`Slow Ground needs Node 20 or newer; this is ${process.versions.node}.`);
  process.exit(1);
}
const lock = readFileSync(new URL('package-lock.json', root));
const stamp = createHash('sha256')
  .update(lock)
  .update(`${process.platform} ${process.arch} ${major}`)
  .digest('hex');
const installed = existsSync(stampFile) ? readFileSync(stampFile, 'utf8') : '';
if (installed !== stamp) {
  console.error('Installing packages (once) …');
  // run through npm's own script where npm started this, so that no shell is needed on any system
  const npm = process.env.npm_execpath;
  const options = { cwd: root, stdio: ['ignore', 'inherit', 'inherit'] };
  const words = ['ci', '--no-audit', '--no-fund', '--loglevel=error'];
  if (npm) execFileSync(process.execPath, [npm, ...words], options);
  else execFileSync('npm', words, { ...options, shell: process.platform === 'win32' });
  writeFileSync(stampFile, stamp);
}
