import { LAST_LINE } from './printBlock';

/** A settings block as it stands in a text, without indentation, quote marks or comment marks before its lines. */
export interface FoundBlock {
  /** Lines of the text, from 1. */
  readonly firstLine: number;
  readonly lastLine: number;
  /** LF, ending with LF; without its last line where the text ends or another block begins before it. */
  readonly text: string;
}

const BEGINS = /^(?<before>[\s>%*/|.;-]*)# weighbeam settings block, format \d+\s*$/u;

/** Every settings block of a text, in order. CR, LF and CRLF each end a line. */
export function findBlocks(text: string): readonly FoundBlock[] {
  const lines = text.split(/\r\n|\r|\n/u);
  const found: FoundBlock[] = [];
  for (let at = 0; at < lines.length; at += 1) {
    const before = BEGINS.exec(lines[at] ?? '')?.groups?.['before'];
    if (before === undefined) continue;
    const last = lastLineOf(lines, at);
    const inner = lines.slice(at, last + 1).map(line => withoutPrefix(line, before));
    found.push({ firstLine: at + 1, lastLine: last + 1, text: `${inner.join('\n')}\n` });
    at = last;
  }
  return found;
}

function lastLineOf(lines: readonly string[], first: number): number {
  for (let at = first + 1; at < lines.length; at += 1) {
    const line = lines[at] ?? '';
    if (line.trimEnd().endsWith(LAST_LINE)) return at;
    if (BEGINS.test(line)) return at - 1;
  }
  return lines.length - 1;
}

/** Mark by mark, as far as a line has them: editors trim the prefix of empty lines, and people indent again. */
function withoutPrefix(line: string, prefix: string): string {
  let bare = line.trimStart();
  for (const mark of prefix.replace(/\s/gu, '')) {
    if (!bare.startsWith(mark)) break;
    bare = bare.slice(mark.length).trimStart();
  }
  return bare.trimEnd();
}
