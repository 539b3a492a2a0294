import { columnsNeeded } from '../compare/columnsNeeded';
import type { Request } from '../compare/request';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { ByteSource } from '../readers/byteSource';
import { scout } from '../readers/scout';

/** How far from its recorded line a header is looked for where the file itself does not show it. */
const NEARBY = 10;

/** A line on which the columns that a recipe names stand; undefined: where each file itself shows its header. */
type HeaderLine = number | undefined;

/**
 * The header lines under which a recipe can be asked again, the likeliest first: the recorded line, the line that the file
 * itself shows, else one nearby; each only where all the columns named stand in it. Falls back to the recorded line, so
 * that the refusal names what is missing there.
 */
export async function headerLines(
  request: Request,
  sources: readonly ByteSource[],
  list: readonly MethodDescriptor[],
): Promise<readonly HeaderLine[]> {
  const { header: recorded, ...wish } = request.wish;
  const fits = async (header: HeaderLine): Promise<boolean> => {
    try {
      for (const [file, source] of sources.entries()) {
        const { fields } = await scout(source, header === undefined ? wish : { ...wish, header }, file);
        columnsNeeded(request, fields, list);
      }
      return true;
    } catch (error) {
      if (error instanceof Refusal) return false;
      throw error;
    }
  };
  if (recorded === undefined) return [undefined];
  const found: HeaderLine[] = [];
  for (const header of [recorded, undefined]) if (await fits(header)) found.push(header);
  if (found.length > 0) return found;
  for (const header of nearby(recorded)) if (await fits(header)) return [header];
  return [recorded];
}

/** Lines around one, nearest first. */
const nearby = (line: number): readonly number[] =>
  Array.from({ length: NEARBY }, (_, index) => [line + index + 1, line - index - 1])
    .flat()
    .filter(at => at >= 1);
