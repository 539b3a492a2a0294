import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Request } from '../../src/compare/request';
import { Refusal } from '../../src/core/model/problem';
import { blockFrom } from '../../src/settings/block';
import { fenced } from '../../src/settings/fenced';
import { findBlocks } from '../../src/settings/findBlocks';
import { parseBlock } from '../../src/settings/parseBlock';
import { printBlock } from '../../src/settings/printBlock';
import { requestFrom } from '../../src/settings/requestFrom';
import { ASKED, EXPORT, STAMP, answerOf, blockOf, provenance, twoFilesBlock } from './recording';

const anyText = fc.string({ unit: 'grapheme', maxLength: 20 });
const control = fc.string({
  unit: fc.constantFrom(
    ...['"', '\\', '\n', '\r', '\t', '\u0000', '\u001f', '\u007f', '\u0085', '\u2028', '\u202e', '\ufeff'],
    ...['`', '#', '=', '[', 'é', '🧪'],
  ),
});
const text = fc.oneof(anyText, control);
const number = fc.double({ noNaN: true });
const finite = fc.double({ noNaN: true, noDefaultInfinity: true });
const pair = fc.tuple(number, number);
const digest = fc
  .uint8Array({ minLength: 32, maxLength: 32 })
  .map(bytes => Buffer.from(bytes).toString('hex'));
const line = fc.nat(1e6);
const moment = fc
  .record({
    day: fc.integer({ min: 1, max: 28 }),
    hour: fc.nat(23),
    offset: fc.constantFrom('Z', '+02:00', '-09:30'),
  })
  .map(({ day, hour, offset }) => `2031-04-${pad(day)}T${pad(hour)}:31:07${offset}`);
const pad = (value: number): string => String(value).padStart(2, '0');
const some: { requiredKeys: [] } = { requiredKeys: [] };
/** Keys of a later version. */
const unknown = fc.dictionary(
  fc.constantFrom('later-key', 'later key', 'é', 'say "x"', '', '__proto__', 'constructor', 'toString'),
  fc.oneof(text, number, fc.boolean(), fc.array(text, { maxLength: 3 }), fc.dictionary(text, number)),
  { maxKeys: 2 },
);

const summaries = fc.array(
  fc.oneof(
    fc.record({ label: text, n: line, mean: finite, sd: finite }),
    fc.record({ label: text, n: line, x: line }),
  ),
  { minLength: 2, maxLength: 3 },
);
/** Tables of a later version. */
const unknownTables = fc.dictionary(
  fc.constantFrom('later table', 'later-table', 'constructor'),
  fc.oneof(unknown, fc.array(unknown, { minLength: 1, maxLength: 2 })),
  { maxKeys: 2 },
);

const blocks = fc
  .record({
    purpose: fc.record({ 'question-in-words': text, plan: text }),
    data: fc.array(
      fc
        .tuple(
          fc.record({
            file: text,
            bytes: line,
            sha256: digest,
            cells: digest,
            encoding: text,
            delimiter: fc.constantFrom(',', ';', '\t', '|'),
            decimal: fc.constantFrom('.' as const, ',' as const),
            header: line,
            rows: fc.constantFrom('all', '5-76', '5-40, 50-76'),
          }),
          fc.record(
            {
              thousands: text,
              'units-row': line,
              'footer-left': fc.array(text),
              'missing-words': fc.array(text),
              below: fc.constantFrom('zero' as const, 'half' as const, 'limit' as const),
              where: fc.array(fc.tuple(text, text)),
            },
            some,
          ),
          unknown,
        )
        .map(([known, maybe, later]) => ({ ...known, ...maybe, ...later })),
      { minLength: 1, maxLength: 2 },
    ),
    groups: fc.record(
      {
        layout: fc.constantFrom('wide' as const, 'files' as const, 'summary' as const, 'typed' as const),
        measured: fc.array(text),
        'measured-in': text,
        columns: fc.array(text),
        label: text,
        test: text,
        reference: text,
        merged: fc.array(fc.tuple(text, text)),
        per: fc.array(text),
        'rows-are': fc.constantFrom('independent' as const, 'not stated' as const),
        pair: text,
        numbering: fc.constant('starts again in each group' as const),
      },
      some,
    ),
    'left-out': fc.array(
      fc
        .tuple(
          fc.record({ line, value: text, 'row-sha256': digest, reason: text, 'after-result': fc.boolean() }),
          fc.record({ file: text, unit: text }, some),
          unknown,
        )
        .map(([known, maybe, later]) => ({ ...later, ...known, ...maybe })),
      { minLength: 1, maxLength: 2 },
    ),
    comparison: fc
      .tuple(
        fc.record({
          measure: fc.constantFrom('mean' as const, 'proportion' as const),
          method: fc.constantFrom('separate-t', 'pooled-t', 'miettinen-nurminen'),
          question: fc.constantFrom('differs' as const, 'higher' as const, 'not-lower' as const),
          confidence: finite,
          against: finite,
          sampling: text,
        }),
        fc.record(
          {
            margin: pair,
            matters: finite,
            sigma: pair,
            success: text,
            curve: fc.constant('normal-over-30' as const),
            primary: text,
            seed: line,
            draws: line,
            thresholds: fc.dictionary(text, fc.oneof(number, text, fc.boolean(), fc.array(number))),
            'ruled-out': fc.array(text),
            reasons: fc.dictionary(text, text),
          },
          some,
        ),
        unknown,
      )
      .map(([known, maybe, later]) => ({ ...known, ...maybe, ...later })),
    changed: fc.array(
      fc.record({
        key: text,
        from: fc.oneof(number, text),
        to: fc.array(number),
        when: moment,
        reason: text,
      }),
      { minLength: 1, maxLength: 2 },
    ),
    result: fc
      .tuple(
        fc.record({
          n: fc.array(line),
          decision: text,
          'depends-on-choice': fc.constantFrom('no' as const, 'yes' as const),
          counted: fc.array(text),
        }),
        fc.record(
          {
            mean: fc.array(number),
            difference: number,
            interval: pair,
            df: fc.oneof(number, pair),
            p: number,
            'with-left-out-kept': fc.record({ difference: number, interval: pair, decision: text }),
          },
          some,
        ),
      )
      .map(([known, maybe]) => ({ ...known, ...maybe })),
    record: fc.record({ id: text, replaces: text }),
    by: fc.record({ analyst: text, weighbeam: text, 'method-version': line, looks: line, written: moment }),
  })
  .chain(({ data, ...known }) =>
    fc
      .tuple(fc.oneof(fc.constant({ data }), fc.record({ summary: summaries })), unknown, unknownTables)
      .map(([given, later, tables]) => ({ ...later, ...tables, ...given, ...known })),
  );

describe('a settings block', () => {
  it('prints, parses and prints again to the same text, with unknown keys and any characters', () => {
    fc.assert(
      fc.property(blocks, block => {
        const printed = printBlock(block);
        const { block: parsed } = parseBlock(printed, 1);
        expect(printBlock(parsed)).toBe(printed);
      }),
      { numRuns: 300 },
    );
  });

  it('asks the same again: the recipe read from a block gives the same block', async () => {
    const printed = await blockOf(EXPORT);
    const request = requestFrom(parseBlock(printed, 1).block);
    expect(await blockOf(EXPORT, request)).toBe(printed);
  });

  it('asks the same again of a recipe with every option that a block can hold', async () => {
    const asked = {
      ...ASKED,
      matters: 15,
      curve: 'normal-over-30' as const,
      rows: [[4, 13]] as const,
      options: { seed: 7, draws: 9999, primary: 'hardness', 'ruled-out': 'pooled-t,large-n-z' },
    };
    const printed = await blockOf(EXPORT, asked);
    expect(printed).toContain('ruled-out = ["pooled-t", "large-n-z"]');
    const request = requestFrom(parseBlock(printed, 1).block);
    expect(request).toMatchObject({ options: asked.options, rows: asked.rows });
    expect(await blockOf(EXPORT, request)).toBe(printed);
  });

  it('lets each of two files show again how it is written', async () => {
    const printed = await twoFilesBlock();
    const { wish } = requestFrom(parseBlock(printed, 1).block);
    expect(wish).toEqual({ encoding: 'utf-8', thousands: '', header: 1 });
  });

  it('takes no name of JavaScript for a key it knows', async () => {
    const later = (await blockOf(EXPORT))
      .replace('[purpose]', 'constructor = 1\n[purpose]')
      .replace('[record]', '[toString]\nx = 1\n[record]');
    expect(parseBlock(later, 1).unknownKeys).toEqual(['constructor', 'toString']);
  });

  it('names unknown keys and keeps them', async () => {
    const printed = (await blockOf(EXPORT)).replace('[record]', 'later = 3\n[record]');
    const { unknownKeys, block } = parseBlock(printed, 1);
    expect(unknownKeys).toEqual(['result.later']);
    expect(printBlock(block)).toBe(printed);
  });

  it('is refused with the line where it cannot be read', async () => {
    const printed = await blockOf(EXPORT);
    const lineOf = (needle: string): number => printed.split('\n').findIndex(at => at.startsWith(needle)) + 1;
    const cases: readonly [string, string, number][] = [
      [
        printed.replace('confidence = 0.95', 'confidence = "high"'),
        'block-not-readable',
        lineOf('confidence'),
      ],
      [printed.replace('confidence = 0.95', 'confidence = ='), 'block-not-readable', lineOf('confidence')],
      [printed.replace('"separate-t"', '"guess-t"'), 'block-not-readable', lineOf('method')],
      [printed.replace('rows = "all"', 'rows = "5 to 9"'), 'block-not-readable', lineOf('rows')],
      [
        printed.replace('against = 0', 'against = 0\nagainst = 1'),
        'block-not-readable',
        lineOf('against') + 1,
      ],
      [printed.replace('row-sha256 = "', 'row-sha256 = "x'), 'block-not-readable', lineOf('row-sha256')],
      [printed.replace('format 1', 'format 2'), 'block-newer-format', 1],
      [printed.replace('# end of settings block\n', ''), 'block-not-readable', 1],
    ];
    for (const [text, code, at] of cases) {
      const error = refusalOf(() => parseBlock(text, 1));
      expect([error.code, error.where]).toEqual([code, `line ${at}`]);
    }
  });

  it('is not made while a question of the data is open', async () => {
    const answered = await answerOf(EXPORT);
    const open = { ...answered, comparison: { ...answered.comparison, open: ['shared-unit'] } };
    expect(refusalOf(() => blockFrom(open, provenance, STAMP)).code).toBe('answer-needed');
  });

  it('holds open ends as inf', async () => {
    expect(await blockOf(EXPORT, { ...ASKED, question: 'higher' })).toMatch(
      /^interval = \[-?\d[^,]*, inf\]$/mu,
    );
  });

  it('never holds a number that is none, whatever was computed, and reads back to the same text', async () => {
    const answered = await answerOf(EXPORT);
    const any = fc.oneof(fc.double(), fc.constantFrom(NaN, Infinity, -Infinity));
    const maybe = fc.option(any);
    const results = fc.record({
      ...{ estimate: maybe, statistic: maybe, p: maybe, lower: maybe, upper: maybe },
      df: fc.oneof(maybe, fc.tuple(any, any)),
    });
    fc.assert(
      fc.property(results, fc.array(any, { minLength: 4, maxLength: 4 }), (numbers, [a, b, c, d]) => {
        const { comparison } = answered;
        const { chosen, whatIf, groups } = comparison;
        const computed = <R extends typeof chosen>(row: R): R =>
          row.result === null ? row : { ...row, result: { ...row.result, ...numbers } };
        const found = [
          { mean: a, sd: b },
          { mean: c, sd: d },
        ];
        const printed = printBlock(
          blockFrom(
            {
              ...answered,
              comparison: {
                ...comparison,
                chosen: computed(chosen),
                whatIf: { ...whatIf, rows: whatIf.rows.map(computed) },
                groups: groups.map((group, index) => ({ ...group, ...found[index] })),
              },
            },
            provenance,
            STAMP,
          ),
        );
        const openEnds = printed.replaceAll(/interval = \[(?:-inf, [-\d]|[-\d][^,\]]*, inf\])/gu, '');
        expect(openEnds).not.toMatch(/[=[,] ?[+-]?(?:nan|inf)\b/u);
        expect(printBlock(parseBlock(printed, 1).block)).toBe(printed);
      }),
      { numRuns: 300 },
    );
  });

  it('holds no SD of a typed group of one value, and asks the same again without it', async () => {
    const asked: Request = {
      files: [],
      wish: {},
      typed: [
        { label: 'mill A', n: 1, mean: 31.4, sd: NaN },
        { label: 'mill B', n: 10, mean: 30.2, sd: 0.9 },
      ],
      variance: 'known',
      sigma: [1, 1],
    };
    const printed = await blockOf('', asked);
    expect(printed).not.toMatch(/nan/u);
    const request = requestFrom(parseBlock(printed, 1).block);
    expect(await blockOf('', request)).toBe(printed);
  });

  it('is refused where a setting is no number, with its key', async () => {
    const answered = await answerOf(EXPORT);
    for (const [key, options] of [
      ['comparison.seed', { seed: NaN }],
      ['comparison.sigma[1]', { sigma: [1, -Infinity] }],
    ] as const) {
      const { comparison } = answered;
      const settings = { ...comparison.settings, options };
      const error = refusalOf(() =>
        blockFrom({ ...answered, comparison: { ...comparison, settings } }, provenance, STAMP),
      );
      expect([error.code, error.where]).toEqual(['number-unusable', key]);
    }
  });

  it('holds counts and shares of a column of two outcomes', async () => {
    const rows = [
      'glaze,crazed',
      ...Array(9).fill('A,yes'),
      'A,no',
      ...Array(3).fill('B,yes'),
      ...Array(7).fill('B,no'),
      '',
    ];
    const block = await blockOf(rows.join('\n'), {
      files: ['tiles.csv'],
      wish: {},
      measured: ['crazed'],
      label: 'glaze',
      measure: 'proportion',
      success: 'yes',
      per: 'none',
    });
    expect(block).toContain('n = [10, 10]\nx = [9, 3]\ndifference = 0.6');
    expect(block).toContain('success = "yes"');
  });
});

describe('finding blocks in a notebook', () => {
  it('finds a block in any text, with the lines it stands on', async () => {
    const block = await blockOf(EXPORT);
    const linesOfText = fc.array(
      anyText.filter(at => !/[\r\n]/u.test(at) && !at.includes('weighbeam')),
      { maxLength: 5 },
    );
    fc.assert(
      fc.property(
        linesOfText,
        fc.constantFrom('', '  ', '\t', '> ', '% ', '- ', '.. ', '> > ', '  > ', '// '),
        fc.constantFrom('\n', '\r\n', '\r'),
        (lines, around, end) => {
          const body = block.trimEnd().split('\n');
          const notebook = [...lines, ...body.map(at => `${around}${at}`), 'after'].join(end);
          const [found, ...more] = findBlocks(notebook);
          expect(more).toEqual([]);
          expect(found).toEqual({
            firstLine: lines.length + 1,
            lastLine: lines.length + body.length,
            text: block,
          });
        },
      ),
    );
  });

  it('reads on where an editor trimmed or moved the marks before a line', async () => {
    const block = await blockOf(EXPORT);
    const quoted = block.trimEnd().replace(/^/gmu, '> > ');
    for (const [line, edited] of [
      ['> > [groups]', '> >\n> > [groups]'],
      ['> > label', '>> label'],
      ['> > label', '  > >   label'],
    ] as const) {
      const [found] = findBlocks(quoted.replace(line, edited));
      expect(found?.text.replace('\n\n', '\n')).toBe(block);
    }
    const [item] = findBlocks(`- ${block.trimEnd().replaceAll('\n', '\n  ')}`);
    expect(item?.text).toBe(block);
  });

  it('finds every block, also one that was never ended', async () => {
    const block = await blockOf(EXPORT);
    const open = block.replace('# end of settings block\n', '');
    const found = findBlocks(`${open}${fenced(block)}`);
    expect(found.map(({ text }) => parseableBlock(text))).toEqual([false, true]);
  });

  it('fences a block so that nothing in it can end the fence', () => {
    expect(fenced('a = "```"\n')).toBe('````toml\na = "```"\n````\n');
  });
});

function parseableBlock(text: string): boolean {
  try {
    parseBlock(text, 1);
    return true;
  } catch {
    return false;
  }
}

function refusalOf(run: () => unknown): Refusal {
  try {
    run();
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
  throw new Error('it was not refused');
}
