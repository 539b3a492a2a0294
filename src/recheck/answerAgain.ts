import { answer, type Answered, type AnswerPlatform } from '../compare/answer';
import type { Request } from '../compare/request';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { ByteSource } from '../readers/byteSource';
import type { ReadingWish } from '../readers/readingWish';
import { scout } from '../readers/scout';
import type { Block, BlockResult } from '../settings/document';
import { requestFrom } from '../settings/requestFrom';
import { findLeftOut } from './findLeftOut';
import { headerWishes } from './headerWishes';

export interface AnsweredAgain {
  readonly answered: Answered;
  /** The header or a left-out row stands on another line than when the block was written. */
  readonly linesMoved: boolean;
}

/**
 * Asks the recipe of a block of its files as they are now. The header and the rows left out are found again where lines
 * were put in above them; fixed ranges of lines move with the header. Throws Refusal, Cancelled.
 */
export async function answerAgain(
  block: Block,
  was: BlockResult,
  sources: readonly ByteSource[],
  platform: AnswerPlatform,
  list: readonly MethodDescriptor[],
): Promise<AnsweredAgain> {
  const recipe = requestFrom(block, list);
  let refused: Refusal | null = null;
  for (const wish of await headerWishes(recipe, sources, list)) {
    try {
      return await under(wish);
    } catch (error) {
      if (!(error instanceof Refusal)) throw error;
      refused ??= error;
    }
  }
  throw refused ?? new RangeError('no way of reading was tried');

  async function under(wish: ReadingWish): Promise<AnsweredAgain> {
    const moves = await headerMoves(block, sources, wish);
    const asked = movedBy(moves, { ...recipe, wish });
    const rows = block['left-out'] ?? [];
    const leaveOut = await findLeftOut(rows, asked.leaveOut ?? [], sources, wish, platform);
    const options = { counted: was.counted, methods: list };
    const answered = await answer(sources, { ...asked, leaveOut }, platform, options);
    const rowMoved = leaveOut.some(({ line }, index) => line !== recipe.leaveOut?.[index]?.line);
    return { answered, linesMoved: rowMoved || moves.some(move => move !== 0) };
  }
}

/** By how many lines the header of each file has moved down. */
async function headerMoves(
  { data = [] }: Block,
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
