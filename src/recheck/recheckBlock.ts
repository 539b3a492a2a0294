import { answer, type Answered, type AnswerPlatform } from '../compare/answer';
import type { Request } from '../compare/request';
import { methodById, methods } from '../core/methods/index';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { Reason } from '../core/model/say';
import type { ByteSource } from '../readers/byteSource';
import { blockFrom, resultOf } from '../settings/block';
import { recordId } from '../settings/digests';
import type { Block, BlockResult } from '../settings/document';
import type { FoundBlock } from '../settings/findBlocks';
import { parseBlock, type ParsedBlock } from '../settings/parseBlock';
import { provenanceFrom, requestFrom } from '../settings/requestFrom';
import { conclusionOf } from './conclusion';
import { findLeftOut } from './findLeftOut';
import type { Outcome, OutcomeKind } from './outcome';
import { resultChanges } from './resultChanges';

/** Gives the file a block names, or null where there is none; refuses a path outside the root. */
export type Open = (path: string) => Promise<ByteSource | null>;

/**
 * Computes a settings block again and says what became of it. Never throws for what a notebook or a data file holds: what
 * cannot be computed is the outcome `blocked` with its reason. Throws Cancelled.
 */
export async function recheckBlock(
  found: FoundBlock,
  open: Open,
  platform: AnswerPlatform,
  list: readonly MethodDescriptor[] = methods,
): Promise<Outcome> {
  const nothing = {
    line: found.firstLine,
    firstLine: found.firstLine,
    changes: [],
    notes: [],
    reason: null,
    now: null,
  };
  try {
    const parsed = parseBlock(found.text, found.firstLine, list);
    const { result } = parsed.block;
    if (result === undefined) return { ...nothing, kind: 'planned', notes: unknownNote(parsed) };
    return { ...nothing, ...(await recomputed(parsed, result, open, platform, list)) };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const line =
      typeof error.facts['line'] === 'number' && error.code.startsWith('block-')
        ? error.facts['line']
        : found.firstLine;
    return { ...nothing, kind: 'blocked', line, reason: error };
  }
}

type Recomputed = Pick<Outcome, 'kind' | 'line' | 'changes' | 'notes' | 'now'>;

async function recomputed(
  parsed: ParsedBlock,
  was: BlockResult,
  open: Open,
  platform: AnswerPlatform,
  list: readonly MethodDescriptor[],
): Promise<Recomputed> {
  const { block, text, lineOf } = parsed;
  const sources = await openAll(block, open);
  const { answered, notes } = await answerAgain(block, was, sources, platform, list);
  const is = resultOf(answered.comparison, list);
  const changes = resultChanges(was, is);
  const now = blockFrom(answered, provenanceFrom(block), stampOf(block, platform), list);
  const sameData = (block.data ?? []).every(({ cells }, index) => cells === now.data?.[index]?.cells);
  const sameFiles = (block.data ?? []).every(({ sha256 }, index) => sha256 === now.data?.[index]?.sha256);
  const textHolds = block.record !== undefined && block.record.id === recordId(text, platform.createHasher);
  const kind = sameData
    ? kindOnSameData(changes.length === 0, textHolds, methodMoved(block, answered, list))
    : conclusionOf(was, block) === conclusionOf(is, block)
      ? 'moved'
      : 'turned';
  return {
    kind,
    line: changes[0] === undefined ? parsed.lineOf('') : lineOf(changes[0].key.replace(/\[\d+\]$/u, '')),
    changes,
    notes: [
      ...notes,
      ...(textHolds ? [] : [{ code: 'text-edited', facts: {} }]),
      ...(sameData && !sameFiles ? [{ code: 'file-changed', facts: {} }] : []),
      ...unknownNote(parsed),
    ],
    now: answered.comparison,
  };
}

function kindOnSameData(sameNumbers: boolean, textHolds: boolean, methodIsNewer: boolean): OutcomeKind {
  if (sameNumbers) return 'same';
  return textHolds && methodIsNewer ? 'reworked' : 'altered';
}

const methodMoved = (block: Block, { comparison }: Answered, list: readonly MethodDescriptor[]): boolean =>
  methodById(comparison.chosen.id, list)?.version !== block.by['method-version'];

async function openAll(block: Block, open: Open): Promise<readonly ByteSource[]> {
  const sources: ByteSource[] = [];
  for (const { file } of block.data ?? []) {
    const source = await open(file);
    if (source === null) throw new Refusal('file-not-found', { name: file }, file);
    sources.push(source);
  }
  return sources;
}

/** Asks the recipe of the block again: on its header line, else on the header line that the file itself shows. */
async function answerAgain(
  block: Block,
  was: BlockResult,
  sources: readonly ByteSource[],
  platform: AnswerPlatform,
  list: readonly MethodDescriptor[],
): Promise<{ readonly answered: Answered; readonly notes: readonly Reason[] }> {
  const request = requestFrom(block, list);
  const { header, ...wish } = request.wish;
  const ask = async (asked: Request) => {
    const leaveOut = await findLeftOut(
      block['left-out'] ?? [],
      asked.leaveOut ?? [],
      sources,
      asked.wish,
      platform,
    );
    const answered = await answer(sources, { ...asked, leaveOut }, platform, {
      counted: was.counted,
      methods: list,
    });
    const moved = leaveOut.some(({ line }, index) => line !== asked.leaveOut?.[index]?.line);
    return { answered, moved };
  };
  let tried;
  try {
    tried = await ask(request);
  } catch (error) {
    if (!(error instanceof Refusal) || header === undefined) throw error;
    tried = await ask({ ...request, wish }).catch(() => {
      throw error; // what is wrong under the recorded header says more than what is wrong under another
    });
  }
  const { answered, moved } = tried;
  const headerNow = answered.comparison.readings[0]?.headerLine;
  const headerMoved = header !== undefined && headerNow !== undefined && headerNow !== header;
  return { answered, notes: moved || headerMoved ? [{ code: 'lines-moved', facts: {} }] : [] };
}

const stampOf = (block: Block, { createHasher }: AnswerPlatform) => ({
  version: block.by.weighbeam,
  written: block.by.written,
  createHasher,
});

const unknownNote = ({ unknownKeys }: ParsedBlock): readonly Reason[] =>
  unknownKeys.length === 0 ? [] : [{ code: 'unknown-keys', facts: { keys: unknownKeys } }];
