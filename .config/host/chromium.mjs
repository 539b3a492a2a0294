// Finds a Chromium, or installs Debian's.
import { existsSync } from 'node:fs';
import path from 'node:path';
import { chromium } from 'playwright-core';
import { command } from '../command.mjs';

const names = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable', 'microsoft-edge'];
const folders = [
  ...(process.env.PATH ?? '').split(path.delimiter),
  '/usr/bin',
  '/usr/local/bin',
  '/snap/bin',
];
const macApps = ['Chromium', 'Google Chrome', 'Microsoft Edge'];
const places = [
  ...names.flatMap(name => folders.map(folder => path.join(folder, name))),
  ...macApps.map(app => `/Applications/${app}.app/Contents/MacOS/${app}`),
];

/** Path of the browser the tests drive: the one CHROMIUM names, else one that is installed, else Debian's, installed now. */
export async function findChromium() {
  const named = process.env.CHROMIUM;
  if (named) {
    if (existsSync(named)) return named;
    throw new Error(`CHROMIUM names ${named}, and there is no such file.`);
  }
  const found = places.find(place => existsSync(place)) ?? (await installDebianChromium());
  if (found) return found;
  throw new Error('No Chromium was found. Install chromium or Google Chrome, or set CHROMIUM to its path.');
}

async function installDebianChromium() {
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) return undefined;
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const packages = ['chromium', 'fonts-liberation'];
  await command('apt-get', ['update'], { env });
  const done = await command('apt-get', ['install', '-y', '--no-install-recommends', ...packages], { env });
  if (done.code !== 0) throw new Error(`Chromium could not be installed.\n${done.output}`);
  return '/usr/bin/chromium';
}

/** A browser whose pages of `origin` may use the clipboard. */
export async function openBrowser(origin, { viewport = { width: 1280, height: 800 } } = {}) {
  const args = ['--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking'];
  args.push('--disable-component-update', '--disable-sync');
  if (process.getuid?.() === 0) args.push('--no-sandbox'); // Chromium refuses a sandbox to root
  const browser = await chromium.launch({ executablePath: await findChromium(), args });
  const context = await browser.newContext({ viewport, locale: 'en-US' });
  await context.grantPermissions(['clipboard-read', 'clipboard-write'], { origin });
  return { browser, context };
}
