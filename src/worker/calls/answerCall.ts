import { answerFrom, type Answered } from '../../compare/answer';
import { changedAfterShown } from '../../compare/changedAfterShown';
import type { Request } from '../../compare/request';
import { requestOf } from '../../compare/session';
import type { Provenance } from '../../core/model/settings';
import type { Answer } from '../../protocol/toWorker';
import { jsonReport } from '../../report/json';
import { viewOf } from '../../report/view';
import { blockFrom, type Block } from '../../settings/block';
import { cellsDigest } from '../../settings/digests';
import { printBlock } from '../../settings/printBlock';
import { answerWhereRowsStand, rowsLeftOut } from '../answerWhereRowsStand';
import { changesKept } from '../changesKept';
import type { Sitting } from '../desk';
import { filesKey } from '../filesAtHand';
import { readingFacts } from '../readingFacts';
import type { Reply } from '../reply';
import { shelfKey } from '../shelf';

/** Compares, and makes everything a panel shows of it: sentences, printed numbers, figure, record. */
export async function answerCall(call: Answer, sitting: Sitting): Promise<Reply<'answered'>> {
  const { desk } = sitting;
  const request = requestOf(call.session);
  const answered = await answeredBy(call, request, sitting);
  const { comparison, table, files } = answered;
  const provenance: Provenance = {
    ...call.provenance,
    changed: changesKept(call.provenance.changed, changedAfterShown(call.session)),
  };
  const block =
    call.record && comparison.open.length === 0 ? recordOf(answered, provenance, call, sitting) : null;
  const blockText = block === null ? null : printBlock(block);
  const { t, version } = desk;
  return {
    type: 'answered',
    view: viewOf(comparison, { t, table, files, version, provenance, blockText }),
    blockText,
    readings: comparison.readings.map((reading, index) =>
      readingFacts(files[index]?.path ?? '', reading, table?.rows ?? 0),
    ),
    cells: cellsOf(block) ?? digestOf(answered, sitting),
    open: comparison.open,
    leaveOut: rowsLeftOut(answered, desk.platform.createHasher),
    numbers: call.numbers ? { ...jsonReport(comparison, t) } : null,
  };
}

/** The comparison; what was read for an earlier answer is used again while the files and what is needed of them are the same. */
async function answeredBy(call: Answer, request: Request, { desk, tick }: Sitting): Promise<Answered> {
  const { open, createHasher } = desk.platform;
  const kept = await desk.answers.get(
    shelfKey(filesKey(call.files, request.wish), readingPart(request)),
    async () => ({
      request,
      answered: await answerWhereRowsStand(call.files.map(open), request, { tick, createHasher }),
    }),
  );
  const { table } = kept.answered;
  if (kept.request === request) return kept.answered;
  const leaveOut = kept.answered.comparison.settings.leftOut; // where they were found
  return { ...kept.answered, comparison: answerFrom(table, { ...request, leaveOut }, tick) };
}

/** What asks something else of the same table; the rest decides which columns and rows are read. */
const askedOfTable: ReadonlySet<string> = new Set<keyof Request>([
  'question',
  'variance',
  'df',
  'curve',
  'sigma',
  'confidence',
  'against',
  'margin',
  'matters',
  'onlyChosen',
  'test',
  'reference',
  'same',
  'rows',
  'options',
]);

const readingPart = (request: Request): unknown =>
  Object.entries(request).filter(([key]) => !askedOfTable.has(key));

function recordOf(answered: Answered, provenance: Provenance, call: Answer, { desk }: Sitting): Block {
  const { version, platform } = desk;
  const stamp = { version, written: call.written, createHasher: platform.createHasher };
  return blockFrom(answered, provenance, stamp);
}

/** The digest that the record of one file holds already. */
const cellsOf = (block: Block | null): string | null =>
  block?.data?.length === 1 ? (block.data[0]?.cells ?? null) : null;

const digestOf = ({ table, comparison }: Answered, { desk }: Sitting): string =>
  table === null ? '' : cellsDigest(table, comparison.settings, desk.platform.createHasher);
