import { Cell, type LabelColumn, type NumberColumn, type Table } from '../core/model/cells';
import type { Settings } from '../core/model/settings';
import { measuresOutcomes } from './measureAsked';

/** A measured column: numbers, or outcomes of which some words count as success. */
export type Measured =
  | { readonly kind: 'numbers'; readonly field: number; readonly column: NumberColumn }
  | {
      readonly kind: 'outcomes';
      readonly field: number;
      readonly column: LabelColumn;
      readonly missing: Uint8Array;
    };

export function measuredValues(
  table: Table,
  settings: Pick<Settings, 'layout' | 'measure' | 'options' | 'reading'>,
  field: number,
): Measured {
  const counted = settings.layout.kind === 'summary';
  if (counted || !measuresOutcomes(settings.measure, settings.options['success'])) {
    return { kind: 'numbers', field, column: table.numbers(field) };
  }
  const column = table.labels(field);
  const words = new Set(settings.reading.missing);
  const missing = Uint8Array.from(column.levels, (level, code) =>
    Number(code === 0 || words.has(level.trim())),
  );
  return { kind: 'outcomes', field, column, missing };
}

/** The Cell code of a row. */
export function cellState(measured: Measured, row: number): number {
  if (measured.kind === 'numbers') return measured.column.state?.[row] ?? Cell.Value;
  return measured.missing[measured.column.codes[row] ?? 0] === 1 ? Cell.Missing : Cell.Value;
}
