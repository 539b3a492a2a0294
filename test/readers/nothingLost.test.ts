import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Cell } from '../../src/core/model/cells';
import { exactText } from '../../src/core/numeric/numbers';
import type { ReadingWish } from '../../src/readers/readingWish';
import { survey } from '../../src/readers/survey';
import { inChunks, readAll, refusalOf, source } from './read';

const words = [
  ...[
    'slow',
    'Mean',
    'Total',
    'n',
    'NA',
    '',
    '-',
    '#',
    '# note',
    '1',
    '2.5',
    '1,234',
    '0,5',
    '<0.02',
    '> 3',
    '1e3',
  ],
  ...['5"', '(mg)', 'MPa', '1 234', '\u22125', 'ö', ' ', '12.345.678'],
];
const troublesome = ['"q"', '"a;b"', '"x""y"', '"', 'Infinity', '1e999'];
const cellsOf = (texts: readonly string[]) =>
  fc.oneof(
    { weight: 3, arbitrary: fc.constantFrom(...texts) },
    { weight: 3, arbitrary: fc.integer({ min: -999, max: 9999 }).map(String) },
    {
      weight: 1,
      arbitrary: fc
        .double({ noNaN: true, noDefaultInfinity: true, min: -1e9, max: 1e9 })
        .map(x => x.toFixed(4)),
    },
  );
const lineEnds = fc.constantFrom('\n', '\n', '\n', '\r\n', '\r');
const filesOf = (texts: readonly string[], header: fc.Arbitrary<boolean>) =>
  fc
    .record({
      delimiter: fc.constantFrom(',', ';', '\t', '|'),
      rows: fc.array(fc.tuple(fc.array(cellsOf(texts), { minLength: 1, maxLength: 4 }), lineEnds), {
        maxLength: 14,
      }),
      header,
    })
    .map(({ delimiter, rows, header: named }) => {
      const body = rows.map(([row, end]) => row.join(delimiter) + end).join('');
      const text = named ? `${['site', 'mass', 'note'].join(delimiter)}\n${body}` : body;
      const wish: ReadingWish = named ? { delimiter, header: 1, decimal: delimiter === ';' ? ',' : '.' } : {};
      return { text, wish };
    });
const files = filesOf([...words, ...troublesome], fc.boolean());
const tameFiles = filesOf(words, fc.constant(true));

describe('any file', () => {
  it('is read or refused with a code, and never fails otherwise', async () => {
    const anything = fc.oneof(
      files.map(({ text }) => source(text)),
      fc.uint8Array({ maxLength: 80 }).map(bytes => source(bytes)),
    );
    await fc.assert(
      fc.asyncProperty(anything, async file => {
        const refusal = await refusalOf(readAll(file));
        if (refusal !== null) expect(refusal.code).toMatch(/^[a-z]+(-[a-z0-9]+)+$/);
        await refusalOf(survey(file, {}));
      }),
      { numRuns: 400 },
    );
  });

  it('has every line of it accounted for: head, row, blank, comment or foot', async () => {
    let read = 0;
    await fc.assert(
      fc.asyncProperty(tameFiles, fc.integer({ min: 1, max: 30 }), async ({ text, wish }, size) => {
        const file = inChunks(text, size);
        const outcome = await readAll(file, wish).catch(() => null);
        if (outcome === null) return;
        read++;
        const { table, head } = outcome;
        const reading = table.readings[0]!;
        const { metCounts } = reading;
        const counted = ['blank-line', 'empty-row', 'comment-line'].reduce(
          (sum, what) => sum + (metCounts[what] ?? 0),
          0,
        );
        const lines = text.split(/\r\n|\r|\n/);
        if (lines.at(-1) === '') lines.pop();
        expect(head.shape.dataLine - 1 + table.rows + counted + reading.footer.length).toBe(lines.length);
        expect(reading.lines).toBe(lines.length);
      }),
      { numRuns: 300 },
    );
    expect(read).toBeGreaterThan(200); // else most were refused, and this shows nothing
  });

  it('has every cell of a number column as a value, a limit, a missing value or a text', async () => {
    let read = 0;
    await fc.assert(
      fc.asyncProperty(tameFiles, async ({ text, wish }) => {
        const outcome = await readAll(source(text), wish).catch(() => null);
        if (outcome === null) return;
        read++;
        const { table, head } = outcome;
        const missing = new Set(['', ...head.reading.missingWords]);
        head.fields.forEach((_, field) => {
          const { numbers, state, texts } = table.numbers(field);
          for (let row = 0; row < table.rows; row++) {
            const written = (table.cells(row)![field] ?? '').trim();
            const code = state?.[row] ?? Cell.Value;
            if (code === Cell.Missing) expect(missing.has(written)).toBe(true);
            else if (code === Cell.Text)
              expect(texts.find(entry => entry.row === row)?.text.trim()).toBe(written);
            else if (code === Cell.Value) {
              const plain = written.replace('\u2212', '-').replace(head.reading.decimal, '.');
              if (/^-?[\d.]+(e[+-]?\d+)?$/i.test(plain) && Number.isFinite(Number(plain))) {
                expect(Number(exactText(numbers, row))).toBe(Number(plain) + 0);
              } else expect(exactText(numbers, row).replace(/\D/g, '')).toBe(written.replace(/\D/g, ''));
            } else expect(written).toMatch(/^[<>\u2264\u2265]/);
          }
        });
      }),
      { numRuns: 300 },
    );
    expect(read).toBeGreaterThan(200); // else most were refused, and this shows nothing
  });
});
