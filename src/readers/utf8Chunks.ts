import { Refusal } from '../core/model/problem';
import { CR, LF } from './byteCodes';
import type { ByteSource } from './byteSource';
import { Utf8Check } from './utf8Check';
import { windows1252ToUtf8 } from './windows1252';

/** Thrown while reading a file as UTF-8 for want of a better: it is none. */
export class NotUtf8 extends Error {
  /** @param byte place of the byte that no UTF-8 has there, from 1 */
  constructor(
    readonly source: ByteSource,
    readonly byte: number,
  ) {
    super('not UTF-8');
    this.name = 'NotUtf8';
  }
}

interface Wanted {
  readonly encoding: string;
  /** Bytes of the byte order mark to pass over. */
  readonly skip: number;
  /** Whether UTF-8 was only presumed. */
  readonly presumed: boolean;
  readonly onBytes: (chunk: Uint8Array) => void;
}

/**
 * The text of a source as UTF-8 bytes, chunk by chunk; UTF-8 passes through untouched.
 * @throws Refusal encoding-invalid, file-binary; NotUtf8 where UTF-8 was only presumed
 */
export async function* utf8Chunks(source: ByteSource, wanted: Wanted): AsyncGenerator<Uint8Array> {
  const decode = decoderOf(wanted.encoding, source.name);
  const check = new Utf8Check();
  let skip = wanted.skip;
  for await (const chunk of source.chunks()) {
    wanted.onBytes(chunk);
    const passed = Math.min(skip, chunk.length);
    skip -= passed;
    const text = decode(chunk.subarray(passed), false);
    check.feed(text);
    await refuseInvalid(check, source, wanted);
    yield text;
  }
  const rest = decode(new Uint8Array(), true);
  check.feed(rest);
  check.end();
  await refuseInvalid(check, source, wanted);
  if (rest.length > 0) yield rest;
}

async function refuseInvalid(check: Utf8Check, source: ByteSource, wanted: Wanted): Promise<void> {
  const { encoding, skip, presumed } = wanted;
  if (check.invalidAt >= 0) {
    const byte = check.invalidAt + skip + 1;
    if (presumed) throw new NotUtf8(source, byte);
    throw new Refusal(
      'encoding-invalid',
      { encoding, byte, line: await lineOfByte(source, byte) },
      source.name,
    );
  }
  if (check.nulAt >= 0) {
    const byte = encoding === 'utf-8' ? check.nulAt + skip + 1 : null;
    const line = byte === null ? null : await lineOfByte(source, byte);
    throw new Refusal('file-binary', { byte, line }, source.name);
  }
}

/** The line on which the n-th byte (from 1) of a file stands. */
export async function lineOfByte(source: ByteSource, byte: number): Promise<number> {
  let line = 1;
  let left = byte - 1;
  let before = 0;
  for await (const chunk of source.chunks()) {
    for (const code of chunk.subarray(0, left)) {
      if (code === CR || (code === LF && before !== CR)) line++;
      before = code;
    }
    left -= chunk.length;
    if (left <= 0) break;
  }
  return line;
}

type Decode = (bytes: Uint8Array, last: boolean) => Uint8Array;

function decoderOf(encoding: string, name: string): Decode {
  if (encoding === 'utf-8') return bytes => bytes;
  if (encoding === 'windows-1252') return windows1252ToUtf8;
  const decoder = platformDecoder(encoding, name);
  const encoder = new TextEncoder();
  return (bytes, last) => {
    try {
      return encoder.encode(decoder.decode(bytes, { stream: !last }));
    } catch {
      throw new Refusal('encoding-invalid', { encoding, byte: null }, name);
    }
  };
}

function platformDecoder(encoding: string, name: string): TextDecoder {
  try {
    return new TextDecoder(encoding, { fatal: true, ignoreBOM: true });
  } catch {
    throw new Refusal('encoding-invalid', { encoding, byte: null }, name);
  }
}

/** The first bytes of a source as UTF-8; a character that was cut off at the end is left away or incomplete. */
export const utf8Head = (head: Uint8Array, encoding: string, skip: number, name: string): Uint8Array =>
  decoderOf(encoding, name)(head.subarray(skip), false);
