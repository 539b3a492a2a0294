import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from './root';

interface Manifest {
  readonly version: string;
  readonly icon: string;
  readonly main: string;
  readonly browser: string;
  readonly bin: Readonly<Record<string, string>>;
  readonly engines: { readonly vscode: string };
  readonly keywords: readonly string[];
  readonly activationEvents: readonly string[];
  readonly devDependencies: Readonly<Record<string, string>>;
  readonly contributes: {
    readonly commands: readonly {
      readonly command: string;
      readonly title: string;
      readonly category: string;
    }[];
    readonly menus: Readonly<Record<string, readonly { readonly command: string; readonly when: string }[]>>;
    readonly walkthroughs: readonly {
      readonly steps: readonly {
        readonly id: string;
        readonly description: string;
        readonly media: { readonly svg: string; readonly altText: string };
        readonly completionEvents: readonly string[];
      }[];
    }[];
    readonly configuration: { readonly properties: Readonly<Record<string, Setting>> };
  };
}

interface Setting {
  readonly default: unknown;
  readonly scope: string;
  readonly order: number;
  readonly description?: string;
  readonly markdownDescription?: string;
}

const read = (file: string) => readFileSync(path.join(root, file), 'utf8');
const text = read('package.json');
const manifest = JSON.parse(text) as Manifest;
const words = JSON.parse(read('package.nls.json')) as Readonly<Record<string, string>>;
const { commands, menus, configuration } = manifest.contributes;
const settings = Object.entries(configuration.properties);

describe('the manifest', () => {
  it('has a plain version, as marketplaces demand', () => {
    expect(manifest.version).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it('has a square icon of at least 128 pixels', () => {
    const png = readFileSync(path.join(root, manifest.icon));
    expect(png.subarray(1, 4).toString('latin1')).toBe('PNG');
    const [width, height] = [png.readUInt32BE(16), png.readUInt32BE(20)];
    expect(width).toBeGreaterThanOrEqual(128);
    expect(height).toBe(width);
  });

  it('has at most five keywords', () => {
    expect(manifest.keywords.length).toBeLessThanOrEqual(5);
  });

  it('names programs that the build makes', () => {
    const programs = [manifest.main, manifest.browser, ...Object.values(manifest.bin)];
    for (const program of programs) expect(existsSync(path.join(root, program)), program).toBe(true);
  });

  it('never wakes the extension at start-up or by searching a folder', () => {
    expect(
      manifest.activationEvents.filter(event => /^(\*|onStartupFinished|workspaceContains)/.test(event)),
    ).toEqual([]);
  });

  it('asks for no newer editor than its type definitions describe', () => {
    const line = (range: string | undefined) => /\d+\.\d+/.exec(range ?? '')?.[0];
    expect(line(manifest.devDependencies['@types/vscode'])).toBe(line(manifest.engines.vscode));
  });

  it('uses every string of package.nls.json, and no other', () => {
    const used = [...text.matchAll(/"%([^%"]+)%"/g)].map(match => match[1]);
    expect([...new Set(used)].sort()).toEqual(Object.keys(words).sort());
  });
});

describe('commands', () => {
  it.each(commands)(
    '$command has a title and stands under the name of the extension',
    ({ title, category }) => {
      expect(words[title.slice(1, -1)]).toMatch(/^[A-Z][^.]+$/);
      expect(category).toBe('Weighbeam');
    },
  );

  it('are the only ones in menus', () => {
    const known = commands.map(({ command }) => command);
    const placed = Object.values(menus).flatMap(entries => entries.map(({ command }) => command));
    expect(placed.filter(command => !known.includes(command))).toEqual([]);
  });

  it('stand in menus of files only where the file is a table of text', () => {
    for (const menu of ['editor/context', 'editor/title', 'explorer/context']) {
      for (const { when } of menus[menu] ?? [])
        expect(when).toContain('resourceExtname =~ /^\\.(csv|tsv|tab|txt)$/i');
    }
  });
});

describe('the walkthrough', () => {
  const steps = manifest.contributes.walkthroughs.flatMap(walkthrough => walkthrough.steps);

  it.each(steps)('step $id shows a picture that is there and says what it shows', ({ media }) => {
    expect(existsSync(path.join(root, media.svg))).toBe(true);
    expect(words[media.altText.slice(1, -1)]).toBeTruthy();
  });

  it.each(steps)(
    'step $id offers and waits for commands that there are',
    ({ description, completionEvents }) => {
      const known = commands.map(({ command }) => command);
      const offered = [...(words[description.slice(1, -1)] ?? '').matchAll(/\(command:([^)]+)\)/g)].map(
        match => match[1] ?? '',
      );
      const awaited = completionEvents.flatMap(event => /^onCommand:(.+)$/.exec(event)?.[1] ?? []);
      expect([...offered, ...awaited].filter(command => !known.includes(command))).toEqual([]);
      expect(completionEvents.length).toBeGreaterThan(0);
    },
  );
});

describe('settings', () => {
  const program = read('dist/extension.js');

  it.each(settings)('%s has a default, a scope, a place and a description', (_, setting) => {
    expect(setting.default).toBeDefined();
    expect(['resource', 'window']).toContain(setting.scope);
    expect(setting.order).toBeGreaterThan(0);
    expect(setting.markdownDescription ?? setting.description).toMatch(/^%.+%$/);
  });

  it.each(settings)('%s is in effect', name => {
    const key = name.replace('weighbeam.', '');
    const read = new RegExp(`["'\`](weighbeam\\.)?${key}["'\`]`).test(program);
    expect(read || text.includes(`config.${name}`)).toBe(true);
  });
});

describe('files beside it', () => {
  it.each(['README.md', 'CHANGELOG.md'])('%s shows no SVG and loads nothing over plain http', file => {
    const shown = [...read(file).matchAll(/!\[[^\]]*\]\(([^)]+)\)|<img[^>]+src="([^"]+)"/g)];
    const sources = shown.map(match => match[1] ?? match[2] ?? '');
    expect(sources.filter(source => /\.svg($|[?#])|^http:/i.test(source))).toEqual([]);
    expect(sources.filter(source => !/^https:/.test(source) && !existsSync(path.join(root, source)))).toEqual(
      [],
    );
  });

  it('the lock file holds no address of a registry', () => {
    expect(read('package-lock.json')).not.toMatch(/"resolved"|https?:\/\/[^"]*(registry|\.tgz)/);
  });
});
