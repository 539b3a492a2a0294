import { Refusal } from '../core/model/problem';
import { findBlocks, type FoundBlock } from '../settings/findBlocks';
import { parseBlock, type ParsedBlock } from '../settings/parseBlock';

/** Where a record of a notebook stands in the chain of those that replace one another. */
export interface HistoryEntry {
  /** First line of the block in the notebook. */
  readonly firstLine: number;
  /** Its record id; '' for a block without a record. */
  readonly id: string;
  /** First lines of the records it replaces, directly or through another, newest first. */
  readonly replaces: readonly number[];
  /** First lines of the records that name it as the one they replace. */
  readonly replacedBy: readonly number[];
  /** The id at which the chain leaves the notebook; null where it ends here. */
  readonly elsewhere: string | null;
}

/** The readable records of a notebook in the order of its lines, each with what it replaces and what replaces it. */
export function historyOf(notebook: string): readonly HistoryEntry[] {
  const records = findBlocks(notebook).flatMap(recordsOf);
  const byId = new Map(records.filter(({ id }) => id !== '').map(record => [record.id, record]));
  return records.map(record => {
    const chain: number[] = [];
    const seen = new Set([record.id]);
    let next = record.replaces;
    // A record cannot replace itself: text that says so was edited, and the chain ends there.
    for (let older = byId.get(next); older !== undefined && !seen.has(older.id); older = byId.get(next)) {
      chain.push(older.firstLine);
      seen.add(older.id);
      next = older.replaces;
    }
    return {
      firstLine: record.firstLine,
      id: record.id,
      replaces: chain,
      replacedBy: records
        .filter(({ id, replaces }) => record.id !== '' && replaces === record.id && id !== record.id)
        .map(({ firstLine }) => firstLine),
      elsewhere: next === NONE || byId.has(next) ? null : next,
    };
  });
}

const NONE = 'none';

interface RecordNamed {
  readonly firstLine: number;
  readonly id: string;
  readonly replaces: string;
}

function recordsOf({ text, firstLine }: FoundBlock): readonly RecordNamed[] {
  const parsed = readable(text, firstLine);
  if (parsed === null) return [];
  const { id = '', replaces = NONE } = parsed.block.record ?? {};
  return [{ firstLine, id, replaces }];
}

/** A block that cannot be read is told of by a recheck; the chain goes on without it. */
function readable(text: string, firstLine: number): ParsedBlock | null {
  try {
    return parseBlock(text, firstLine);
  } catch (error) {
    if (error instanceof Refusal) return null;
    throw error;
  }
}
