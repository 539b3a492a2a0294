// npm run gallery [-- STATE…]: pictures of every state of the panel in four kinds of theme, narrow and wide, in test/pictures.
import { build } from 'esbuild';
import { cp, mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { ensureBuilt } from '../../.config/built.mjs';
import { command, root } from '../../.config/command.mjs';
import { openWorkbench } from '../webview/workbench.mjs';

const themes = {
  light: ['Default Light Modern', 'vscode-light'],
  dark: ['Default Dark Modern', 'vscode-dark'],
  'high contrast': ['Default High Contrast', 'vscode-high-contrast'],
  'high contrast light': ['Default High Contrast Light', 'vscode-high-contrast-light'],
};
const widths = [400, 900];
const pictures = path.join(root, 'test', 'pictures');

/** The page of each state as HTML, made by the components of the panel itself. */
async function pages(folder) {
  const bundled = path.join(folder, 'states.mjs');
  await build({
    entryPoints: [path.join(import.meta.dirname, 'states.tsx')],
    outfile: bundled,
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    jsx: 'automatic',
    jsxImportSource: 'preact',
    banner: {
      js: 'import { createRequire } from "node:module"; const require = createRequire(import.meta.url);',
    },
  });
  const { code, output } = await command(process.execPath, [bundled], { env: { WEIGHBEAM_ROOT: root } });
  if (code !== 0) throw new Error(output);
  return Object.entries(JSON.parse(output));
}

/** What the editor gives a panel's page in each theme: its variables, as they stand on the page's root, and its own style. */
async function dressed({ panel, run, answerAll, openFile, page }, folder) {
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  const settings = path.join(folder, '.vscode', 'settings.json');
  await mkdir(path.dirname(settings));
  const found = {};
  for (const [name, [theme, bodyClass]] of Object.entries(themes)) {
    await writeFile(settings, JSON.stringify({ 'workbench.colorTheme': theme }));
    await panel.locator(`body.${bodyClass}`).waitFor();
    await page.waitForTimeout(500);
    found[name] = {
      root: await panel.locator('html').getAttribute('style'),
      body: await panel.locator('body').getAttribute('class'),
      own: await panel.locator('style#_defaultStyles').textContent(),
    };
  }
  return found;
}

async function draw({ page }, states, dresses) {
  const styles = await Promise.all(
    ['panel.css', 'page.css'].map(file => readFile(path.join(root, 'media', file), 'utf8')),
  );
  await mkdir(pictures, { recursive: true });
  const sheet = await page.context().newPage();
  for (const [theme, { root: variables, body, own }] of Object.entries(dresses)) {
    for (const [state, html] of states) {
      for (const width of widths) {
        await sheet.setViewportSize({ width, height: 600 });
        await sheet.setContent(
          `<!DOCTYPE html><html style="${variables.replaceAll('"', '&quot;')}"><head><style>${own}</style><style>${styles.join('\n')}</style></head>` +
            `<body class="${body}" style="background: var(--vscode-editor-background)"><main id="root">${html}</main></body></html>`,
        );
        await sheet.screenshot({
          path: path.join(pictures, `${state}, ${theme}, ${width}.png`),
          fullPage: true,
        });
      }
    }
  }
}

const only = process.argv.slice(2);
await ensureBuilt();
const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-gallery-'));
const workspace = path.join(folder, 'tile works');
let workbench;
try {
  await cp(path.join(root, 'media', 'demo'), workspace, { recursive: true });
  const states = (await pages(folder)).filter(([name]) => only.length === 0 || only.includes(name));
  workbench = await openWorkbench(workspace);
  await draw(workbench, states, await dressed(workbench, workspace));
  console.log(`${states.length * widths.length * Object.keys(themes).length} pictures in test/pictures`);
} finally {
  await workbench?.close();
  await rm(folder, { recursive: true, force: true, maxRetries: 5 });
}
