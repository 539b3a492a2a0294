import { readFile } from 'node:fs/promises';
import path from 'node:path';
import type { Request } from '../compare/request';
import { Refusal } from '../core/model/problem';
import type { Block } from '../settings/document';
import { findBlocks } from '../settings/findBlocks';
import { parseBlock } from '../settings/parseBlock';
import { requestFrom } from '../settings/requestFrom';
import { UsageError } from './usageError';

/** Takes "NOTE.md:31" apart; the line is that of any line of the block. */
export function placeOf(like: string): { readonly note: string; readonly line: number | null } {
  const found = /^(.+):(\d+)$/.exec(like);
  return found === null ? { note: like, line: null } : { note: found[1] ?? like, line: Number(found[2]) };
}

/** A block, what it says to do, and the question it was done for. */
export interface Recipe {
  readonly block: Block;
  readonly request: Request;
  readonly purpose: string;
}

/**
 * The recipe of a block in a notebook. A notebook with several blocks needs the line. Throws a UsageError for a
 * notebook or line without a block, a Refusal for a block that cannot be read.
 */
export async function recipeOf(like: string, cwd: string): Promise<Recipe> {
  const { note, line } = placeOf(like);
  const text = await readFile(path.resolve(cwd, note), 'utf8').catch(() => {
    throw new Refusal('file-not-found', { name: note }, note);
  });
  const found = findBlocks(text);
  const lines = found.map(({ firstLine }) => firstLine).join(', ');
  if (found.length === 0)
    throw new UsageError(`There is no settings block in ${note}`, 'Name a notebook that holds one.');
  if (line === null && found.length > 1) {
    throw new UsageError(
      `${note} holds ${found.length} settings blocks, from lines ${lines}`,
      `Add the line of the one you mean, as --like ${note}:${found[0]?.firstLine ?? 1}.`,
    );
  }
  const block =
    line === null ? found[0] : found.find(({ firstLine, lastLine }) => firstLine <= line && line <= lastLine);
  if (block === undefined) {
    throw new UsageError(
      `No settings block of ${note} is at line ${line ?? 1}`,
      `Its blocks start at lines ${lines}.`,
    );
  }
  const parsed = parseBlock(block.text, block.firstLine).block;
  return { block: parsed, request: requestFrom(parsed), purpose: parsed.purpose['question-in-words'] };
}
