import type { AnswerPlatform } from '../compare/answer';
import { findBlocks } from '../settings/findBlocks';
import { historyOf } from './history';
import type { Outcome } from './outcome';
import { recheckBlock, type Open } from './recheckBlock';

/**
 * Rechecks every settings block of a notebook's text, one after the other in the order of its lines. A record that
 * another one of the same notebook replaces says so in a note. Throws Cancelled.
 */
export async function* recheckText(
  text: string,
  open: Open,
  platform: AnswerPlatform,
): AsyncGenerator<Outcome> {
  const replacedBy = new Map(historyOf(text).map(entry => [entry.firstLine, entry.replacedBy]));
  for (const found of findBlocks(text)) {
    const outcome = await recheckBlock(found, open, platform);
    const lines = replacedBy.get(found.firstLine) ?? [];
    yield lines.length === 0
      ? outcome
      : { ...outcome, notes: [...outcome.notes, { code: 'replaced', facts: { lines } }] };
  }
}
