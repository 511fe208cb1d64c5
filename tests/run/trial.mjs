// `npm run trial`: the long trials in full, of which `npm test` runs a fixed twentieth.
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../../', import.meta.url));
const { status } = spawnSync(
  process.execPath,
  ['node_modules/vitest/vitest.mjs', 'run', '--project', 'node', 'tests/trial', ...process.argv.slice(2)],
  { cwd: root, stdio: 'inherit', env: { ...process.env, SLOW_GROUND_TRIAL: 'full' } },
);
process.exit(status ?? 1);
