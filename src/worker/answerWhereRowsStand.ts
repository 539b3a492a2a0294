import { answer, type Answered, type AnswerPlatform } from '../compare/answer';
import type { Request } from '../compare/request';
import type { LeftOut } from '../core/model/settings';
import { Refusal } from '../core/model/problem';
import type { ByteSource } from '../readers/byteSource';
import { findLeftOut } from '../recheck/findLeftOut';
import { rowDigest } from '../settings/digests';

/**
 * Compares, with the rows left out taken where they stand now: a file that was changed since may have another row on
 * their line. Throws Refusal, as 'left-out-row-gone' for a row that is not there any more; Cancelled.
 */
export async function answerWhereRowsStand(
  sources: readonly ByteSource[],
  request: Request,
  platform: AnswerPlatform,
): Promise<Answered> {
  let refused: Refusal | null = null;
  try {
    const answered = await answer(sources, request, platform);
    if (isAsMeant(answered, request.leaveOut ?? [], platform)) return answered;
  } catch (error) {
    // The line of a row that has moved may hold text, or no row at all.
    if (!(error instanceof Refusal) || !(request.leaveOut ?? []).some(isKnown)) throw error;
    refused = error;
  }
  const leaveOut = await whereTheyStand(sources, request, platform);
  const moved = leaveOut.some(({ line }, index) => line !== request.leaveOut?.[index]?.line);
  if (refused !== null && !moved) throw refused;
  return answer(sources, { ...request, leaveOut }, platform);
}

/** The rows left out in an answer, in the order asked, each with its digest. */
export const rowsLeftOut = (
  { comparison, table }: Answered,
  createHasher: AnswerPlatform['createHasher'],
): readonly LeftOut[] =>
  comparison.leftOut.map(({ file, line, reason, afterResult, row }) => ({
    file,
    line,
    reason,
    afterResult,
    digest: rowDigest(table?.cells(row) ?? [], createHasher),
  }));

const isKnown = (row: LeftOut): row is LeftOut & { readonly digest: string } => row.digest !== undefined;

function isAsMeant(answered: Answered, asked: readonly LeftOut[], { createHasher }: AnswerPlatform): boolean {
  const now = rowsLeftOut(answered, createHasher);
  return asked.every((row, index) => !isKnown(row) || row.digest === now[index]?.digest);
}

/** A row of which only the line is known was left out a moment ago, in this very text. */
async function whereTheyStand(
  sources: readonly ByteSource[],
  { leaveOut = [], wish }: Request,
  platform: AnswerPlatform,
): Promise<readonly LeftOut[]> {
  const known = leaveOut.filter(isKnown);
  // One that is gone is named by its reason: what its cell held is not known any more.
  const rows = known.map(({ digest, reason }) => ({ 'row-sha256': digest, value: reason }));
  const found = await findLeftOut(rows, known, sources, wish, platform);
  const left = [...found];
  return leaveOut.map(row => (isKnown(row) ? (left.shift() ?? row) : row));
}
