import type { Restore } from '../../protocol/toWorker';
import { parseBlock } from '../../settings/parseBlock';
import { provenanceFrom } from '../../settings/requestFrom';
import type { Reply } from '../reply';

/** What a settings block says of its own making. */
export function restoreCall({ blockText }: Restore): Promise<Reply<'restored'>> {
  const { block } = parseBlock(blockText, 1);
  return Promise.resolve({
    type: 'restored',
    provenance: provenanceFrom(block),
  });
}
