import { Refusal } from '../../core/model/problem';
import type { Locate } from '../../protocol/toWorker';
import { locate } from '../../readers/locate';
import type { Sitting } from '../desk';
import { scoutFiles, textOf } from '../filesAtHand';
import type { Reply } from '../reply';

/** Finds a cell in the text of its file. A line that is no row, such as a totals row, is marked as far as it goes. */
export async function locateCall(call: Locate, { desk, tick }: Sitting): Promise<Reply<'located'>> {
  const wish = call.request.wish ?? {};
  const file = call.files[call.file];
  if (file === undefined) throw new Refusal('row-unknown', { line: call.line });
  const [scouted] = await scoutFiles(desk, [file], wish);
  const text = await textOf(desk, file, wish, tick);
  const delimiter = scouted?.reading.delimiter ?? ',';
  const place = locate(text, call.line, call.field, delimiter) ?? locate(text, call.line, 0, delimiter);
  return { type: 'located', ...(place ?? { line: call.line, startColumn: 1, endColumn: 1 }) };
}
