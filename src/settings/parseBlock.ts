import { parse, TomlDate, TomlError } from 'smol-toml';
import * as v from 'valibot';
import { evidenceChecks } from '../core/evidence/index';
import { methods } from '../core/methods/index';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import {
  blockSchema,
  KEY_ORDER,
  MOMENT_KEYS,
  momentText,
  optionValue,
  READ_KEYS,
  type Block,
} from './document';
import { keyLines, type LineOf } from './keyLines';
import { optionKeys } from './optionKeys';
import { FORMAT, LAST_LINE } from './printBlock';

export interface ParsedBlock {
  readonly block: Block;
  /** Line in the notebook of a key such as 'result.p' or 'left-out.0.line'; of its table, else of the block, where it is absent. */
  readonly lineOf: LineOf;
  /** Keys this version does not know, as 'table.key'. */
  readonly unknownKeys: readonly string[];
  /** The text as found, from which the record id is made again. */
  readonly text: string;
}

type Table = Readonly<Record<string, unknown>>;

const HEAD = /^# weighbeam settings block, format (?<format>\d+)$/u;

/**
 * Reads one block (as findBlocks gives it). `firstLine` is the line of the notebook on which it begins. Throws Refusal
 * 'block-newer-format', or 'block-not-readable' with what was expected and the line.
 */
export function parseBlock(
  text: string,
  firstLine: number,
  list: readonly MethodDescriptor[] = methods,
): ParsedBlock {
  const lines = text.split('\n');
  const format = HEAD.exec((lines[0] ?? '').trimEnd())?.groups?.['format'];
  if (format === undefined) throw unreadable(firstLine, 'the first line of a settings block', lines[0] ?? '');
  if (Number(format) > FORMAT) {
    throw new Refusal('block-newer-format', { format: Number(format), known: FORMAT }, `line ${firstLine}`);
  }
  if (!lines.some(line => line.trimEnd() === LAST_LINE)) {
    throw unreadable(firstLine, LAST_LINE, 'the end of the text');
  }
  const lineOf = keyLines(lines, firstLine);
  const block = blockOf(tables(text, firstLine), lineOf);
  const { method } = block.comparison;
  if (!list.some(({ id }) => id === method)) {
    throw unreadable(
      lineOf('comparison.method'),
      list.map(({ id }) => id).join(', '),
      method,
      'comparison.method',
    );
  }
  if (block.data === undefined && block.summary === undefined) {
    throw unreadable(firstLine, '[[data]] or [[summary]]', 'neither');
  }
  holdOptions(block, lineOf, list);
  if (block.result !== undefined) holdRead(block, lineOf);
  return { block, lineOf, unknownKeys: unknownKeys(block, list), text };
}

/**
 * The tables themselves once the schema holds them, not the schema's copy: that leaves out keys such as "constructor",
 * which a label or a reason may well be called.
 */
function blockOf(read: Table, lineOf: LineOf): Block {
  const document = withMomentTexts(read);
  const { success, issues } = v.safeParse(blockSchema, document);
  if (success) return document as Block;
  const [issue] = issues;
  const path = v.getDotPath(issue) ?? '';
  throw unreadable(lineOf(path), issue.expected ?? issue.message, issue.received, path);
}

function withMomentTexts(read: Table): Table {
  const { by, changed } = read;
  return {
    ...read,
    ...(by === undefined ? {} : { by: momentTexts(by) }),
    ...(changed === undefined
      ? {}
      : { changed: Array.isArray(changed) ? changed.map(momentTexts) : changed }),
  };
}

function momentTexts(table: unknown): unknown {
  if (typeof table !== 'object' || table === null || Array.isArray(table)) return table;
  const entries = Object.entries(table).map(([key, value]: [string, unknown]) => [
    key,
    value instanceof TomlDate && MOMENT_KEYS.has(key) ? momentText(value) : value,
  ]);
  return Object.fromEntries(entries);
}

/** The options that methods and evidence declare, by the list and not by the schema. */
function holdOptions({ comparison }: Block, lineOf: LineOf, list: readonly MethodDescriptor[]): void {
  for (const key of optionKeys(list, evidenceChecks)) {
    const read = v.safeParse(v.optional(optionValue), comparison[key]);
    if (read.success) continue;
    const [issue] = read.issues;
    throw unreadable(lineOf(`comparison.${key}`), issue.expected, issue.received, `comparison.${key}`);
  }
}

/** A result follows from bytes that were read: without what is known of them it cannot be held against anything. */
function holdRead({ data = [] }: Block, lineOf: LineOf): void {
  data.forEach((file, index) => {
    const absent = READ_KEYS.find(key => file[key] === undefined);
    if (absent !== undefined)
      throw unreadable(lineOf(`data.${index}`), absent, 'nothing', `data.${index}.${absent}`);
  });
}

function tables(text: string, firstLine: number): Table {
  try {
    return parse(text);
  } catch (error) {
    if (!(error instanceof TomlError)) throw error;
    const reason = error.message.split('\n')[0]?.replace(/^Invalid TOML document: /u, '') ?? '';
    throw unreadable(firstLine + error.line - 1, 'TOML 1.0', reason);
  }
}

const unreadable = (line: number, expected: string, found: string, key = ''): Refusal =>
  new Refusal('block-not-readable', { line, expected, found, key }, `line ${line}`);

function unknownKeys(block: Block, list: readonly MethodDescriptor[]): readonly string[] {
  const options = optionKeys(list, evidenceChecks);
  return Object.entries(block).flatMap(([table, value]) => {
    const known = KEY_ORDER.get(table);
    if (known === undefined) return [table];
    const items: readonly unknown[] = Array.isArray(value) ? value : [value];
    const keys = items.flatMap(item => Object.keys(item as object));
    const strange = keys.filter(key => !known.includes(key) && !(table === 'comparison' && options.has(key)));
    return [...new Set(strange)].map(key => `${table}.${key}`);
  });
}
