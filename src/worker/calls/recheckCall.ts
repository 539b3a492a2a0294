import { Refusal } from '../../core/model/problem';
import type { Recheck } from '../../protocol/toWorker';
import type { ByteSource } from '../../readers/byteSource';
import type { Outcome } from '../../recheck/outcome';
import { recheckText } from '../../recheck/recheckText';
import { outcomeSentence } from '../../report/outcome';
import type { OutcomeShown } from '../../protocol/fromWorker';
import type { Desk, Sitting } from '../desk';
import type { Reply } from '../reply';

/** Rechecks every settings block of a text against the files that were found for it. */
export async function recheckCall(call: Recheck, { desk, tick }: Sitting): Promise<Reply<'rechecked'>> {
  const open = (path: string): Promise<ByteSource | null> => {
    const named = call.files.find(({ name }) => name === path);
    if (named?.outside === true)
      return Promise.reject(new Refusal('file-outside-root', { file: path }, path));
    const input = named?.input ?? null;
    return Promise.resolve(input === null ? null : desk.platform.open(input));
  };
  const outcomes: OutcomeShown[] = [];
  const platform = { tick, createHasher: desk.platform.createHasher };
  for await (const outcome of recheckText(call.text, open, platform)) outcomes.push(shown(outcome, desk));
  return { type: 'rechecked', outcomes };
}

const shown = (outcome: Outcome, { t }: Desk): OutcomeShown => ({
  kind: outcome.kind,
  firstLine: outcome.firstLine,
  line: outcome.line,
  sentence: outcomeSentence(outcome, t),
  changes: outcome.changes.map(({ key, was, is }) => ({ key, was: String(was), is: String(is) })),
});
