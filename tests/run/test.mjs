// `npm test`: types, lint, format, unit, published, scenario and browser tests. The last line is the plain
// count; types, lint and format count as one check each.
import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { requireBrowser } from './browser.mjs';

const root = fileURLToPath(new URL('../../', import.meta.url));
const bin = (name) => join(root, 'node_modules', '.bin', name);
const scratch = mkdtempSync(join(tmpdir(), 'slow-ground-test-'));

/** Runs a command; resolves with whether it ended well and with what it printed. */
function run(title, command, words, more = {}) {
  return new Promise((resolve) => {
    const started = Date.now();
    const child = spawn(command, words, {
      cwd: root,
      stdio: ['ignore', 'pipe', 'pipe'],
      shell: process.platform === 'win32',
      env: { ...process.env, NO_COLOR: '1', ...more },
    });
    let printed = '';
    child.stdout.on('data', (data) => (printed += data));
    child.stderr.on('data', (data) => (printed += data));
    child.on('error', (error) => resolve({ title, ok: false, printed: String(error) }));
    child.on('close', (code) => {
      const seconds = ((Date.now() - started) / 1000).toFixed(1);
      console.log(`${code === 0 ? 'ok  ' : 'FAIL'} ${title} (${seconds} s)`);
      if (code !== 0) console.log(printed.trimEnd());
      resolve({ title, ok: code === 0, printed });
    });
  });
}

/** Runs vitest on a project of its configuration; counts what its own report says. */
async function runVitest(title, project, more = {}) {
  const report = join(scratch, `${project}.json`);
  const words = [
    'run',
    '--project',
    project,
    // a forgotten `it.only` fails, it does not hide the rest
    '--allowOnly=false',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ];
  const ended = await run(title, bin('vitest'), words, more);
  try {
    const { numPassedTests, numFailedTests, testResults } = JSON.parse(readFileSync(report, 'utf8'));
    // a file that cannot be loaded, or whose hook fails, has no test that failed: it counts as one itself
    const broken = testResults.filter(
      ({ status, assertionResults }) =>
        status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
    ).length;
    const failed = numFailedTests + broken;
    return { passed: numPassedTests, failed: !ended.ok && failed === 0 ? 1 : failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}

async function checks() {
  const results = [
    await run('types of engine, workers and tests', bin('tsc'), ['--noEmit']),
    await run('types of the engine alone, without browser or Node', bin('tsc'), ['--noEmit', '-p', 'engine']),
    await run('types of the page', bin('svelte-check'), [
      '--tsconfig',
      './tsconfig.json',
      '--fail-on-warnings',
    ]),
    await run('lint', bin('eslint'), ['.', '--max-warnings=0']),
    await run('format', bin('prettier'), [
      '--check',
      '--log-level=warn',
      '**/*.{ts,mts,mjs,js,svelte,css,html,md}',
    ]),
  ];
  const passed = results.filter(({ ok }) => ok).length;
  return { passed, failed: results.length - passed };
}

const browser = requireBrowser();
const [checked, unit] = await Promise.all([
  checks(),
  runVitest('unit, published, scenario and trial tests', 'node'),
]);
const build = await run('build of the page', bin('vite'), ['build', '--logLevel=warn']);
const inBrowser = build.ok
  ? await runVitest('browser tests', 'browser', { SLOW_GROUND_BROWSER: browser })
  : { passed: 0, failed: 1 };
rmSync(scratch, { recursive: true, force: true });

const parts = [checked, { passed: Number(build.ok), failed: Number(!build.ok) }, unit, inBrowser];
const passed = parts.reduce((sum, part) => sum + part.passed, 0);
const failed = parts.reduce((sum, part) => sum + part.failed, 0);
if (unit.passed === 0) console.log('no unit test ran');
process.exitCode = failed > 0 || unit.passed === 0 ? 1 : 0;
console.log(`${passed} passed, ${failed} failed`);
