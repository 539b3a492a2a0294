import type { AnswerPlatform } from '../compare/answer';
import { methodById, methods } from '../core/methods/index';
import type { Comparison } from '../core/model/comparison';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { Reason } from '../core/model/say';
import type { ByteSource } from '../readers/byteSource';
import { cellsOf } from '../settings/block';
import { recordId } from '../settings/digests';
import type { Block, BlockData, BlockResult } from '../settings/document';
import type { FoundBlock } from '../settings/findBlocks';
import { parseBlock, type ParsedBlock } from '../settings/parseBlock';
import { resultOf } from '../settings/resultOf';
import { answerAgain } from './answerAgain';
import { conclusionOf } from './conclusion';
import { holdPlan } from './holdPlan';
import type { Outcome, OutcomeChange, OutcomeKind } from './outcome';
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
  let files: readonly string[] = [];
  try {
    const parsed = parseBlock(found.text, found.firstLine, list);
    const { result, data = [] } = parsed.block;
    if (result === undefined) holdPlan(parsed, platform.createHasher);
    files = data.map(({ file }) => file);
    if (result === undefined) return { ...nothing, kind: 'planned', files, notes: unknownNote(parsed) };
    return { ...nothing, files, ...(await recomputed(parsed, result, open, platform, list)) };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const line =
      typeof error.facts['line'] === 'number' && error.code.startsWith('block-')
        ? error.facts['line']
        : found.firstLine;
    return { ...nothing, kind: 'blocked', line, files, reason: error };
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
  const { data = [] } = block;
  const sources = await openAll(data, open);
  const { answered, linesMoved } = await answerAgain(block, was, sources, platform, list);
  const { comparison, files } = answered;
  const is = resultOf(comparison, list);
  const textHolds = block.record?.id === recordId(text, platform.createHasher);
  const cells = cellsChanges(data, cellsOf(answered, platform.createHasher));
  const sameFiles = data.every(({ sha256 }, index) => sha256 === files[index]?.sha256);
  // The same bytes are the same data: other cells then come from an edited block, not from an edited file.
  const sameData = cells.length === 0 || sameFiles;
  const changes = [...resultChanges(was, is), ...(sameData && !textHolds ? cells : [])];
  return {
    kind: sameData
      ? kindOnSameData(changes.length === 0, textHolds, methodMoved(block, comparison, list))
      : conclusionOf(was, block) === conclusionOf(is, block)
        ? 'moved'
        : 'turned',
    line: lineOf((changes[0] ?? cells[0])?.key.replace(/\[\d+\]$/u, '') ?? ''),
    changes,
    notes: [
      ...noteIf(linesMoved, 'lines-moved'),
      ...noteIf(!textHolds, 'text-edited'),
      ...noteIf(sameData && !sameFiles, 'file-changed'),
      // Checks come and go with versions; on the data of the record its questions were answered.
      ...noteIf(!sameData && comparison.open.length > 0, 'questions-open', { ids: comparison.open }),
      ...unknownNote(parsed),
    ],
    now: comparison,
  };
}

/** The digests of the cells used that are not what the block says. */
const cellsChanges = (data: readonly BlockData[], cells: readonly string[]): readonly OutcomeChange[] =>
  data.flatMap(({ cells: was = '' }, index) => {
    const is = cells[index] ?? '';
    return was === is ? [] : [{ key: `data.${index}.cells`, was, is, change: null }];
  });

function kindOnSameData(sameNumbers: boolean, textHolds: boolean, methodIsNewer: boolean): OutcomeKind {
  if (sameNumbers) return 'same';
  return textHolds && methodIsNewer ? 'reworked' : 'altered';
}

const methodMoved = (block: Block, { chosen }: Comparison, list: readonly MethodDescriptor[]): boolean =>
  methodById(chosen.id, list)?.version !== block.by['method-version'];

async function openAll(data: readonly BlockData[], open: Open): Promise<readonly ByteSource[]> {
  const sources: ByteSource[] = [];
  for (const { file } of data) {
    const source = await open(file);
    if (source === null) throw new Refusal('file-not-found', { name: file }, file);
    sources.push(source);
  }
  return sources;
}

const noteIf = (holds: boolean, code: string, facts: Reason['facts'] = {}): readonly Reason[] =>
  holds ? [{ code, facts }] : [];

const unknownNote = ({ unknownKeys }: ParsedBlock): readonly Reason[] =>
  noteIf(unknownKeys.length > 0, 'unknown-keys', { keys: unknownKeys });
