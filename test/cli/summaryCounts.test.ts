import { expect, it } from 'vitest';
import { folderWith, weighbeam } from './terminal';

// Source: Newcombe 1998, Statistics in Medicine 17:873–890, table II, contrast (a), 56/70 − 48/80.
const csv = 'process,x,n\nold,56,70\nnew,48,80\n';
const asked = ['counts.csv', '--summary', '--per', 'none'];

it('compares counts given as rows of a file, with the published limits', async () => {
  await using temp = await folderWith({ 'counts.csv': csv });
  const { code, out } = await weighbeam(temp.folder, 'compare', ...asked, '--format', 'json');
  const { whatIf } = JSON.parse(out) as { whatIf: { rows: { id: string; lower: number; upper: number }[] } };
  const limits = (id: string) => {
    const row = whatIf.rows.find(at => at.id === id);
    return [row?.lower.toFixed(4), row?.upper.toFixed(4)];
  };
  expect(code).toBe(0);
  expect(limits('miettinen-nurminen')).toEqual(['0.0528', '0.3382']);
  expect(limits('newcombe')).toEqual(['0.0524', '0.3339']);
});

it('keeps a record of them that rechecks, and sees when only n has changed', async () => {
  await using temp = await folderWith({ 'counts.csv': csv });
  const { out } = await weighbeam(temp.folder, 'compare', ...asked, '--format', 'markdown');
  await temp.write('note.md', out);
  expect((await weighbeam(temp.folder, 'recheck', 'note.md')).out).toMatch(/: same: /);
  await temp.write('counts.csv', csv.replace('56,70', '56,71'));
  expect((await weighbeam(temp.folder, 'recheck', 'note.md')).out).toMatch(/: moved: /);
});

it('refuses a count that is no number, and names its place', async () => {
  await using temp = await folderWith({ 'counts.csv': csv.replace('56', 'many') });
  const { code, err } = await weighbeam(temp.folder, 'compare', ...asked);
  expect([code, err]).toEqual([3, expect.stringMatching(/line 2/)]);
});
