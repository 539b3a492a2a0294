// npm run compare -- ARGS: the command line of this checkout, built first when its sources are newer.
import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { ensureBuilt } from './built.mjs';
import { root } from './command.mjs';

const [program, ...args] = process.argv.slice(2);
await ensureBuilt().catch(error => {
  console.error(error.message);
  process.exit(1);
});
// npm runs scripts in the project's folder; file names on the command line are meant from where npm was called.
const cwd = process.env.INIT_CWD ?? process.cwd();
const { status } = spawnSync(process.execPath, [path.join(root, 'dist', `${program}.js`), ...args], {
  cwd,
  stdio: 'inherit',
});
process.exit(status ?? 1);
