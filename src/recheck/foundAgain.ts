import type { AnswerPlatform } from '../compare/answer';
import type { Request } from '../compare/request';
import type { ByteSource } from '../readers/byteSource';
import type { ReadingWish } from '../readers/readingWish';
import { scout } from '../readers/scout';
import type { Block } from '../settings/document';
import { findLeftOut } from './findLeftOut';

export interface FoundAgain {
  readonly request: Request;
  /** The header or a left-out row stands on another line than when the block was written. */
  readonly linesMoved: boolean;
}

/**
 * The recipe of a block with every line it names where that line stands now, under one way of reading: the rows left out
 * are found by their digests, fixed ranges of lines move with the header. Throws Refusal, as 'left-out-row-gone'; Cancelled.
 */
export async function foundAgain(
  block: Pick<Block, 'data' | 'left-out'>,
  recipe: Request,
  sources: readonly ByteSource[],
  platform: AnswerPlatform,
): Promise<FoundAgain> {
  const moves = await headerMoves(block, sources, recipe.wish);
  const asked = movedBy(moves, recipe);
  const rows = block['left-out'] ?? [];
  const leaveOut = await findLeftOut(rows, asked.leaveOut ?? [], sources, recipe.wish, platform);
  const rowMoved = leaveOut.some(({ line }, index) => line !== recipe.leaveOut?.[index]?.line);
  return { request: { ...asked, leaveOut }, linesMoved: rowMoved || moves.some(move => move !== 0) };
}

/** By how many lines the header of each file has moved down. */
async function headerMoves(
  { data = [] }: Pick<Block, 'data'>,
  sources: readonly ByteSource[],
  wish: ReadingWish,
): Promise<readonly number[]> {
  const moves: number[] = [];
  for (const [file, source] of sources.entries()) {
    const { headerLine } = (await scout(source, wish, file)).reading;
    moves.push(headerLine - (data[file]?.header ?? headerLine));
  }
  return moves;
}

/** Lines are counted from the header: what was put in above it moved them all. Ranges hold for all files at once. */
function movedBy(moves: readonly number[], request: Request): Request {
  const [first = 0] = moves;
  const down = moves.every(move => move === first) ? first : 0;
  const leaveOut = request.leaveOut?.map(row => ({ ...row, line: row.line + (moves[row.file] ?? 0) }));
  return {
    ...request,
    ...(leaveOut === undefined ? {} : { leaveOut }),
    ...(request.rows === undefined
      ? {}
      : { rows: request.rows.map(([from, to]) => [from + down, to + down]) }),
  };
}
