// Gets the editor that tests and `npm start` run in: the VS Code server with its web workbench that an npm package carries.
import { existsSync } from 'node:fs';
import { chmod, copyFile, mkdir, mkdtemp, readFile, rename, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { command } from '../command.mjs';

/**
 * The oldest VS Code that the extension supports, which is also the last whose server runs on Node.js 20, and the newest
 * that it is tried on.
 */
const LINES = {
  '1.100': { version: '4.100.3', node: 20 },
  1.139: { version: '4.139.1', node: 24 },
};
const line = process.env.WEIGHBEAM_EDITOR ?? '1.100';
if (!(line in LINES))
  throw new Error(`WEIGHBEAM_EDITOR is ${line}; there are ${Object.keys(LINES).join(', ')}.`);
const CARRIER = { name: 'code-server', ...LINES[line] };
/** Searches inside the editor need this binary; its package for one platform brings it without a download. */
const RIPGREP = '1.18.0';

const platform = `${process.platform}-${process.arch}`;
const ownNode = Number(process.versions.node.split('.')[0]) === CARRIER.node;
const manifest = JSON.stringify({
  private: true,
  dependencies: {
    [CARRIER.name]: CARRIER.version,
    [`@vscode/ripgrep-${platform}`]: RIPGREP,
    ...(ownNode ? {} : { [`node-${platform}`]: String(CARRIER.node) }),
  },
});

/** Where the server is kept between runs, outside the repository. It can be deleted at any time. */
const cache = path.resolve(process.env.WEIGHBEAM_HOST_CACHE ?? path.join(tmpdir(), 'weighbeam-host'));
const home = path.join(cache, `${CARRIER.version}-${platform}`);
const stamp = folder => path.join(folder, 'installed.json');
const serverOf = folder => path.join(folder, 'node_modules', CARRIER.name, 'lib', 'vscode');

/**
 * Installs the server unless it is there; gives the program that runs it and its main file.
 * It is made in a folder of its own and moved into place whole, so a broken or a simultaneous install leaves no half.
 */
export async function editorServer() {
  if (!(await isInstalled())) {
    console.log(`Installing the editor for tests and demo into ${cache} (once, about half a minute) …`);
    await mkdir(cache, { recursive: true });
    const draft = await mkdtemp(path.join(cache, 'installing-'));
    try {
      await install(draft);
      if (!(await isInstalled())) {
        await rm(home, { recursive: true, force: true });
        await rename(draft, home);
      }
    } finally {
      await rm(draft, { recursive: true, force: true });
    }
  }
  const node = ownNode
    ? process.execPath
    : path.join(home, 'node_modules', `node-${platform}`, 'bin', 'node');
  return { node, main: path.join(serverOf(home), 'out', 'server-main.js') };
}

async function isInstalled() {
  return existsSync(stamp(home)) && (await readFile(stamp(home), 'utf8')) === manifest;
}

async function install(folder) {
  await writeFile(path.join(folder, 'package.json'), manifest);
  const server = serverOf(folder);
  const modules = path.join(server, 'node_modules');
  // No install scripts: they would compile or download native parts that neither tests nor demo need.
  await npmInstall(folder);
  await npmInstall(server, '--omit=dev');
  const alias = path.join(server, 'node_modules.asar');
  if (!existsSync(alias)) await symlink('node_modules', alias, 'dir');

  // Later lines search with a package that brings its own binary.
  const search = path.join(modules, '@vscode', 'ripgrep');
  const binary = path.join(search, 'bin', 'rg');
  if (existsSync(search) && !existsSync(binary)) {
    await mkdir(path.dirname(binary), { recursive: true });
    await copyFile(path.join(folder, 'node_modules', '@vscode', `ripgrep-${platform}`, 'bin', 'rg'), binary);
    await chmod(binary, 0o755);
  }
  await writeFile(stamp(folder), manifest);
}

async function npmInstall(folder, ...options) {
  const args = ['install', '--ignore-scripts', '--no-audit', '--no-fund', '--engine-strict=false'];
  const done = await command('npm', [...args, '--loglevel=error', '--prefix', folder, ...options], {
    cwd: folder,
  });
  if (done.code !== 0) throw new Error(`The editor for the tests could not be installed.\n${done.output}`);
}
