// Runs the bundled tests in an editor: the installed one that WEIGHBEAM_CODE names, else the npm-carried editor server.
//   node launch.mjs EXTENSION TESTS WORKSPACE PROFILE [FLAGS…]
import { runTests } from '@vscode/test-electron';
import path from 'node:path';

const [extension, tests, workspace, profile, ...flags] = process.argv.slice(2);
await runTests({
  vscodeExecutablePath:
    process.env.WEIGHBEAM_CODE ?? path.resolve(import.meta.dirname, '../../.config/host/editor.mjs'),
  extensionDevelopmentPath: extension,
  extensionTestsPath: tests,
  launchArgs: [workspace, `--user-data-dir=${profile}`, '--disable-extensions', ...flags],
});
