#!/usr/bin/env node
// Stands in for the desktop editor where none is installed: takes the flags that @vscode/test-electron passes, runs the
// extension's tests in the editor server's workbench, and ends with their exit code (124: they never ended).
import { parseArgs } from 'node:util';
import { openBrowser } from './chromium.mjs';
import { startServer, workbenchAddress } from './server.mjs';

const { values, positionals } = parseArgs({
  allowPositionals: true,
  strict: false, // the desktop editor's other flags mean nothing here
  options: {
    extensionDevelopmentPath: { type: 'string' },
    extensionTestsPath: { type: 'string' },
    restricted: { type: 'boolean' },
  },
});
const limitMs = Number(process.env.WEIGHBEAM_TEST_LIMIT_S ?? 180) * 1000;

const server = await startServer({ trusted: !values.restricted });
const { browser, context } = await openBrowser(server.origin);
const log = [];
let code;
try {
  const page = await context.newPage();
  const ended = new Promise(resolve => {
    setTimeout(resolve, limitMs, 124).unref();
    page.once('crash', () => resolve(125));
    // The workbench of a test run calls these two where the page has them.
    page.exposeFunction('codeAutomationLog', (type, args) => void log.push(`${type}: ${args.join(' ')}`));
    page.exposeFunction('codeAutomationExit', resolve);
  });
  await page.goto(
    workbenchAddress(server, {
      folder: positionals[0],
      extension: values.extensionDevelopmentPath,
      tests: values.extensionTestsPath,
    }),
  );
  code = await ended;
} finally {
  await browser.close();
  await server.stop();
}
if (code !== 0) console.log(log.join('\n'));
process.exit(code);
