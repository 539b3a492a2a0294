import { Refusal } from '../core/model/problem';
import type { ByteSource } from './byteSource';
import type { Scouted } from './scout';
import { lineOfByte } from './utf8Chunks';

/**
 * The same decisions with windows-1252 for a file that turned out to be no UTF-8: its head was plain ASCII, which both
 * read alike.
 * @param byte place of the byte that no UTF-8 has there, from 1
 */
export async function fallenBack(
  source: ByteSource,
  head: Scouted,
  byte: number,
  file: number,
): Promise<Scouted> {
  if (head.reading.encoding !== 'utf-8') throw new Refusal('encoding-invalid', { byte }, source.name);
  const line = await lineOfByte(source, byte);
  const encoding = 'windows-1252';
  const met = { what: 'encoding-fallback', at: { file, line, field: 0 }, text: encoding };
  return {
    ...head,
    presumedUtf8: false,
    reading: { ...head.reading, encoding, met: [met, ...head.reading.met] },
  };
}
