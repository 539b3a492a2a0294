import { describe, expect, it } from 'vitest';
import { answer } from '../../src/compare/answer';
import { blockFrom } from '../../src/settings/block';
import { printBlock } from '../../src/settings/printBlock';
import { separateT } from '../../src/core/methods/separateT';
import { methods } from '../../src/core/methods/index';
import { Refusal } from '../../src/core/model/problem';
import type { Outcome } from '../../src/recheck/outcome';
import { recheckBlock, type Open } from '../../src/recheck/recheckBlock';
import { sameNumber } from '../../src/recheck/resultChanges';
import { fenced } from '../../src/settings/fenced';
import { findBlocks } from '../../src/settings/findBlocks';
import { recordId } from '../../src/settings/digests';
import {
  ASKED,
  EXPORT,
  STAMP,
  TWO_FILES,
  blockOf,
  platform,
  provenance,
  source,
  twoFilesBlock,
} from '../settings/recording';

const notebookOf = (block: string): string => `# Kiln notebook\n\n${fenced(block)}\nafter\n`;

async function recheck(block: string, text: string | null, open?: Open): Promise<Outcome> {
  const [found] = findBlocks(notebookOf(block));
  if (found === undefined) throw new Error('no block was found');
  const disk: Open = name => Promise.resolve(text === null ? null : source(name, text));
  return recheckBlock(found, open ?? disk, platform);
}

const codes = ({ notes }: Outcome): readonly string[] => notes.map(({ code }) => code);

/** The block with an id that fits its text again, as someone who edits it with care could make. */
function resealed(block: string): string {
  return block.replace(/^id = ".*"$/mu, `id = "${recordId(block, platform.createHasher)}"`);
}

/** The block without what only a computation gives: a plan. */
const planOf = (block: string): string =>
  block.replace(/\[result\][^]*?(?=\[by\])/u, '').replace(/^cells = .*\n/gmu, '');

describe('a recheck', () => {
  it('says same for an unchanged file', async () => {
    const outcome = await recheck(await blockOf(EXPORT), EXPORT);
    expect([outcome.kind, outcome.changes, outcome.notes, outcome.firstLine]).toEqual(['same', [], [], 4]);
  });

  it('says same, with a note, when a column that is not used was edited', async () => {
    const outcome = await recheck(await blockOf(EXPORT), EXPORT.replace('lost', 'dropped'));
    expect([outcome.kind, codes(outcome)]).toEqual(['same', ['file-changed']]);
  });

  it('says same, with a note, when a line was put in above', async () => {
    const outcome = await recheck(await blockOf(EXPORT), `Kiln 2;;;;\n${EXPORT}`);
    expect([outcome.kind, codes(outcome)]).toEqual(['same', ['lines-moved', 'file-changed']]);
  });

  it('says moved, with was and is, when a used cell changed and the conclusion holds', async () => {
    const outcome = await recheck(await blockOf(EXPORT), EXPORT.replace('815,0', '815,5'));
    expect(outcome.kind).toBe('moved');
    expect(outcome.changes[0]).toMatchObject({ key: 'result.mean[1]', was: 815.75 });
    expect(outcome.line).toBe(lineIn(await blockOf(EXPORT), 'mean = '));
  });

  it('says turned when the conclusion changed', async () => {
    const outcome = await recheck(
      await blockOf(EXPORT),
      EXPORT.replace('standard;6;a;821,5', 'standard;6;a;901,5'),
    );
    expect(outcome.kind).toBe('turned');
    expect(outcome.changes.find(({ key }) => key === 'result.decision')).toMatchObject({
      was: 'differs',
      is: 'not settled',
    });
  });

  it('says altered, at its line, when a digit of the result was edited, also with a new record id', async () => {
    const block = await blockOf(EXPORT);
    const edited = block.replace(
      /^p = 0\.0(\d)/mu,
      (_, digit: string) => `p = 0.0${(Number(digit) + 1) % 10}`,
    );
    for (const text of [edited, resealed(edited)]) {
      const outcome = await recheck(text, EXPORT);
      expect([outcome.kind, outcome.line]).toEqual(['altered', lineIn(block, 'p = ')]);
    }
  });

  it.each([
    ['sampling', 'places by lot', 'places drawn by lot'],
    ['the question in words', 'harden the glaze', 'soften the glaze'],
    ['a reason', 'tile cracked on the saw', 'outlier'],
    ['the bytes of the file', /^bytes = \d+/mu, 'bytes = 1'],
    ['the rows that were counted', /^counted = .*$/mu, 'counted = ["separate-t"]'],
  ])('says same, with a note, when only %s was edited, which no number follows from', async (_, was, is) => {
    const block = await blockOf(EXPORT);
    const edited = block.replace(was, is);
    expect(edited).not.toBe(block);
    const outcome = await recheck(edited, EXPORT);
    expect([outcome.kind, codes(outcome)]).toEqual(['same', ['text-edited']]);
  });

  it('says reworked when our method changed since', async () => {
    const block = await blockOf(EXPORT);
    const [found] = findBlocks(notebookOf(block));
    const newer = {
      ...separateT,
      version: separateT.version + 1,
      run: (...asked: Parameters<typeof separateT.run>) => ({ ...separateT.run(...asked), df: 7 }),
    };
    const list = methods.map(known => (known.id === newer.id ? newer : known));
    const outcome = await recheckBlock(found!, name => Promise.resolve(source(name, EXPORT)), platform, list);
    expect([outcome.kind, outcome.changes.map(({ key }) => key)]).toEqual(['reworked', ['result.df']]);
  });

  it('says planned of a block without a result', async () => {
    const plan = planOf(await blockOf(EXPORT));
    expect((await recheck(plan, null)).kind).toBe('planned');
    const record = '[record]\nid = ""\nreplaces = "none"\n[by]';
    const sealed = resealed(plan.replace('[by]', record));
    expect((await recheck(sealed, null)).kind).toBe('planned');
  });

  it('is blocked where a result was taken out of a record, so that none passes for a plan', async () => {
    const block = await blockOf(EXPORT);
    const emptied = block.replace(/\[result\][^]*?(?=\[record\])/u, '');
    const cases: readonly (readonly [text: string, line: string])[] = [
      [emptied, 'id = '],
      [emptied.replace(/^cells = .*\n/mu, ''), 'id = '],
      [resealed(emptied), 'cells = '],
      [block.replace(/\[result\][^]*?(?=\[by\])/u, ''), 'cells = '],
    ];
    for (const [text, line] of cases) {
      const { kind, reason, line: at } = await recheck(text, EXPORT);
      const expected = notebookOf(text)
        .split('\n')
        .findIndex(own => own.startsWith(line));
      expect([kind, reason?.code, reason?.facts['expected'], at]).toEqual([
        'blocked',
        'block-not-readable',
        expect.stringContaining('[result]'),
        expected + 1,
      ]);
    }
  });

  it('finds a left-out row again on another line, and is blocked when it is gone', async () => {
    const block = await blockOf(EXPORT);
    const lines = EXPORT.split('\n');
    const swapped = [...lines.slice(0, 5), lines[6], lines[5], ...lines.slice(7)].join('\n');
    const moved = await recheck(block, swapped);
    expect([moved.kind, codes(moved)]).toEqual(['same', ['lines-moved', 'file-changed']]);
    const gone = await recheck(block, lines.filter(line => !line.includes('cracked')).join('\n'));
    expect([gone.kind, gone.reason?.code]).toEqual(['blocked', 'left-out-row-gone']);
  });

  it('is blocked when a left-out row moved and is no longer unique', async () => {
    const lines = EXPORT.split('\n');
    const twice = [
      ...lines.slice(0, 4),
      lines[6],
      ...lines.slice(4, 6),
      lines[5],
      lines[6],
      ...lines.slice(7),
    ];
    const outcome = await recheck(await blockOf(EXPORT), twice.join('\n'));
    expect([outcome.kind, outcome.reason?.facts['found']]).toEqual(['blocked', 2]);
  });

  describe('of two left-out rows that are alike', () => {
    const alike = EXPORT.replace('standard;4;b;;lost', 'slow cool;3;b;731,0;cracked\nstandard;4;b;;lost');
    const left = (...at: readonly number[]) => ({
      ...ASKED,
      leaveOut: at.map(row => ({ file: 0, line: row, reason: 'tile cracked', afterResult: false })),
    });
    const moved = (text: string): string => text.replace('slow cool;1;a', ';;;;\nslow cool;1;a');

    it('finds each on a line of its own', async () => {
      const outcome = await recheck(await blockOf(alike, left(7, 12)), moved(alike));
      expect([outcome.kind, outcome.changes]).toEqual(['same', []]);
    });

    it('is blocked when only one is there any more', async () => {
      const outcome = await recheck(await blockOf(alike, left(7, 12)), EXPORT);
      expect([outcome.kind, outcome.reason?.code, outcome.reason?.facts]).toEqual([
        'blocked',
        'left-out-row-gone',
        { line: 12, value: '731,0', found: 0 },
      ]);
    });

    it('is blocked, with how many there are, when a third has come and lines moved', async () => {
      const third = alike.replace('standard;6', 'slow cool;3;b;731,0;cracked\nstandard;6');
      const outcome = await recheck(await blockOf(alike, left(7, 12)), moved(third));
      expect([outcome.kind, outcome.reason?.facts['found']]).toEqual(['blocked', 3]);
    });

    it('never takes one line for two of them', async () => {
      const block = await blockOf(alike, left(7, 12));
      const outcome = await recheck(block.replace('line = 12', 'line = 7'), EXPORT);
      expect(outcome.reason?.code).toBe('left-out-row-gone');
    });
  });

  it('is blocked when the file is gone, or lies outside the root', async () => {
    const block = await blockOf(EXPORT);
    expect((await recheck(block, null)).reason?.code).toBe('file-not-found');
    const outside: Open = name => Promise.reject(new Refusal('file-outside-root', { name }, name));
    const outcome = await recheck(block, EXPORT, outside);
    expect([outcome.kind, outcome.reason?.code]).toEqual(['blocked', 'file-outside-root']);
  });

  it('is blocked, not broken, when a label, a column or all values of a group are gone', async () => {
    const block = await blockOf(EXPORT);
    const codeOf = async (text: string) => (await recheck(block, text)).reason?.code;
    expect(await codeOf(EXPORT.replaceAll('standard', 'fast'))).toBe('label-unknown');
    expect(await codeOf(EXPORT.replace('hardness', 'strength'))).toBe('column-unknown');
    expect(await codeOf('')).toBe('file-empty');
  });

  it('is blocked at the line of a key that cannot be read', async () => {
    const block = (await blockOf(EXPORT)).replace('against = 0', 'against = "zero"');
    const outcome = await recheck(block, EXPORT);
    expect([outcome.kind, outcome.reason?.code, outcome.line]).toEqual([
      'blocked',
      'block-not-readable',
      lineIn(block, 'against'),
    ]);
  });

  it('keeps the verdict of an old record when a later version counts more rows', async () => {
    const block = (await blockOf(EXPORT)).replace(
      'counted = ["separate-t", "pooled-t"]',
      'counted = ["separate-t"]',
    );
    const outcome = await recheck(resealed(block), EXPORT);
    expect(outcome.now?.whatIf.rows.map(({ id }) => id)).not.toContain('pooled-t');
    expect(outcome.kind).toBe('same');
  });

  it('says altered when the file is the same to the byte but a setting was edited', async () => {
    const block = await blockOf(EXPORT);
    const edited = block.replace('rows = "all"', 'rows = "4-12"');
    const outcome = await recheck(edited, EXPORT);
    expect([outcome.kind, codes(outcome)]).toEqual(['altered', ['text-edited']]);
    expect(outcome.changes.map(({ key }) => key)).toContain('data.0.cells');
  });

  it('says altered, at its line, when only the digest of the cells was edited', async () => {
    const block = await blockOf(EXPORT);
    const edited = block.replace(/^cells = ".*"$/mu, `cells = "${'0'.repeat(64)}"`);
    const outcome = await recheck(edited, EXPORT);
    expect([outcome.kind, outcome.line]).toEqual(['altered', lineIn(block, 'cells = ')]);
  });

  it('marks the digest when data moved and every number stayed', async () => {
    const block = await blockOf(EXPORT);
    const lines = EXPORT.split('\n');
    const swapped = [...lines.slice(0, 8), lines[9], lines[8], ...lines.slice(10)].join('\n');
    const outcome = await recheck(block, swapped);
    expect([outcome.kind, outcome.changes, outcome.line]).toEqual(['moved', [], lineIn(block, 'cells = ')]);
  });

  it('moves fixed ranges of lines with the header', async () => {
    const block = await blockOf(EXPORT, { ...ASKED, rows: [[4, 12]] });
    const outcome = await recheck(block, `Kiln 2;;;;\nread twice;;;;\n${EXPORT}`);
    expect([outcome.kind, codes(outcome)]).toEqual(['same', ['lines-moved', 'file-changed']]);
  });

  it('names what is missing under the header where it stands now', async () => {
    const text = `Kiln 2;;;;\n${EXPORT.replaceAll('standard', 'fast')}`;
    const outcome = await recheck(await blockOf(EXPORT), text);
    expect(outcome.reason?.code).toBe('label-unknown');
  });

  it('finds a header again that the file itself does not show', async () => {
    const text = 'a,b\nkiln,x\nA,1.5\nA,2\nA,2.5\nB,3\nB,4\nB,5.5\n';
    const asked = { files: ['kiln.csv'], measured: ['x'], label: 'kiln', per: 'none' as const };
    const block = await blockOf(text, { ...asked, wish: { header: 2 } });
    const outcome = await recheck(block, `old,2\nnew,3\n${text}`);
    expect([outcome.kind, codes(outcome)]).toEqual(['same', ['lines-moved', 'file-changed']]);
  });

  it('is blocked when a group has fewer than two values, or units, left', async () => {
    const without = async (gone: RegExp) => {
      const text = EXPORT.split('\n').filter(line => !gone.test(line));
      const { kind, reason } = await recheck(await blockOf(EXPORT), text.join('\n'));
      return [kind, reason?.code];
    };
    expect(await without(/^standard;[24]/u)).toEqual(['blocked', 'label-single-value']);
    expect(await without(/^standard;[46]/u)).toEqual(['blocked', 'values-too-few']);
  });

  it('computes on, and says so, when changed data raise a question', async () => {
    const text = EXPORT.replace('standard;6;a;821,5', 'standard ;6;a;821,5');
    const outcome = await recheck(await blockOf(EXPORT), text);
    expect([outcome.kind, codes(outcome)]).toEqual(['moved', ['questions-open']]);
    expect(outcome.notes[0]?.facts).toEqual({ ids: ['label-variants'] });
  });

  it('sees every number of a file of summaries', async () => {
    const mills = 'mill,n,mean,sd\nA,12,31.4,1.1\nB,10,30.2,0.9\n';
    const block = await blockOf(mills, { files: ['mills.csv'], wish: {}, summary: true });
    expect((await recheck(block, mills)).kind).toBe('same');
    for (const [was, is] of [
      ['12', '13'],
      ['31.4', '31.5'],
      ['1.1', '1.2'],
    ] as const) {
      expect((await recheck(block, mills.replace(was, is))).kind).toBe('moved');
    }
  });

  it('rechecks typed numbers without a file', async () => {
    const block = await blockOf('', {
      files: [],
      wish: {},
      typed: [
        { label: 'mill A', n: 12, mean: 31.4, sd: 1.1 },
        { label: 'mill B', n: 10, mean: 30.2, sd: 0.9 },
      ],
    });
    expect((await recheck(block, null)).kind).toBe('same');
    expect((await recheck(block.replace('sd = 1.1', 'sd = 1.2'), null)).kind).toBe('altered');
  });

  it('compares one file a group, each with its own digest', async () => {
    const files: Readonly<Record<string, string>> = {
      'may.csv': 'x\n1.5\n2.5\n3\n',
      'june.csv': 'x\n4\n5.5\n6\n',
    };
    const open: Open = name => Promise.resolve(source(name, files[name] ?? ''));
    const sources = Object.keys(files);
    const asked = { files: sources, wish: {}, measured: ['x'] };
    const answered = await answer(
      sources.map(name => source(name, files[name] ?? '')),
      asked,
      platform,
    );
    const block = printBlock(blockFrom(answered, provenance, STAMP));
    expect((await recheck(block, null, open)).kind).toBe('same');
    const changed: Open = name => Promise.resolve(source(name, (files[name] ?? '').replace('5.5', '5.6')));
    expect((await recheck(block, null, changed)).kind).toBe('moved');
  });
});

describe('two files, each in its own dialect', () => {
  const opened =
    (edit: (text: string, name: string) => string): Open =>
    name =>
      Promise.resolve(source(name, edit(TWO_FILES[name] ?? '', name)));

  it('are read again as they were read', async () => {
    const outcome = await recheck(
      await twoFilesBlock(),
      null,
      opened(text => text),
    );
    expect([outcome.kind, outcome.changes, outcome.notes]).toEqual(['same', [], []]);
  });

  it('may each get lines above the header, or be gone', async () => {
    const block = await twoFilesBlock();
    const above = opened((text, name) => (name === 'june.csv' ? `Kiln 2;\n${text}` : text));
    const outcome = await recheck(block, null, above);
    expect([outcome.kind, codes(outcome)]).toEqual(['same', ['lines-moved', 'file-changed']]);
    const gone: Open = name =>
      Promise.resolve(name === 'june.csv' ? null : source(name, TWO_FILES[name] ?? ''));
    expect((await recheck(block, null, gone)).reason?.code).toBe('file-not-found');
  });
});

describe('numbers of a recheck', () => {
  it('are held to 12 significant digits', () => {
    expect(sameNumber(0.123456789012, 0.1234567890124)).toBe(true);
    expect(sameNumber(0.123456789012, 0.1234567890127)).toBe(false);
    expect(sameNumber(0, 1e-300)).toBe(false);
    expect(sameNumber(Infinity, Infinity)).toBe(true);
  });
});

function lineIn(block: string, needle: string): number {
  return (
    notebookOf(block)
      .split('\n')
      .findIndex(at => at.startsWith(needle)) + 1
  );
}
