import { describe, expect, it } from 'vitest';
import type { Outcome } from '../../src/recheck/outcome';
import { recheckText } from '../../src/recheck/recheckText';
import { outcomeSentence } from '../../src/report/outcome';
import { fenced } from '../../src/settings/fenced';
import { english } from '../report/fixtures/english';
import { EXPORT, blockOf, platform, provenance, source } from '../settings/recording';

describe('a recheck of a whole notebook', () => {
  it('answers every block in the order of its lines and says which record another one replaces', async () => {
    const first = await blockOf(EXPORT);
    const id = /^id = "(.*)"$/mu.exec(first)?.[1] ?? '';
    const mended = EXPORT.replace('815,0', '815,5');
    const later = await blockOf(mended, undefined, { ...provenance, replaces: id });
    const notebook = `${fenced(first)}\nand after the kiln was mended\n${fenced(later)}\n`;
    const outcomes: Outcome[] = [];
    const open = (name: string) => Promise.resolve(source(name, mended));
    for await (const outcome of recheckText(notebook, open, platform)) outcomes.push(outcome);
    const laterLine = notebook.split('\n').findIndex(line => line.includes('after the kiln')) + 3;
    expect(outcomes.map(({ kind, firstLine }) => [kind, firstLine])).toEqual([
      ['moved', 2],
      ['same', laterLine],
    ]);
    const [replaced, current] = outcomes.map(outcome => outcomeSentence(outcome, english));
    expect(replaced).toMatch(new RegExp(`; replaced by the record on line ${laterLine}$`));
    expect(current).toBe('the data used and the numbers are the same');
  });
});
