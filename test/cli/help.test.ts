import { describe, expect, it } from 'vitest';
import { compareFlags } from '../../src/cli/compareFlags';
import { methods } from '../../src/core/methods/index';
import { version } from '../../package.json';
import { demo, weighbeam } from './terminal';

describe('help', () => {
  it.each(['compare', 'inspect', 'recheck', 'methods', 'explain'])(
    'of %s keeps to 80 columns',
    async command => {
      for (const argv of [
        [command, '--help'],
        [command, '-h'],
        ['help', command],
      ]) {
        const { code, out, err } = await weighbeam(demo, ...argv);
        expect([code, err]).toEqual([0, '']);
        expect(out).toMatch(new RegExp(`^weighbeam ${command}`));
        for (const line of out.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
      }
    },
  );

  it('of compare names every flag', async () => {
    const { out } = await weighbeam(demo, 'compare', '--help');
    for (const { name } of compareFlags) expect(out).toContain(`--${name}`);
  });

  it('without a command lists the commands, and is a usage error', async () => {
    const { code, out } = await weighbeam(demo);
    expect(code).toBe(2);
    for (const command of ['compare', 'inspect', 'recheck', 'methods', 'explain'])
      expect(out).toContain(`weighbeam ${command}`);
    expect((await weighbeam(demo, '--help')).code).toBe(0);
  });

  it('has the version', async () => {
    expect((await weighbeam(demo, '--version')).out).toBe(`${version}\n`);
  });
});

describe('methods', () => {
  it('are all listed, as text and as JSON, in the order of the registry', async () => {
    const { out } = await weighbeam(demo, 'methods');
    for (const { id } of methods) expect(out).toContain(id);
    const listed = JSON.parse((await weighbeam(demo, 'methods', '--format', 'json')).out) as { id: string }[];
    expect(listed.map(({ id }) => id)).toEqual(methods.map(({ id }) => id));
  });

  it.each(methods.map(({ id }) => id))('%s is explained with its source', async id => {
    const { code, out } = await weighbeam(demo, 'explain', id);
    expect(code).toBe(0);
    expect(out).toContain(methods.find(one => one.id === id)?.references[0]);
    for (const line of out.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
  });
});
