import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import { builtinModules } from 'node:module';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createVSIX, listFiles } from '@vscode/vsce';
import { describe, expect, it } from 'vitest';
import { root } from './root';

interface Metafile {
  readonly outputs: Readonly<
    Record<string, { readonly bytes: number; readonly imports: readonly { readonly path: string }[] }>
  >;
}

const dist = path.join(root, 'dist');
const bundles = [
  'accuracy.js',
  'browser/compute.js',
  'browser/extension.js',
  'cli.js',
  'compute.js',
  'extension.js',
  'webview.js',
];
const metaOf = (bundle: string) => `meta/${bundle.replace('/', '-')}on`;

const outputOf = (bundle: string) => {
  const { outputs } = JSON.parse(readFileSync(path.join(dist, metaOf(bundle)), 'utf8')) as Metafile;
  const output = outputs[`dist/${bundle}`];
  if (output === undefined) throw new Error(`${bundle} was not built`);
  return output;
};
const kilobytes = (...names: readonly string[]) =>
  names.reduce((sum, name) => sum + outputOf(name).bytes, 0) / 1000;

describe('dist', () => {
  it('holds the files named here and no other', () => {
    const files = readdirSync(dist, { recursive: true, withFileTypes: true })
      .filter(entry => entry.isFile())
      .map(entry => path.relative(dist, path.join(entry.parentPath, entry.name)));
    expect(files.sort()).toEqual(['NOTICES.txt', ...bundles, ...bundles.map(metaOf)].sort());
  });

  it.each(bundles)('%s stands alone: it loads the editor, node and nothing else', bundle => {
    const outside = outputOf(bundle).imports.map(({ path: name }) => name.replace(/^node:/, ''));
    expect(outside.filter(name => name !== 'vscode' && !builtinModules.includes(name))).toEqual([]);
  });

  it('has a command line that can be run as a program', () => {
    const file = path.join(dist, 'cli.js');
    expect(readFileSync(file, 'utf8')).toMatch(/^#!\/usr\/bin\/env node\n/);
    expect(statSync(file).mode & 0o111).toBe(0o111);
  });

  it('names the licence of every package it contains', () => {
    const text = readFileSync(path.join(dist, 'NOTICES.txt'), 'utf8');
    for (const name of ['papaparse', 'valibot', 'smol-toml', 'preact', 'd3-scale'])
      expect(text).toContain(`\n${name} `);
  });
});

describe('sizes', () => {
  it('keep what is loaded at activation under 150 kB', () => {
    expect(kilobytes('extension.js')).toBeLessThan(150);
    expect(kilobytes('browser/extension.js')).toBeLessThan(150);
  });

  it('keep extension and worker together under 450 kB', () => {
    expect(kilobytes('extension.js', 'compute.js')).toBeLessThan(450);
    expect(kilobytes('browser/extension.js', 'browser/compute.js')).toBeLessThan(450);
  });

  it('keep the script of the panel under 100 kB', () => {
    expect(kilobytes('webview.js')).toBeLessThan(100);
  });
});

describe('the packaged extension', () => {
  it('contains what runs and what is read, and nothing of the workshop', async () => {
    const files = await listFiles({ cwd: root });
    for (const file of [
      'dist/extension.js',
      'dist/browser/extension.js',
      'dist/compute.js',
      'dist/webview.js',
    ]) {
      expect(files).toContain(file);
    }
    for (const file of ['dist/NOTICES.txt', 'media/panel.css', 'media/icon.png', 'LICENSE', 'README.md']) {
      expect(files).toContain(file);
    }
    expect(files.filter(file => /^(src|test|\.config|\.ci|node_modules|dist\/meta)\//.test(file))).toEqual(
      [],
    );
  });

  it('is under 600 kB', async () => {
    const folder = mkdtempSync(path.join(tmpdir(), 'weighbeam-package-'));
    try {
      const packagePath = path.join(folder, 'weighbeam.vsix');
      await createVSIX({
        cwd: root,
        packagePath,
        dependencies: false,
        allowMissingRepository: true,
        rewriteRelativeLinks: false,
      });
      expect(statSync(packagePath).size / 1000).toBeLessThan(600);
    } finally {
      rmSync(folder, { recursive: true });
    }
  }, 60_000);
});
