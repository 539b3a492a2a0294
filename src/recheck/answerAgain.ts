import { answer, type Answered, type AnswerPlatform } from '../compare/answer';
import type { MethodDescriptor } from '../core/model/methods';
import type { ByteSource } from '../readers/byteSource';
import type { Block, BlockResult } from '../settings/document';
import { requestFrom } from '../settings/requestFrom';
import { foundAgain } from './foundAgain';
import { underEachHeader } from './headerWishes';

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
  return underEachHeader(recipe, sources, list, async wish => {
    const { request, linesMoved } = await foundAgain(block, { ...recipe, wish }, sources, platform);
    const options = { counted: was.counted, methods: list };
    return { answered: await answer(sources, request, platform, options), linesMoved };
  });
}
