import type { Table } from '../core/model/cells';
import type { Comparison } from '../core/model/comparison';
import type { Hasher } from '../core/model/hasher';
import { Refusal, type Ticker } from '../core/model/problem';
import type { ByteSource } from '../readers/byteSource';
import { readTable } from '../readers/readTable';
import { scout, type Scouted } from '../readers/scout';
import { columnsNeeded } from './columnsNeeded';
import { compare, type CompareOptions } from './compare';
import { defaultsTaken } from './notes';
import type { Request } from './request';
import { settle } from './settle';

/** What the surface it runs on gives. */
export interface AnswerPlatform {
  readonly tick: Ticker;
  readonly createHasher: () => Hasher;
}

/** A file as it was when it was read. */
export interface FileRead {
  readonly path: string;
  readonly bytes: number;
  readonly sha256: string;
}

export interface Answered {
  readonly comparison: Comparison;
  /** null for typed numbers. */
  readonly table: Table | null;
  readonly files: readonly FileRead[];
}

/**
 * From bytes and a request to a comparison: the one way that every surface takes. Each file is looked at from its head,
 * then read once for the columns needed, hashed on the way. Throws Refusal, Cancelled.
 */
export async function answer(
  sources: readonly ByteSource[],
  request: Request,
  platform: AnswerPlatform,
  options: CompareOptions = {},
): Promise<Answered> {
  if (request.typed !== undefined) {
    return { comparison: answerFrom(null, request, platform.tick, options), table: null, files: [] };
  }
  const scouted: Scouted[] = [];
  for (const [file, source] of sources.entries()) scouted.push(await scout(source, request.wish, file));
  const wanted = {
    ...columnsIn(request, scouted[0], options),
    keepLines: new Set((request.leaveOut ?? []).map(({ line }) => line)),
  };
  const hashers = sources.map(() => platform.createHasher());
  const sizes = sources.map(() => 0);
  const table = await readTable(sources, scouted, wanted, {
    tick: platform.tick,
    onBytes: (file, chunk) => {
      hashers[file]?.update(chunk);
      sizes[file] = (sizes[file] ?? 0) + chunk.length;
    },
  });
  const files = request.files.map((path, file) => ({
    path,
    bytes: sizes[file] ?? 0,
    sha256: hashers[file]?.hex() ?? '',
  }));
  return { comparison: answerFrom(table, request, platform.tick, options), table, files };
}

/** The columns needed; one that is not there is missing from the line of the header. */
function columnsIn(
  request: Request,
  scouted: Scouted | undefined,
  { methods }: CompareOptions,
): ReturnType<typeof columnsNeeded> {
  try {
    return columnsNeeded(request, scouted?.fields ?? [], methods);
  } catch (error) {
    if (!(error instanceof Refusal) || scouted === undefined || scouted.reading.headerLine === 0) throw error;
    if (error.code !== 'column-unknown' && error.code !== 'column-ambiguous') throw error;
    throw new Refusal(error.code, error.facts, { file: 0, line: scouted.reading.headerLine, field: 0 });
  }
}

/** The same for a table that is already read: what a panel does when something is changed that needs no other column. */
export function answerFrom(
  table: Table | null,
  request: Request,
  tick: Ticker,
  options: CompareOptions = {},
): Comparison {
  const settings = settle(request, table, options.methods);
  const notes = [...(options.notes ?? []), ...defaultsTaken(request, settings)];
  const onlyChosen = options.onlyChosen ?? request.onlyChosen ?? false;
  return compare(table, settings, tick, { ...options, onlyChosen, notes });
}
