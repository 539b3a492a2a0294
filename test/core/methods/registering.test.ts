import { describe, expect, it, vi } from 'vitest';
import type { MethodDescriptor } from '../../../src/core/model/methods';

// One more line in the list of methods and nothing else: this is all that adding a method may take.
vi.mock('../../../src/core/methods/index', async importOriginal => {
  const original = await importOriginal<{ methods: readonly MethodDescriptor[] }>();
  const { medianGap } = await import('./medianGap');
  const methods = [...original.methods, medianGap];
  const methodById = (
    id: string,
    list: readonly MethodDescriptor[] = methods,
  ): MethodDescriptor | undefined => list.find(method => method.id === id);
  return { ...original, methods, methodById };
});

const { weighbeam, folderWith } = await import('../../cli/terminal');
const { methodsAsked } = await import('../../../src/worker/asking/methodsAsked');
const { findBlocks } = await import('../../../src/settings/findBlocks');
const { parseBlock } = await import('../../../src/settings/parseBlock');

const CSV = 'g,x\na,1\na,2\na,7\nb,3\nb,4\nb,5\n';
interface Printed {
  readonly whatIf: { readonly rows: readonly { readonly id: string }[] };
  readonly chosen: { readonly id: string };
}

const asked = ['compare', 'a.csv', '--of', 'x', '--by', 'g'];

describe('a method that is added to the list', () => {
  it('is found in the help, the list of methods and what explains one', async () => {
    await using folder = await folderWith({ 'a.csv': CSV });
    expect((await weighbeam(folder.folder, 'methods')).out).toContain('median-gap');
    expect((await weighbeam(folder.folder, 'explain', 'median-gap')).out).toContain(
      'the gap between two medians',
    );
    expect((await weighbeam(folder.folder, 'compare', '--help')).out).toContain('--gap-scale');
  });

  it('is found in the pickers', () => {
    expect(methodsAsked({ measure: 'mean' }).map(({ id }) => id)).toContain('median-gap');
  });

  it('has a row in the JSON, and answers when it is chosen', async () => {
    await using folder = await folderWith({ 'a.csv': CSV });
    const beside = JSON.parse((await weighbeam(folder.folder, ...asked, '--format', 'json')).out) as Printed;
    const row = beside.whatIf.rows.find(({ id }) => id === 'median-gap');
    expect(row).toMatchObject({ applies: true, counted: false, estimate: -2, p: null });
    const chosen = await weighbeam(
      folder.folder,
      ...asked,
      ...['--method', 'median-gap', '--gap-scale', '10', '--format', 'json'],
    );
    expect((JSON.parse(chosen.out) as Printed).chosen).toMatchObject({ id: 'median-gap', estimate: -20 });
  });

  it('is written into a settings block and read back, its own option with it, and rechecks as the same', async () => {
    await using folder = await folderWith({ 'a.csv': CSV });
    const flags = ['--method', 'median-gap', '--gap-scale', '10', '--format', 'block', '--per', 'none'];
    const { out, err, code } = await weighbeam(folder.folder, ...asked, ...flags);
    expect([code, err]).toEqual([0, '']);
    const [found] = findBlocks(out);
    expect(parseBlock(found!.text, found!.firstLine).unknownKeys).toEqual([]);
    await folder.write('note.md', `\`\`\`toml\n${out}\`\`\`\n`);
    expect((await weighbeam(folder.folder, 'recheck', 'note.md')).out).toContain('same');
  });
});
