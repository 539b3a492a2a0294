// npm start: the extension of this checkout in a real editor, with a throw-away copy of the demo open.
//   --desktop  in the installed editor (`code`, or the one WEIGHBEAM_CODE names) instead of a browser
//   --check    starts, makes sure that the editor answers, and ends
import { spawn } from 'node:child_process';
import { rmSync } from 'node:fs';
import { cp, mkdtemp } from 'node:fs/promises';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { ensureBuilt } from './built.mjs';
import { root } from './command.mjs';
import { startServer, workbenchAddress } from './host/server.mjs';

const { values } = parseArgs({ options: { desktop: { type: 'boolean' }, check: { type: 'boolean' } } });
const file = 'firings-april.csv';
const whatToDo = `Then:
  1. Look at ${file}, which is open, and select nothing: the whole table is meant.
  2. Press F1 and run "Weighbeam: Compare groups…". Enter takes the likely answer of each question.
  3. Read the answer that opens beside the file, and copy its settings block into notes/kiln-notebook.md.
`;

const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-start-'));
process.once('exit', () => rmSync(folder, { recursive: true, force: true }));
const demo = path.join(folder, 'tile works');
await cp(path.join(root, 'media', 'demo'), demo, { recursive: true });
try {
  await ensureBuilt();
  await (values.desktop ? openDesktop() : openBrowserEditor());
} catch (error) {
  console.error(error.message);
  process.exit(1);
}

async function openBrowserEditor() {
  const server = await startServer();
  const door = await openDoor(
    workbenchAddress(server, { folder: demo, extension: root, file: path.join(demo, file) }),
  );
  const address = `http://127.0.0.1:${door.address().port}/`;
  if (values.check) await mustAnswer(address);
  console.log(`
Open in a browser:

  ${address}

${whatToDo}
Ctrl-C ends the editor and deletes the copy of the demo.`);
  if (!values.check) return showInBrowser(address);
  door.close();
  await server.stop();
}

/** The workbench's own address is several lines long; this one leads there. */
function openDoor(location) {
  const door = createServer((_, response) => response.writeHead(302, { location }).end());
  return new Promise(resolve => door.listen(0, '127.0.0.1', () => resolve(door)));
}

/** Opens the address where a person sits before a screen; elsewhere it stands printed. */
function showInBrowser(address) {
  const opener = process.platform === 'darwin' ? 'open' : 'xdg-open';
  if (process.platform !== 'darwin' && !process.env.DISPLAY && !process.env.WAYLAND_DISPLAY) return;
  spawn(opener, [address], { stdio: 'ignore' }).once('error', () => undefined);
}

function openDesktop() {
  const profile = path.join(folder, 'profile');
  const args = [
    '--wait',
    '--new-window',
    `--user-data-dir=${profile}`,
    '--disable-extensions',
    '--skip-welcome',
  ];
  args.push(`--extensionDevelopmentPath=${root}`, demo, path.join(demo, file));
  console.log(`${whatToDo}\nClosing the window deletes the copy of the demo.`);
  const program = process.env.WEIGHBEAM_CODE ?? 'code';
  return new Promise((resolve, reject) => {
    spawn(program, args, { stdio: 'inherit' })
      .once('error', () =>
        reject(new Error(`No editor starts as ${program}; set WEIGHBEAM_CODE to its path.`)),
      )
      .once('exit', resolve);
  });
}

async function mustAnswer(address) {
  const response = await fetch(address);
  const page = await response.text();
  if (!response.ok || !page.includes('workbench'))
    throw new Error(`The editor answered ${response.status} at ${address}`);
}
