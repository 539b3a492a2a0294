import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { Cell, type NumberColumn, type Table } from '../../src/core/model/cells';
import { exactText } from '../../src/core/numeric/numbers';
import { findField } from '../../src/readers/findField';
import type { ReadingWish } from '../../src/readers/readingWish';
import { readTable } from '../../src/readers/readTable';
import { scout } from '../../src/readers/scout';
import { refusalOf, source } from './read';

/** What a file must read as; keys that are left out are not looked at. */
interface Shape {
  file: string;
  what: string;
  wish?: ReadingWish;
  reads?: {
    delimiter: string;
    decimal: string;
    header: number;
    unitsLine?: number;
    encoding?: string;
    thousands?: string;
    fields?: string[];
    units?: (string | null)[];
    numbers?: Record<string, string[]>;
    labels?: Record<string, string[]>;
    lines?: number[];
    footer?: number[];
    met?: Record<string, number>;
  };
  refused?: { code: string; line?: number; field?: number };
}

const folder = new URL('fixtures/', import.meta.url);
const shapes = JSON.parse(readFileSync(new URL('shapes.json', folder), 'utf8')) as Shape[];

async function read({ file, wish = {} }: Shape) {
  const bytes = source(readFileSync(new URL(`shapes/${file}`, folder)), file);
  const head = await scout(bytes, wish);
  const { fields } = head;
  const all = fields.map((_, index) => index);
  return { head, table: await readTable([bytes], [head], { numbers: head.numeric, labels: all }) };
}

/** '<0.02', '>2000', '' for missing, 'text:…' for a word. */
function cellsOf({ numbers, state, texts }: NumberColumn, rows: number): string[] {
  return Array.from({ length: rows }, (_, row) => {
    const code = state?.[row] ?? Cell.Value;
    if (code === Cell.Missing) return '';
    if (code === Cell.Text) return `text:${texts.find(text => text.row === row)?.text ?? ''}`;
    return `${code === Cell.Below ? '<' : code === Cell.Above ? '>' : ''}${exactText(numbers, row)}`;
  });
}

const labelsOf = (table: Table, field: number): string[] => {
  const { codes, levels } = table.labels(field);
  return Array.from(codes, code => levels[code]!);
};

describe('a file of the real world', () => {
  it.each(
    shapes.filter(shape => shape.reads !== undefined).map(shape => [shape.file, shape.what, shape] as const),
  )('%s is read right: %s', async (_, __, shape) => {
    const { reads } = shape;
    const { head, table } = await read(shape);
    const reading = table.readings[0]!;
    expect([reading.delimiter, reading.decimal, reading.headerLine]).toEqual([
      reads!.delimiter,
      reads!.decimal,
      reads!.header,
    ]);
    expect(reading.unitsLine).toBe(reads!.unitsLine ?? null);
    if (reads!.encoding !== undefined) expect(reading.encoding).toBe(reads!.encoding);
    expect(reading.thousands).toBe(reads!.thousands ?? '');
    if (reads!.fields !== undefined) expect(head.fields.map(field => field.name)).toEqual(reads!.fields);
    if (reads!.units !== undefined) expect(head.fields.map(field => field.unit)).toEqual(reads!.units);
    for (const [name, cells] of Object.entries(reads!.numbers ?? {})) {
      expect(cellsOf(table.numbers(findField(table.fields, name)), table.rows)).toEqual(cells);
    }
    for (const [name, labels] of Object.entries(reads!.labels ?? {})) {
      expect(labelsOf(table, findField(table.fields, name))).toEqual(labels);
    }
    if (reads!.lines !== undefined) {
      expect(Array.from({ length: table.rows }, (__, row) => table.line(row))).toEqual(reads!.lines);
      expect(reads!.lines.map(line => table.rowAt(0, line))).toEqual([...reads!.lines.keys()]);
    }
    if (reads!.footer !== undefined) expect(reading.footer.map(({ line }) => line)).toEqual(reads!.footer);
    if (reads!.met !== undefined) expect(reading.metCounts).toMatchObject(reads!.met);
  });

  it.each(
    shapes
      .filter(shape => shape.refused !== undefined)
      .map(shape => [shape.file, shape.what, shape] as const),
  )('%s is refused with its place: %s', async (_, __, shape) => {
    const refusal = await refusalOf(read(shape));
    expect(refusal?.code).toBe(shape.refused!.code);
    const { line, field } = shape.refused!;
    if (line !== undefined) expect(refusal?.where).toMatchObject({ file: 0, line, field: field ?? 0 });
  });
});
