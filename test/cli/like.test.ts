import { describe, expect, it } from 'vitest';
import { folderWith, weighbeam } from './terminal';

const rows = ['new,12.1', 'new,12.4', 'new,11.9', 'new,12.6', 'old,11.2', 'old,11.6', 'old,11.1', 'old,11.5'];
const csv = (lines: readonly string[] = rows): string => ['kiln,hardness', ...lines, ''].join('\n');
const asked = ['--of', 'hardness', '--by', 'kiln', '--per', 'none', '--test', 'new', '--reference', 'old'];

interface Answer {
  readonly settings: {
    readonly leftOut: readonly { readonly line: number; readonly reason: string }[];
    readonly rows: unknown;
    readonly reading: { readonly decimal: string; readonly delimiter: string };
  };
  readonly groups: readonly { readonly n: number; readonly mean: number }[];
}

/** A folder with data.csv and, in note.md, the block of its comparison. */
async function recorded(text: string, ...argv: readonly string[]) {
  const temp = await folderWith({ 'data.csv': text });
  const words = ['compare', 'data.csv', ...asked, ...argv];
  const { code, out, err } = await weighbeam(temp.folder, ...words, '--format', 'block');
  expect([code, err]).toEqual([0, '']);
  await temp.write('note.md', out);
  return temp;
}

async function like(folder: string, file: string, ...argv: readonly string[]): Promise<Answer> {
  const words = ['compare', file, '--like', 'note.md', ...argv, '--format', 'json'];
  const { out, err } = await weighbeam(folder, ...words);
  expect(err).toBe('');
  return JSON.parse(out) as Answer;
}

const means = ({ groups }: Answer) => groups.map(({ n, mean }) => [n, mean]);

describe('a recipe on the same file', () => {
  const crack = ['--leave-out', '4:cracked'];

  it('leaves out the row it means, not its old line, when rows were sorted anew', async () => {
    await using temp = await recorded(csv(), ...crack);
    const before = await like(temp.folder, 'data.csv');
    await temp.write('data.csv', csv([...rows].sort()));
    const after = await like(temp.folder, 'data.csv');
    expect(after.settings.leftOut).toMatchObject([{ line: 2, reason: 'cracked' }]);
    expect(means(after)).toEqual(means(before));
  });

  it('finds header, left-out row and a fixed range of lines again under new lines', async () => {
    await using temp = await recorded(csv(), ...crack, '--rows', '2-8');
    const before = await like(temp.folder, 'data.csv');
    await temp.write('data.csv', `bench 2\nread twice\n${csv()}`);
    const after = await like(temp.folder, 'data.csv');
    expect(after.settings).toMatchObject({ rows: [[4, 10]], leftOut: [{ line: 6 }] });
    expect(means(after)).toEqual(means(before));
  });

  it('is refused when the row is gone', async () => {
    await using temp = await recorded(csv(), ...crack);
    await temp.write('data.csv', csv(rows.filter(row => row !== 'new,11.9')));
    const { code, out, err } = await weighbeam(temp.folder, 'compare', 'data.csv', '--like', 'note.md');
    expect([code, out]).toEqual([3, '']);
    expect(err).toMatch(/^left-out-row-gone: .*line 4 \(11\.9\).*\(data\.csv\)/);
  });

  it('yields to rows left out on the command line, which are lines of the file as it is now', async () => {
    await using temp = await recorded(csv(), ...crack);
    await temp.write('data.csv', `bench 2\n${csv(rows.filter(row => row !== 'new,11.9'))}`);
    const { settings } = await like(temp.folder, 'data.csv', '--leave-out', '3:dropped');
    expect(settings.leftOut).toMatchObject([{ line: 3, reason: 'dropped' }]);
  });

  it('keeps the left-out row of a copy under another name', async () => {
    await using temp = await recorded(csv(), ...crack);
    await temp.write('copy.csv', csv());
    expect((await like(temp.folder, 'copy.csv')).settings.leftOut).toMatchObject([{ line: 4 }]);
  });

  it('reads it again as it was said to be read', async () => {
    const text = csv()
      .replaceAll(/\d+\.\d/g, value => `${value.replace('.', ';')}00`)
      .replaceAll(',', '|');
    const weights = text.replaceAll(';', ',');
    await using temp = await recorded(weights, '--decimal', 'comma');
    const { code, err } = await weighbeam(temp.folder, 'compare', 'data.csv', ...asked);
    expect([code, err]).toEqual([3, expect.stringMatching(/^decimal-undecidable: /)]);
    const { settings, groups } = await like(temp.folder, 'data.csv');
    expect([settings.reading.decimal, groups[0]?.mean]).toEqual([',', 12.25]);
  });

  it('keeps no thousands mark of the recipe beside a decimal mark that is said anew', async () => {
    const text = csv()
      .replaceAll(',', ';')
      .replaceAll('.', ',')
      .replaceAll(/(\d+,\d)/g, '1.0$1');
    await using temp = await recorded(text);
    const { code, err } = await weighbeam(
      temp.folder,
      ...['compare', 'data.csv', '--like', 'note.md', '--decimal', 'point'],
    );
    expect([code, err]).toEqual([3, expect.stringMatching(/^text-in-measured: .*1\.012,1/)]);
  });

  it('is refused when files that hold left-out rows are named in another order', async () => {
    await using temp = await folderWith({ 'may.csv': 'x\n1\n2\n9\n', 'june.csv': 'x\n4\n5\n6\n' });
    const words = ['--of', 'x', '--per', 'none', '--leave-out', 'may.csv:4:slipped'];
    const first = await weighbeam(
      temp.folder,
      'compare',
      'may.csv',
      'june.csv',
      ...words,
      '--format',
      'block',
    );
    await temp.write('note.md', first.out);
    const { code, err } = await weighbeam(temp.folder, 'compare', 'june.csv', 'may.csv', '--like', 'note.md');
    expect([code, err]).toEqual([2, expect.stringContaining('may.csv, june.csv')]);
  });
});

describe('a recipe on another file', () => {
  const german = ['kiln;hardness', 'new;-4,2', 'new;-4,3', 'old;-5,1', 'old;-5,5', ''].join('\n');

  it('reads it as that file is written, so that no decimal mark is lost', async () => {
    await using temp = await recorded(german);
    for (const text of [
      german.replaceAll(',', '.').replaceAll(';', ','),
      german.replaceAll(',', '.'),
      german.replaceAll(';', '\t'),
    ]) {
      await temp.write('other.csv', text);
      expect(means(await like(temp.folder, 'other.csv'))).toEqual([
        [2, -4.25],
        [2, -5.3],
      ]);
    }
  });

  it('is refused where the recipe takes lines of its own file, until lines are said anew', async () => {
    await using temp = await recorded(csv(), '--rows', '2-8');
    await temp.write('next.csv', csv([...rows, 'old,11.9']));
    const words = ['compare', 'next.csv', '--like', 'note.md'];
    expect((await weighbeam(temp.folder, ...words)).err).toMatch(/lines 2-8 of data\.csv.*--rows/);
    expect((await weighbeam(temp.folder, ...words, '--rows', '2-9')).code).toBe(0);
  });

  it('does so also where thousands were marked, and where the file of that name was exported anew', async () => {
    const thousands = german.replaceAll(/-(\d),(\d)/g, '1.23$1,$2');
    await using temp = await recorded(thousands);
    const english = german.replaceAll(/-(\d),(\d)/g, '-$1.$200');
    for (const name of ['other.csv', 'data.csv']) {
      await temp.write(name, english);
      expect(means(await like(temp.folder, name))).toEqual([
        [2, -4.25],
        [2, -5.3],
      ]);
    }
  });

  it('keeps what its words mean: words for missing values, what lies below a limit', async () => {
    const text = csv(['new,lost', 'new,<0.2', ...rows]);
    await using temp = await recorded(text, '--missing', 'lost', '--below', 'half');
    await temp.write('other.csv', text.replaceAll(',', ';'));
    expect((await like(temp.folder, 'other.csv')).groups[0]?.n).toBe(5);
  });

  it('leaves out the rows that the command line says', async () => {
    await using temp = await recorded(csv(), '--leave-out', '4:cracked');
    await temp.write('other.csv', csv([...rows, 'old,11.3']));
    const { settings } = await like(temp.folder, 'other.csv', '--leave-out', '5:dropped');
    expect(settings.leftOut).toMatchObject([{ line: 5, reason: 'dropped' }]);
  });

  it('takes no row for a header where the recipe says that there is none', async () => {
    const bare = ['--header', '0', '--of', '#2', '--by', '#1', '--per', 'none'];
    await using temp = await folderWith({ 'data.csv': rows.join('\n'), 'other.csv': rows.join('\n\n') });
    const first = await weighbeam(temp.folder, 'compare', 'data.csv', ...bare, '--format', 'block');
    await temp.write('note.md', first.out);
    expect(means(await like(temp.folder, 'other.csv'))).toEqual([
      [4, 12.25],
      [4, 11.35],
    ]);
  });

  it('yields to flags that say how to read it', async () => {
    await using temp = await recorded(csv());
    await temp.write(
      'other.csv',
      csv()
        .replaceAll('.', ',')
        .replaceAll(/(new|old|kiln),/g, '$1;'),
    );
    const { settings } = await like(temp.folder, 'other.csv', '--delimiter', ';', '--decimal', 'comma');
    expect(settings.reading).toMatchObject({ delimiter: ';', decimal: ',' });
  });
});
