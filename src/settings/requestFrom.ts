import { evidenceChecks } from '../core/evidence/index';
import { methods } from '../core/methods/index';
import type { MethodDescriptor } from '../core/model/methods';
import type { Count, Summary } from '../core/model/groups';
import type { LeftOut, OptionValue, Provenance } from '../core/model/settings';
import type { Request } from '../compare/request';
import type { ReadingWish } from '../readers/readingWish';
import type { Block, BlockData, BlockSummary } from './document';
import { optionKeys } from './optionKeys';
import { rangesOf } from './ranges';

/** The recipe of a block: what a recheck, --like and a restored panel ask again. */
export function requestFrom(block: Block, list: readonly MethodDescriptor[] = methods): Request {
  const { comparison, data = [], summary } = block;
  const { margin, matters, sigma, success, curve } = comparison;
  const rows = rangesOf(data[0]?.rows ?? 'all');
  return {
    files: data.map(({ file }) => file),
    wish: wishOf(data),
    ...(summary === undefined ? {} : { typed: summary.map(typedGroup) }),
    ...layoutPart(block),
    ...(rows === 'all' ? {} : { rows }),
    ...(data[0]?.where === undefined ? {} : { where: data[0].where }),
    leaveOut: leftOutOf(block),
    measure: comparison.measure,
    method: comparison.method,
    question: comparison.question,
    confidence: comparison.confidence,
    against: comparison.against,
    ...(margin === undefined ? {} : { margin }),
    ...(matters === undefined ? {} : { matters }),
    ...(sigma === undefined ? {} : { sigma }),
    ...(success === undefined ? {} : { success }),
    ...(curve === undefined ? {} : { curve }),
    options: optionsOf(block, list),
  };
}

/** What a block says of its own making, as it goes on into the next one. */
export function provenanceFrom(block: Block): Provenance {
  const { purpose, comparison, by, record } = block;
  return {
    questionInWords: purpose['question-in-words'],
    sampling: comparison.sampling,
    analyst: by.analyst,
    reasons: comparison.reasons ?? {},
    changed: block.changed ?? [],
    looks: by.looks,
    plan: purpose.plan === 'none' ? null : purpose.plan,
    replaces: record === undefined || record.replaces === 'none' ? null : record.replaces,
  };
}

/**
 * How all files are read. Where two files were read in different ways, each showed its own: nobody had said how, so it is
 * left to the files again.
 */
function wishOf(data: readonly BlockData[]): ReadingWish {
  const [first, ...others] = data.map(wishOfFile);
  if (first === undefined) return {};
  const agreed = (key: keyof ReadingWish): boolean =>
    others.every(other => sameValue(other[key], first[key]));
  return Object.fromEntries(Object.entries(first).filter(([key]) => agreed(key as keyof ReadingWish)));
}

function wishOfFile(data: BlockData): ReadingWish {
  const { encoding, delimiter, decimal, thousands, header, below } = data;
  const missing = data['missing-words'];
  return {
    ...(encoding === undefined ? {} : { encoding }),
    ...(delimiter === undefined ? {} : { delimiter }),
    // A file that was read names its decimal mark, and a thousands mark if it has one.
    ...(decimal === undefined ? {} : { decimal, thousands: thousands ?? '' }),
    ...(header === undefined ? {} : { header }),
    ...(missing === undefined ? {} : { missing }),
    ...(below === undefined ? {} : { below }),
  };
}

type WishValue = ReadingWish[keyof ReadingWish];

const sameValue = (a: WishValue, b: WishValue): boolean =>
  a === b ||
  (typeof a === 'object' &&
    typeof b === 'object' &&
    a.length === b.length &&
    a.every((word, index) => word === b[index]));

function layoutPart({ groups }: Block): Partial<Request> {
  const { layout, measured, columns, label, test, reference, merged, per, pair } = groups;
  return {
    ...(measured === undefined ? {} : { measured }),
    ...(columns === undefined ? {} : { columns }),
    ...(label === undefined ? {} : { label }),
    ...(layout === 'summary' ? { summary: true } : {}),
    ...(test === undefined ? {} : { test }),
    ...(reference === undefined ? {} : { reference }),
    ...(merged === undefined ? {} : { same: merged }),
    ...(groups['rows-are'] === 'independent' ? { per: 'none' as const } : per === undefined ? {} : { per }),
    ...(groups.numbering !== undefined ? { pair: 'none' } : pair === undefined ? {} : { pair }),
  };
}

function leftOutOf(block: Block): readonly LeftOut[] {
  const files = (block.data ?? []).map(({ file }) => file);
  return (block['left-out'] ?? []).map(row => ({
    file: row.file === undefined ? 0 : Math.max(0, files.indexOf(row.file)),
    line: row.line,
    reason: row.reason,
    afterResult: row['after-result'],
    digest: row['row-sha256'],
  }));
}

/** Options that go with more than one method. */
const GENERAL = ['primary', 'seed', 'draws'];

/** These are asked by a word of their own; said twice, one could be changed and the other stay. */
const isNoWordOfItsOwn = (key: string): boolean => !['sigma', 'success', 'curve'].includes(key);

function optionsOf(
  { comparison }: Block,
  list: readonly MethodDescriptor[],
): Readonly<Record<string, OptionValue>> {
  const keys = new Set<string>([...GENERAL, ...optionKeys(list, evidenceChecks)].filter(isNoWordOfItsOwn));
  const named = Object.entries(comparison).filter(([key]) => keys.has(key)) as [string, OptionValue][];
  const ruledOut = comparison['ruled-out'];
  return {
    ...Object.fromEntries(named),
    ...(ruledOut === undefined ? {} : { 'ruled-out': ruledOut.join(',') }),
    ...comparison.thresholds,
  };
}

function typedGroup({ label, n, mean, sd, x }: BlockSummary): Summary | Count {
  return x === undefined ? { label, n, mean: mean ?? NaN, sd: sd ?? NaN } : { label, x, n };
}
