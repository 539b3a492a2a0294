import { Refusal } from '../core/model/problem';
import type { ByteSource } from './byteSource';
import { decideEncoding, type EncodingChoice } from './encoding';
import { utf8Head } from './utf8Chunks';

const HEAD_BYTES = 1 << 18;

export interface HeadBytes {
  /** UTF-8. */
  readonly bytes: Uint8Array;
  /** Whether they are the whole file. */
  readonly whole: boolean;
  readonly choice: EncodingChoice;
  /** Line of the first byte that is no UTF-8, when windows-1252 was taken for want of a better. */
  readonly fallbackLine: number;
}

/**
 * The first bytes of a file as UTF-8; `file` is its index, for problems.
 * @throws Refusal file-empty, file-binary, encoding-invalid
 */
export async function readHead(
  source: ByteSource,
  encoding: string | undefined,
  file: number,
): Promise<HeadBytes> {
  const parts: Uint8Array[] = [];
  let length = 0;
  let whole = true;
  for await (const chunk of source.chunks()) {
    const part = chunk.slice(0, HEAD_BYTES - length);
    parts.push(part);
    length += part.length;
    whole = part.length === chunk.length;
    if (!whole || length >= HEAD_BYTES) break;
  }
  if (whole && length >= HEAD_BYTES) whole = source.size === length;
  const head = new Uint8Array(length);
  let filled = 0;
  for (const part of parts) {
    head.set(part, filled);
    filled += part.length;
  }
  if (length === 0) throw new Refusal('file-empty', { name: source.name }, source.name);
  const choice = decideEncoding(head, encoding);
  if (choice === null)
    throw new Refusal(
      'file-binary',
      { name: source.name, byte: head.indexOf(0), line: lineOfFirst(head, byte => byte === 0) },
      { file, line: lineOfFirst(head, byte => byte === 0), field: 0 },
    );
  const bytes = utf8Head(head, choice.encoding, choice.skip, source.name);
  return { bytes, whole, choice, fallbackLine: choice.fallback ? lineOfFirst(head, byte => byte > 0x7f) : 0 };
}

function lineOfFirst(bytes: Uint8Array, wanted: (byte: number) => boolean): number {
  const place = bytes.findIndex(wanted);
  return new TextDecoder('latin1').decode(bytes.subarray(0, place)).split(/\r\n|\r|\n/).length;
}
