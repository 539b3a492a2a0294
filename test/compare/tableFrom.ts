import {
  Cell,
  type LabelColumn,
  type NumberColumn,
  type Reading,
  type Table,
} from '../../src/core/model/cells';
import { parseDecimal } from '../../src/core/numeric/decimal';
import { NumbersBuilder } from '../../src/core/numeric/numbersBuilder';
import { MISSING_WORDS } from '../../src/readers/readingWish';

const reading: Reading = {
  encoding: 'utf-8',
  delimiter: ',',
  decimal: '.',
  thousands: '',
  headerLine: 1,
  unitsLine: null,
  footer: [],
  missingWords: MISSING_WORDS,
  met: [],
  metCounts: {},
  bytes: 0,
  lines: 0,
};

/** A table of plain comma-separated lines (no quotes), the header first; several texts: one file each, of the same columns. */
export function tableFrom(...texts: readonly string[]): Table {
  const files = texts.map(text =>
    text
      .trim()
      .split('\n')
      .map(line => line.split(',').map(cell => cell.trim())),
  );
  const header = files[0]?.[0] ?? [];
  const fields = header.map(name => {
    const unit = /\(([^)]*)\)$/.exec(name)?.[1] ?? null;
    return { name, unit, file: 0 };
  });
  const rows = files.flatMap((lines, file) =>
    lines.slice(1).map((cells, index) => ({ file, line: index + 2, cells })),
  );
  const cellsAt = (field: number): readonly string[] => rows.map(({ cells }) => cells[field] ?? '');
  return {
    rows: rows.length,
    fields,
    readings: texts.map(() => reading),
    numbers: field => numberColumn(fields[field]!, cellsAt(field)),
    labels: field => labelColumn(fields[field]!, cellsAt(field)),
    line: row => rows[row]?.line ?? 0,
    file: row => rows[row]?.file ?? 0,
    rowAt: (file, line) => rows.findIndex(row => row.file === file && row.line === line),
    cells: row => rows[row]?.cells ?? null,
  };
}

function numberColumn(
  { name, unit }: { name: string; unit: string | null },
  cells: readonly string[],
): NumberColumn {
  const builder = new NumbersBuilder();
  const texts: { row: number; text: string }[] = [];
  const state = Uint8Array.from(cells, (text, row) => {
    const bound = /^([<>])(.*)$/.exec(text);
    const number = bound?.[2] ?? text;
    if (text === '' || MISSING_WORDS.includes(text)) {
      builder.addNothing();
      return Cell.Missing;
    }
    if (parseDecimal(number, '.') === null) {
      texts.push({ row, text });
      builder.addNothing();
      return Cell.Text;
    }
    builder.addDecimal(number);
    return bound === null ? Cell.Value : bound[1] === '<' ? Cell.Below : Cell.Above;
  });
  return { kind: 'number', name, unit, numbers: builder.build(), state, texts };
}

function labelColumn({ name }: { name: string }, cells: readonly string[]): LabelColumn {
  const levels = ['', ...new Set(cells.filter(cell => cell !== ''))];
  return { kind: 'label', name, levels, codes: Uint16Array.from(cells, cell => levels.indexOf(cell)) };
}
