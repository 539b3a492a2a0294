// What npm run lint and npm run types look at; each line is one check and counts as one test.
import { existsSync } from 'node:fs';
import path from 'node:path';
import { root, tool } from './command.mjs';

const folders = ['src', 'src/report', 'src/host', 'src/webview', 'src/cli', 'test'];

export const lint = [
  ['eslint', tool('eslint'), ['--config', '.config/eslint.mjs', '--max-warnings', '0', '.']],
  ['prettier', tool('prettier'), ['--check', '--log-level', 'warn', '.']],
  [
    'import directions',
    tool('depcruise'),
    ['--config', '.config/depcruise.cjs', '--output-type', 'err', 'src'],
  ],
  ['unused code', tool('knip'), ['--config', '.config/knip.json', '--no-progress', '--no-config-hints']],
];

export const types = folders
  .filter(folder => existsSync(path.join(root, folder, 'tsconfig.json')))
  .map(folder => [`types of ${folder}`, tool('tsc'), ['-p', folder]]);
