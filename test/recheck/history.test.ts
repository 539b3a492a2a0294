import { describe, expect, it } from 'vitest';
import { historyOf } from '../../src/recheck/history';
import { fenced } from '../../src/settings/fenced';
import { EXPORT, blockOf, provenance } from '../settings/recording';

const lineOfNth = (notebook: string, nth: number): number =>
  notebook
    .split('\n')
    .flatMap((line, index) => (line.startsWith('# weighbeam settings block') ? [index + 1] : []))[nth] ?? 0;

const idOf = (block: string): string => /^id = "(.*)"$/mu.exec(block)?.[1] ?? '';

async function chain(): Promise<readonly [string, string, string]> {
  const first = await blockOf(EXPORT);
  const second = await blockOf(EXPORT.replace('815,0', '815,5'), undefined, {
    ...provenance,
    replaces: idOf(first),
  });
  const third = await blockOf(EXPORT.replace('815,0', '816,0'), undefined, {
    ...provenance,
    replaces: idOf(second),
  });
  return [first, second, third];
}

describe('the history of a notebook', () => {
  it('follows each record to those it replaces and those that replace it, wherever they stand', async () => {
    const [first, second, third] = await chain();
    const notebook = `# Kiln\n${fenced(third)}\n${fenced(first)}\n${fenced(second)}`;
    const [a, b, c] = [0, 1, 2].map(nth => lineOfNth(notebook, nth));
    expect(historyOf(notebook)).toEqual([
      { firstLine: a, id: idOf(third), replaces: [c, b], replacedBy: [], elsewhere: null },
      { firstLine: b, id: idOf(first), replaces: [], replacedBy: [c], elsewhere: null },
      { firstLine: c, id: idOf(second), replaces: [b], replacedBy: [a], elsewhere: null },
    ]);
  });

  it('says where the chain leaves the notebook', async () => {
    const [first, second, third] = await chain();
    const [entry] = historyOf(second);
    expect(entry).toMatchObject({ replaces: [], elsewhere: idOf(first) });
    expect(historyOf(third + second)[0]).toMatchObject({ elsewhere: idOf(first) });
  });

  it('ends where an edited record names itself, and passes over what cannot be read', async () => {
    const block = await blockOf(EXPORT);
    const circular = block.replace('replaces = "none"', `replaces = "${idOf(block)}"`);
    const unreadable = block.replace('confidence = 0.95', 'confidence = ');
    const entries = historyOf(unreadable + circular);
    expect(entries.map(({ replaces, elsewhere }) => [replaces, elsewhere])).toEqual([[[], null]]);
  });

  it('knows plans, which have no record yet', async () => {
    const planned = (await blockOf(EXPORT)).replace(/\[result\][^]*?(?=\[by\])/u, '');
    expect(historyOf(planned + planned)).toHaveLength(2);
    expect(historyOf(planned)[0]).toMatchObject({ id: '', replaces: [], replacedBy: [], elsewhere: null });
  });
});
