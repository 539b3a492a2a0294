import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { format } from 'prettier';
import { describe, expect, it } from 'vitest';
import { methodsTable } from '../../src/cli/methods';
import { demo, mainCase, weighbeam } from './terminal';

const readme = await readFile(path.resolve(import.meta.dirname, '../../README.md'), 'utf8');
const between = (mark: string) =>
  readme.split(`<!-- ${mark} -->`)[1]?.split(`<!-- end of ${mark} -->`)[0]?.trim();

describe('the README', () => {
  it('lists the methods of the registry (print them anew: node dist/cli.js methods --format markdown)', async () => {
    expect(between('methods')).toBe((await format(methodsTable(), { parser: 'markdown' })).trim());
  });

  it('shows the main case of the demo as the terminal prints it', async () => {
    const { out } = await weighbeam(demo, 'compare', ...mainCase);
    const typed = mainCase.map(word => (/[ >:]/.test(word) ? `"${word}"` : word)).join(' ');
    const shown = between('main case')?.replace(
      /^```\n\$ ([\s\S]*?)\n\n/,
      (_, command: string) => `$ ${command.replace(/ \\\n\s+/g, ' ')}\n\n`,
    );
    expect(shown).toBe(`$ weighbeam compare ${typed}\n\n${out.trimEnd()}\n\`\`\``);
  });
});
