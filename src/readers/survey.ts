import type { Field, Reading } from '../core/model/cells';
import type { Ticker } from '../core/model/problem';
import type { ByteSource } from './byteSource';
import { fallenBack } from './fallenBack';
import { FedBytes } from './fedBytes';
import { readFile } from './readFile';
import type { ReadingWish } from './readingWish';
import { ReadRows } from './readRows';
import { scout, type Scouted } from './scout';
import { SurveySink, type ColumnSurvey } from './surveySink';
import { NotUtf8 } from './utf8Chunks';

/** What a file holds, column by column: what questions and defaults are made from. */
export interface Survey {
  readonly fields: readonly Field[];
  readonly reading: Reading;
  readonly columns: readonly (ColumnSurvey & {
    readonly name: string;
    readonly unit: string | null;
    readonly field: number;
  })[];
  readonly rows: number;
  /** The lines on which the first and the last data row start. */
  readonly firstLine: number;
  readonly lastLine: number;
}

/**
 * Reads a file through once and describes every column.
 * @throws Refusal whatever `scout` and `readTable` refuse; Cancelled
 */
export async function survey(source: ByteSource, wish: ReadingWish, tick?: Ticker): Promise<Survey> {
  const head = await scout(source, wish);
  const fed = new FedBytes([source], tick === undefined ? {} : { tick });
  try {
    return await look(source, head, fed);
  } catch (error) {
    if (!(error instanceof NotUtf8)) throw error;
    fed.again();
    return await look(source, await fallenBack(source, head, error.byte, 0), fed);
  }
}

async function look(source: ByteSource, head: Scouted, fed: FedBytes): Promise<Survey> {
  const rows = new ReadRows(new Set());
  rows.startFile();
  let sinks: readonly SurveySink[] = [];
  const reading = await readFile(source, head, 0, {
    onChunk: chunk => fed.take(0, chunk),
    sinks: format => (sinks = head.fields.map(() => new SurveySink(format))),
    rows,
  });
  return {
    fields: head.fields,
    reading,
    columns: head.fields.map(({ name, unit }, field) => {
      const sink = sinks[field];
      if (sink === undefined) throw new RangeError(`column ${field} was not looked at`);
      return { name, unit, field, ...sink.result() };
    }),
    rows: rows.total,
    firstLine: rows.lineOf(0),
    lastLine: rows.lineOf(rows.total - 1),
  };
}
