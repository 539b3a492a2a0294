import { answer, type Answered } from '../compare/answer';
import { patched } from '../compare/patched';
import type { Request } from '../compare/request';
import { methods } from '../core/methods/index';
import type { ByteSource } from '../readers/byteSource';
import type { ReadingWish } from '../readers/readingWish';
import { foundAgain } from '../recheck/foundAgain';
import { underEachHeader } from '../recheck/headerWishes';
import type { Said } from './compareRequest';
import type { Recipe } from './like';
import { platform } from './platform';
import { UsageError } from './usageError';

/**
 * Asks a recipe of the files named; what the command line says is laid over it. Of how to read, only what gives cells their
 * meaning goes with it: words for missing values, readings below a limit, and that there is no header. How a file is laid
 * out is its own, unless it is the very same file to the byte. Rows left out are rows of the recipe's files: there they are
 * found again by their digests, wherever they stand now, and to another file they are not carried. Throws Refusal,
 * UsageError.
 */
export async function likeAsked(
  recipe: Recipe,
  said: Said,
  wish: ReadingWish,
  sources: readonly ByteSource[],
): Promise<Answered> {
  const { block } = recipe;
  const files = sources.map(({ name }) => name);
  const isUnchanged = await sameBytes(recipe, sources);
  const isSame = isUnchanged || sameNames(recipe.request.files, files);
  const { header, below, missing, thousands, ...layout } = recipe.request.wish;
  const request: Request = {
    ...recipe.request,
    files,
    wish: {
      ...(isUnchanged ? layout : {}),
      ...(isUnchanged && thousands !== undefined && wish.decimal === undefined ? { thousands } : {}),
      ...(header === 0 || (isSame && header !== undefined) ? { header } : {}),
      ...(missing === undefined ? {} : { missing }),
      ...(below === undefined ? {} : { below }),
      ...wish,
    },
  };
  if (!isSame) {
    refuseOtherOrder(recipe, said, files);
    refuseOtherLines(recipe, said);
    return answer(sources, laidOver({ ...request, leaveOut: [] }, said), platform);
  }
  const { 'left-out': leftOut, ...others } = block;
  const keepsRows = said.leaveOut === undefined && leftOut !== undefined;
  const asked = keepsRows ? request : { ...request, leaveOut: [] };
  const under = async (read: ReadingWish): Promise<Answered> => {
    const found = await foundAgain(keepsRows ? block : others, { ...asked, wish: read }, sources, platform);
    return answer(sources, laidOver(found.request, said), platform);
  };
  if (wish.header !== undefined) return under(request.wish);
  return underEachHeader(laidOver(request, said), sources, methods, under);
}

function laidOver(request: Request, said: Said): Request {
  const over = patched(request, said);
  return over.options === undefined ? over : { ...over, options: { ...request.options, ...said.options } };
}

const sameNames = (one: readonly string[], other: readonly string[]): boolean =>
  one.length === other.length && one.every((name, index) => name === other[index]);

/** Whether every file is the one that the block was made of, to the byte, whatever it is called now. */
async function sameBytes({ block: { data = [] } }: Recipe, sources: readonly ByteSource[]): Promise<boolean> {
  if (data.length !== sources.length) return false;
  for (const [file, source] of sources.entries()) {
    const { bytes, sha256 } = data[file] ?? {};
    if (sha256 === undefined || bytes !== source.size || sha256 !== (await sha256Of(source))) return false;
  }
  return true;
}

async function sha256Of(source: ByteSource): Promise<string> {
  const hasher = platform.createHasher();
  for await (const chunk of source.chunks()) hasher.update(chunk);
  return hasher.hex();
}

/** Lines of one file say nothing of another. */
function refuseOtherLines({ request }: Recipe, said: Said): void {
  if (request.rows === undefined || said.rows !== undefined) return;
  const lines = request.rows.map(([from, to]) => `${from}-${to}`).join(',');
  throw new UsageError(
    `The block takes lines ${lines} of ${request.files.join(', ')}, which are other rows of another file`,
    'Say which lines are meant with --rows.',
  );
}

/** Of files in another order it cannot be said that they are other files, nor which rows were left out of which. */
function refuseOtherOrder({ block, request }: Recipe, said: Said, files: readonly string[]): void {
  const leavesOut = said.leaveOut === undefined && block['left-out'] !== undefined;
  if (!leavesOut || !request.files.some(name => files.includes(name))) return;
  throw new UsageError(
    `The block leaves rows out of ${request.files.join(', ')}; named are ${files.join(', ')}`,
    'Name the same files in the same order, or leave rows out anew with --leave-out.',
  );
}
