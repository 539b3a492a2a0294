import { columnsNeeded } from '../compare/columnsNeeded';
import type { Request } from '../compare/request';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { ByteSource } from '../readers/byteSource';
import type { ReadingWish } from '../readers/readingWish';
import { scout } from '../readers/scout';

/** How far from its recorded line a header is looked for where the file itself does not show it. */
const NEARBY = 10;

/**
 * What `attempt` gives under the first way of reading (see headerWishes) that it does not refuse; where it refuses all, the
 * refusal of the likeliest is thrown.
 */
export async function underEachHeader<Given>(
  request: Request,
  sources: readonly ByteSource[],
  list: readonly MethodDescriptor[],
  attempt: (wish: ReadingWish) => Promise<Given>,
): Promise<Given> {
  let refused: Refusal | null = null;
  for (const wish of await headerWishes(request, sources, list)) {
    try {
      return await attempt(wish);
    } catch (error) {
      if (!(error instanceof Refusal)) throw error;
      refused ??= error;
    }
  }
  throw refused ?? new RangeError('no way of reading was tried');
}

/**
 * The ways of reading under which a recipe can be asked again, the likeliest first: with the header on its recorded line,
 * on the line that the file itself shows, else on one nearby; each only where all the columns named stand in that line.
 * Falls back to the recorded line, so that the refusal names what is missing there.
 */
async function headerWishes(
  request: Request,
  sources: readonly ByteSource[],
  list: readonly MethodDescriptor[],
): Promise<readonly ReadingWish[]> {
  const { header, ...shown } = request.wish;
  const fits = async (wish: ReadingWish): Promise<boolean> => {
    try {
      for (const [file, source] of sources.entries()) {
        columnsNeeded(request, (await scout(source, wish, file)).fields, list);
      }
      return true;
    } catch (error) {
      if (error instanceof Refusal) return false;
      throw error;
    }
  };
  if (header === undefined) return [shown];
  const found: ReadingWish[] = [];
  for (const wish of [request.wish, shown]) if (await fits(wish)) found.push(wish);
  if (found.length > 0) return found;
  for (const line of nearby(header))
    if (await fits({ ...shown, header: line })) return [{ ...shown, header: line }];
  return [request.wish];
}

/** Lines around one, nearest first. */
const nearby = (line: number): readonly number[] =>
  Array.from({ length: NEARBY }, (_, index) => [line + index + 1, line - index - 1])
    .flat()
    .filter(at => at >= 1);
