import { methodById, methods } from '../core/methods/index';
import { evidenceChecks } from '../core/evidence/index';
import type { Answered } from '../compare/answer';
import type { Reading } from '../core/model/cells';
import type { Comparison } from '../core/model/comparison';
import type { Hasher } from '../core/model/hasher';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { Provenance, Settings } from '../core/model/settings';
import { MISSING_WORDS } from '../readers/readingWish';
import { holdNumbers } from './holdNumbers';
import { cellsDigest, recordId, rowDigest } from './digests';
import type { Block, BlockComparison, BlockData, BlockGroups, BlockLeftOut, BlockSummary } from './document';
import { printBlock } from './printBlock';
import { rangesText } from './ranges';
import { resultOf } from './resultOf';
import { thresholdKeys } from './optionKeys';

export type { Block } from './document';

/** Who wrote a record, when (ISO 8601 with offset), with which version. */
export interface Stamp {
  readonly version: string;
  readonly written: string;
  readonly createHasher: () => Hasher;
}

/**
 * The record of a comparison. Throws Refusal 'answer-needed' while a question of the data is open: a record is made of
 * what was decided, never of what was guessed; and 'number-unusable' for a setting that is no finite number, with its key.
 */
export function blockFrom(
  answered: Answered,
  provenance: Provenance,
  stamp: Stamp,
  list: readonly MethodDescriptor[] = methods,
): Block {
  const { comparison } = answered;
  if (comparison.open.length > 0) throw new Refusal('answer-needed', { open: comparison.open });
  const { settings } = comparison;
  const left = leftOutOf(answered, stamp);
  const { changed, replaces } = provenance;
  const block: Block = {
    purpose: { 'question-in-words': provenance.questionInWords, plan: provenance.plan ?? 'none' },
    ...(settings.layout.kind === 'typed'
      ? { summary: settings.layout.groups.map(summaryOf) }
      : { data: dataOf(answered, stamp) }),
    groups: groupsOf(comparison),
    ...(left.length === 0 ? {} : { 'left-out': left }),
    comparison: comparisonOf(settings, provenance),
    ...(changed.length === 0
      ? {}
      : { changed: changed.map(change => ({ ...change, from: plain(change.from), to: plain(change.to) })) }),
    result: resultOf(comparison, list),
    record: { id: '', replaces: replaces ?? 'none' },
    by: {
      analyst: provenance.analyst,
      weighbeam: stamp.version,
      'method-version': methodById(comparison.chosen.id, list)?.version ?? 0,
      looks: provenance.looks,
      written: stamp.written,
    },
  };
  holdNumbers(block);
  const id = recordId(printBlock(block), stamp.createHasher);
  return { ...block, record: { id, replaces: replaces ?? 'none' } };
}

/** The digest of the cells used of each file. */
export function cellsOf(
  { comparison, table, files }: Answered,
  createHasher: () => Hasher,
): readonly string[] {
  if (table === null) return [];
  return files.map((_, index) =>
    cellsDigest(table, comparison.settings, createHasher, files.length > 1 ? index : null),
  );
}

function dataOf(answered: Answered, { createHasher }: Stamp): BlockData[] {
  const { comparison, files } = answered;
  const { settings, readings } = comparison;
  const cells = cellsOf(answered, createHasher);
  const { reading } = settings;
  return files.map(({ path, bytes, sha256 }, index) => {
    const read = readings[index];
    const missing = read?.missingWords ?? reading.missing;
    return {
      file: path,
      bytes,
      sha256,
      cells: cells[index] ?? '',
      encoding: read?.encoding ?? reading.encoding,
      delimiter: read?.delimiter ?? reading.delimiter,
      decimal: read?.decimal ?? reading.decimal,
      ...(read === undefined || read.thousands === '' ? {} : { thousands: read.thousands }),
      header: read?.headerLine ?? reading.header,
      ...unitsRow(read),
      ...(read === undefined || read.footer.length === 0
        ? {}
        : { 'footer-left': read.footer.map(({ line, text }) => `${line}: ${text}`) }),
      ...(sameWords(missing, MISSING_WORDS) ? {} : { 'missing-words': [...missing] }),
      ...(reading.below === 'refuse' ? {} : { below: reading.below }),
      rows: rangesText(settings.rows),
      ...(settings.where.length === 0
        ? {}
        : { where: settings.where.map(([column, label]) => [column, label]) }),
    };
  });
}

const unitsRow = (read: Reading | undefined): Pick<BlockData, 'units-row'> =>
  read === undefined || read.unitsLine === null ? {} : { 'units-row': read.unitsLine };

function groupsOf({ settings, unit }: Comparison): BlockGroups {
  const { layout, relation, same, test, reference } = settings;
  return {
    ...(layout.kind === 'long' ? {} : { layout: layout.kind }),
    ...(layout.kind === 'long' ? { measured: [...layout.measured] } : {}),
    ...(layout.kind === 'files' ? { measured: [layout.measured] } : {}),
    ...(unit === null ? {} : { 'measured-in': unit }),
    ...(layout.kind === 'wide' ? { columns: [...layout.columns] } : {}),
    ...(layout.kind === 'long' || layout.kind === 'summary' ? { label: layout.label } : {}),
    ...(test === null ? {} : { test }),
    ...(reference === null ? {} : { reference }),
    ...(same.length === 0 ? {} : { merged: same.map(([from, to]) => [from, to]) }),
    ...(relation.kind === 'units' ? { per: [...relation.columns] } : {}),
    ...(relation.kind === 'rows' ? { 'rows-are': 'not stated' as const } : {}),
    ...(relation.kind === 'independent' ? { 'rows-are': 'independent' as const } : {}),
    ...(relation.kind === 'pairs' ? { pair: relation.column } : {}),
    ...(settings.numberingRestarts ? { numbering: 'starts again in each group' as const } : {}),
  };
}

function leftOutOf({ comparison, table, files }: Answered, { createHasher }: Stamp): BlockLeftOut[] {
  return comparison.leftOut.map(row => ({
    ...(files.length > 1 ? { file: files[row.file]?.path ?? '' } : {}),
    line: row.line,
    value: row.value,
    ...(row.unit.length === 0 ? {} : { unit: row.unit.map(([column, id]) => `${column} ${id}`).join(', ') }),
    'row-sha256': rowDigest(table?.cells(row.row) ?? [], createHasher),
    reason: row.reason,
    'after-result': row.afterResult,
  }));
}

function comparisonOf(settings: Settings, { sampling, reasons }: Provenance): BlockComparison {
  const thresholds = thresholdKeys(evidenceChecks);
  const { 'ruled-out': ruledOut, ...others } = settings.options;
  const options = Object.entries(others).map(([key, value]) => [key, plain(value)] as const);
  const set = options.filter(([key]) => thresholds.includes(key));
  return {
    measure: settings.measure,
    method: settings.method,
    question: settings.question,
    confidence: settings.confidence,
    against: settings.against,
    ...(settings.margin === null ? {} : { margin: [...settings.margin] }),
    ...(settings.matters === null ? {} : { matters: settings.matters }),
    ...Object.fromEntries(options.filter(([key]) => !thresholds.includes(key))),
    ...(typeof ruledOut === 'string' ? { 'ruled-out': idsOf(ruledOut) } : {}),
    ...(set.length === 0 ? {} : { thresholds: Object.fromEntries(set) }),
    ...(Object.keys(reasons).length === 0 ? {} : { reasons: { ...reasons } }),
    sampling: sampling === '' ? 'not stated' : sampling,
  };
}

const summaryOf = (
  group: { readonly label: string; readonly n: number } & (
    { readonly mean: number; readonly sd: number } | { readonly x: number }
  ),
): BlockSummary =>
  'x' in group
    ? { label: group.label, n: group.n, x: group.x }
    : {
        label: group.label,
        n: group.n,
        mean: group.mean,
        // One value has none.
        ...(Number.isNaN(group.sd) ? {} : { sd: group.sd }),
      };

/** Arrays of settings are readonly; those of a block are its own. */
const plain = (value: string | number | boolean | readonly number[]): string | number | boolean | number[] =>
  typeof value === 'object' ? [...value] : value;

/** Settings hold the ids as one text, a block one by one. */
const idsOf = (text: string): string[] =>
  text
    .split(',')
    .map(id => id.trim())
    .filter(id => id !== '');

const sameWords = (a: readonly string[], b: readonly string[]): boolean =>
  a.length === b.length && a.every((word, index) => word === b[index]);
