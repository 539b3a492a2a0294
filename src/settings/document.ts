import type { TomlDate } from 'smol-toml';
import * as v from 'valibot';

/**
 * The settings block as data: its tables and keys in the order in which they are printed. Unknown keys are kept where
 * they stand, so that a block written by a later version survives being read and printed here.
 */

const text = v.string();
const texts = v.array(v.string());
const number = v.number();
const pair = v.tuple([number, number]);
const line = v.pipe(number, v.integer(), v.minValue(0));
const digest = v.pipe(text, v.regex(/^[0-9a-f]{64}$/));
/** An offset date and time; TOML writes it bare, a block holds its text. */
const moment = text;
const ranges = v.pipe(text, v.regex(/^(?:all|\d+\s*-\s*\d+(?:\s*,\s*\d+\s*-\s*\d+)*)$/u));
const decimalMark = v.picklist(['.', ',']);
/** What an option of a method or an evidence check may hold. */
export const optionValue = v.union([text, number, v.boolean(), v.array(number)]);

const purpose = v.looseObject({ 'question-in-words': text, plan: text });

/** What a plan cannot know of a file that is not there yet; a block with a result holds all of it. */
export const READ_KEYS = ['bytes', 'sha256', 'cells', 'encoding', 'delimiter', 'decimal', 'header'] as const;

const data = v.looseObject({
  file: text,
  bytes: v.exactOptional(line),
  sha256: v.exactOptional(digest),
  cells: v.exactOptional(digest),
  encoding: v.exactOptional(text),
  delimiter: v.exactOptional(text),
  decimal: v.exactOptional(decimalMark),
  thousands: v.exactOptional(text),
  header: v.exactOptional(line),
  'units-row': v.exactOptional(line),
  'footer-left': v.exactOptional(texts),
  'missing-words': v.exactOptional(texts),
  below: v.exactOptional(v.picklist(['zero', 'half', 'limit'])),
  rows: ranges,
  where: v.exactOptional(v.array(v.tuple([text, text]))),
});

const summary = v.looseObject({
  label: text,
  n: number,
  mean: v.exactOptional(number),
  sd: v.exactOptional(number),
  x: v.exactOptional(number),
});

const groups = v.looseObject({
  layout: v.exactOptional(v.picklist(['wide', 'files', 'summary', 'typed'])),
  measured: v.exactOptional(texts),
  'measured-in': v.exactOptional(text),
  columns: v.exactOptional(texts),
  label: v.exactOptional(text),
  test: v.exactOptional(text),
  reference: v.exactOptional(text),
  merged: v.exactOptional(v.array(v.tuple([text, text]))),
  per: v.exactOptional(texts),
  'rows-are': v.exactOptional(v.picklist(['independent', 'not stated'])),
  pair: v.exactOptional(text),
  numbering: v.exactOptional(v.picklist(['starts again in each group'])),
});

const leftOut = v.looseObject({
  file: v.exactOptional(text),
  line,
  value: text,
  unit: v.exactOptional(text),
  'row-sha256': digest,
  reason: text,
  'after-result': v.boolean(),
});

const comparison = v.looseObject({
  measure: v.picklist(['mean', 'ratio', 'proportion', 'rank', 'spread']),
  method: text,
  question: v.picklist(['differs', 'higher', 'lower', 'equivalent', 'not-lower', 'not-higher']),
  confidence: number,
  against: number,
  margin: v.exactOptional(pair),
  matters: v.exactOptional(number),
  sigma: v.exactOptional(pair),
  success: v.exactOptional(text),
  curve: v.exactOptional(v.picklist(['normal-over-30'])),
  primary: v.exactOptional(text),
  seed: v.exactOptional(number),
  draws: v.exactOptional(number),
  thresholds: v.exactOptional(v.record(text, optionValue)),
  'ruled-out': v.exactOptional(texts),
  reasons: v.exactOptional(v.record(text, text)),
  sampling: text,
});

const changed = v.looseObject({ key: text, from: optionValue, to: optionValue, when: moment, reason: text });

const kept = v.looseObject({ difference: number, interval: v.exactOptional(pair), decision: text });

const result = v.looseObject({
  n: v.array(number),
  readings: v.exactOptional(v.array(number)),
  x: v.exactOptional(v.array(number)),
  mean: v.exactOptional(v.array(number)),
  sd: v.exactOptional(v.array(number)),
  difference: v.exactOptional(number),
  interval: v.exactOptional(pair),
  'statistic-name': v.exactOptional(text),
  statistic: v.exactOptional(number),
  df: v.exactOptional(v.union([number, pair])),
  p: v.exactOptional(number),
  decision: text,
  'depends-on-choice': v.picklist(['no', 'yes', 'on the line']),
  counted: texts,
  'with-left-out-kept': v.exactOptional(kept),
});

const record = v.looseObject({ id: text, replaces: text });

const by = v.looseObject({
  analyst: text,
  weighbeam: text,
  'method-version': line,
  looks: line,
  written: moment,
});

export const blockSchema = v.looseObject({
  purpose,
  data: v.exactOptional(v.array(data)),
  summary: v.exactOptional(v.array(summary)),
  groups,
  'left-out': v.exactOptional(v.array(leftOut)),
  comparison,
  changed: v.exactOptional(v.array(changed)),
  result: v.exactOptional(result),
  record: v.exactOptional(record),
  by,
});

/** Keys of each table in the order in which they are printed. */
export const KEY_ORDER: ReadonlyMap<string, readonly string[]> = new Map(
  Object.entries({
    purpose,
    data,
    summary,
    groups,
    'left-out': leftOut,
    comparison,
    changed,
    result,
    record,
    by,
  }).map(([table, schema]) => [table, Object.keys(schema.entries)] as const),
);

/** Keys whose values are printed as bare dates and times. */
export const MOMENT_KEYS: ReadonlySet<string> = new Set(['when', 'written']);

export type Block = v.InferOutput<typeof blockSchema>;
export type BlockData = v.InferOutput<typeof data>;
export type BlockSummary = v.InferOutput<typeof summary>;
export type BlockGroups = v.InferOutput<typeof groups>;
export type BlockLeftOut = v.InferOutput<typeof leftOut>;
export type BlockComparison = v.InferOutput<typeof comparison>;
export type BlockResult = v.InferOutput<typeof result>;

/** As written, without the fraction of a second that reading adds. */
export function momentText(value: TomlDate): string {
  return value.toISOString().replace(/\.000(?=$|[Z+-])/u, '');
}
