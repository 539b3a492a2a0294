import type { Restore } from '../../protocol/toWorker';
import { parseBlock } from '../../settings/parseBlock';
import { provenanceFrom, requestFrom } from '../../settings/requestFrom';
import type { Reply } from '../reply';

/** The recipe that a settings block holds, and what it says of its own making. */
export function restoreCall({ blockText }: Restore): Promise<Reply<'restored'>> {
  const { block } = parseBlock(blockText, 1);
  return Promise.resolve({
    type: 'restored',
    request: requestFrom(block),
    provenance: provenanceFrom(block),
  });
}
