// Starts the editor server with a throw-away profile on a free port of this machine.
import { spawn } from 'node:child_process';
import { rmSync } from 'node:fs';
import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { editorServer } from './editorServer.mjs';

/** Nothing opens, asks, updates or reports by itself. */
const quietSettings = {
  'workbench.startupEditor': 'none',
  'workbench.tips.enabled': false,
  'workbench.enableExperiments': false,
  'workbench.settings.enableNaturalLanguageSearch': false,
  'workbench.secondarySideBar.defaultVisibility': 'hidden',
  'window.commandCenter': false,
  'chat.disableAIFeatures': true,
  'chat.commandCenter.enabled': false,
  'telemetry.telemetryLevel': 'off',
  'extensions.autoCheckUpdates': false,
  'extensions.autoUpdate': false,
  'extensions.ignoreRecommendations': true,
  'update.mode': 'none',
  'git.enabled': false,
  'keyboard.dispatch': 'code',
  'editor.minimap.enabled': false,
  'files.simpleDialog.enable': true,
};
const trustSettings = trusted => ({
  'security.workspace.trust.enabled': !trusted,
  'security.workspace.trust.startupPrompt': 'never',
});

/**
 * `trusted: false` opens folders in Restricted Mode; `env` is what the extension host sees beside this process's own.
 * `stop` ends the server and everything it started, and deletes the profile.
 */
export async function startServer({ settings = {}, trusted = true, env = {} } = {}) {
  const { node, main } = await editorServer();
  const profile = await mkdtemp(path.join(tmpdir(), 'weighbeam-profile-'));
  const userFolder = path.join(profile, 'data', 'User');
  await mkdir(userFolder, { recursive: true });
  const all = { ...quietSettings, ...trustSettings(trusted), ...settings };
  await writeFile(path.join(userFolder, 'settings.json'), JSON.stringify(all));

  const args = [
    '--host',
    '127.0.0.1',
    '--port',
    '0',
    '--server-data-dir',
    profile,
    '--telemetry-level',
    'off',
  ];
  args.push('--without-connection-token', '--accept-server-license-terms', '--enable-smoke-test-driver');
  if (trusted) args.push('--disable-workspace-trust');
  const child = spawn(node, [main, ...args], {
    env: environment(profile, env),
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: true, // a process group of its own: what the server starts ends with it
  });
  const kill = signal => {
    try {
      process.kill(-child.pid, signal);
    } catch {
      // the whole group has ended already
    }
  };
  // Ctrl-C and a failing caller leave neither processes nor files behind.
  const atExit = () => {
    kill('SIGKILL');
    rmSync(profile, { recursive: true, force: true });
  };
  const signals = ['SIGINT', 'SIGTERM', 'SIGHUP'];
  const onSignal = () => process.exit(130);
  process.once('exit', atExit);
  for (const signal of signals) process.once(signal, onSignal);

  const stop = async () => {
    if (child.exitCode === null && child.signalCode === null) {
      const gone = new Promise(resolve => child.once('exit', resolve));
      kill('SIGTERM');
      const timer = setTimeout(kill, 5_000, 'SIGKILL');
      await gone;
      clearTimeout(timer);
    }
    kill('SIGKILL'); // the file watcher outlives its server
    process.removeListener('exit', atExit);
    for (const signal of signals) process.removeListener(signal, onSignal);
    await rm(profile, { recursive: true, force: true, maxRetries: 5 });
  };
  try {
    const port = await listening(child);
    return { port, origin: `http://127.0.0.1:${port}`, profile, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

function environment(profile, extra) {
  const noMarketplace = JSON.stringify({ serviceUrl: '', itemUrl: '', resourceUrlTemplate: '' });
  // Sockets and temporary files of the server go where the profile goes.
  const own = { EXTENSIONS_GALLERY: noMarketplace, XDG_RUNTIME_DIR: profile, TMPDIR: profile };
  const inherited = Object.entries(process.env).filter(
    ([name]) => !/^(VSCODE_|ELECTRON_|NODE_OPTIONS$)/.test(name),
  );
  return { ...Object.fromEntries(inherited), ...own, ...extra };
}

function listening(child) {
  return new Promise((resolve, reject) => {
    let output = '';
    const fail = what => reject(new Error(`The editor server ${what}.\n${output}`));
    const timer = setTimeout(fail, 60_000, 'was not ready after 60 s');
    const take = chunk => {
      output += chunk;
      const port = /Extension host agent listening on (\d+)/.exec(output)?.[1];
      if (port === undefined) return;
      clearTimeout(timer);
      resolve(Number(port));
    };
    child.stdout.on('data', take);
    child.stderr.on('data', take);
    child.once('error', error => fail(`did not start: ${error.message}`));
    child.once('exit', code => fail(`ended with ${code}`));
  });
}

/** Address of the workbench with a folder open, an extension under development, and its tests or a file to open. */
export function workbenchAddress(server, { folder, extension, tests, file }) {
  const remote = name => `vscode-remote://127.0.0.1:${server.port}${path.resolve(name)}`;
  const payload = [['skipWelcome', 'true']];
  if (extension) payload.push(['extensionDevelopmentPath', remote(extension)]);
  if (tests) payload.push(['extensionTestsPath', remote(tests)]);
  if (file) payload.push(['openFile', remote(file)]);
  return `${server.origin}/?${new URLSearchParams({ folder: path.resolve(folder), payload: JSON.stringify(payload) })}`;
}
