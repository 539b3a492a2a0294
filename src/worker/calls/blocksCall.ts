import type { Blocks } from '../../protocol/toWorker';
import { findBlocks } from '../../settings/findBlocks';
import { parseBlock } from '../../settings/parseBlock';
import { requestFrom } from '../../settings/requestFrom';
import type { Reply } from '../reply';

/** Finds every settings block of a text and the files each names; a block that cannot be read names none. */
export function blocksCall({ text }: Blocks): Promise<Reply<'blocksFound'>> {
  const blocks = findBlocks(text).map(({ firstLine, lastLine, text: blockText }) => ({
    firstLine,
    lastLine,
    files: filesOf(blockText, firstLine),
  }));
  return Promise.resolve({ type: 'blocksFound', blocks });
}

function filesOf(text: string, firstLine: number): readonly string[] {
  try {
    return requestFrom(parseBlock(text, firstLine).block).files;
  } catch {
    return []; // the recheck says why it cannot be read
  }
}
