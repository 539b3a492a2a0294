// Builds every bundle of the project into dist/.   node esbuild.mjs [--watch]
import { build, context } from 'esbuild';
import { chmod, mkdir, readdir, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { notices } from './.config/notices.mjs';

const watch = process.argv.includes('--watch');

/** Source names the desktop half of each platform twin ('./platform/x.node'); the browser bundles take './platform/x.web'. */
const webTwins = {
  name: 'web-twins',
  setup(builder) {
    builder.onResolve({ filter: /^\..*\.node$/ }, ({ path: name, ...from }) =>
      builder.resolve(name.replace(/\.node$/, '.web'), from),
    );
  },
};

const node = { platform: 'node', format: 'cjs', target: 'node20' };
const page = { platform: 'browser', format: 'iife', target: 'es2022' };
const browserHost = { platform: 'browser', format: 'cjs', target: 'es2022', plugins: [webTwins] };

const bundles = [
  { out: 'extension.js', entry: 'src/host/extension.ts', ...node, external: ['vscode'] },
  { out: 'compute.js', entry: 'src/host/platform/compute.node.ts', ...node },
  { out: 'browser/extension.js', entry: 'src/host/extension.ts', ...browserHost, external: ['vscode'] },
  { out: 'browser/compute.js', entry: 'src/host/platform/compute.web.ts', ...page, plugins: [webTwins] },
  { out: 'webview.js', entry: 'src/webview/main.tsx', ...page },
  { out: 'cli.js', entry: 'src/cli/main.ts', ...node, banner: { js: '#!/usr/bin/env node' } },
  { out: 'accuracy.js', entry: 'src/cli/accuracy.ts', ...node },
];

const optionsOf = ({ out, entry, ...rest }) => ({
  ...rest,
  entryPoints: [entry],
  outfile: `dist/${out}`,
  bundle: true,
  metafile: true,
  minify: !watch,
  sourcemap: watch,
  legalComments: 'none', // the licences of what is bundled stand in dist/NOTICES.txt
  jsx: 'automatic',
  jsxImportSource: 'preact',
  logLevel: 'warning',
});

/** Removes what an earlier build left in dist and this one did not write. */
async function sweep(written) {
  for (const entry of await readdir('dist', { recursive: true, withFileTypes: true })) {
    const file = path.join(entry.parentPath, entry.name);
    if (entry.isFile() && !written.includes(file)) await rm(file);
  }
}

async function buildOne(bundle) {
  const { metafile } = await build(optionsOf(bundle));
  const meta = `dist/meta/${bundle.out.replace('/', '-')}on`;
  await writeFile(meta, JSON.stringify(metafile));
  return { metafile, files: [meta, `dist/${bundle.out}`] };
}

async function buildAll() {
  await mkdir('dist/meta', { recursive: true });
  const results = await Promise.allSettled(bundles.map(buildOne));
  if (results.some(({ status }) => status === 'rejected')) process.exit(1); // esbuild has said why
  const built = results.map(({ value }) => value);
  await chmod('dist/cli.js', 0o755);
  await writeFile('dist/NOTICES.txt', await notices(built.map(({ metafile }) => metafile)));
  await sweep(['dist/NOTICES.txt', ...built.flatMap(({ files }) => files)]);
}

async function watchAll() {
  for (const bundle of bundles) await (await context({ ...optionsOf(bundle), logLevel: 'info' })).watch();
}

await (watch ? watchAll() : buildAll());
