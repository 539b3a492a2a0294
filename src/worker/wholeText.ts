import type { ByteSource } from '../readers/byteSource';
import type { Scouted } from '../readers/scout';
import { utf8Chunks } from '../readers/utf8Chunks';

/**
 * The text of a file, decoded as its table was: what an editor shows. `encoding` is the one the table was read in, which
 * a byte far down may have made another than the head said.
 */
export async function wholeText(source: ByteSource, { skip }: Scouted, encoding: string): Promise<string> {
  const decoder = new TextDecoder('utf-8');
  const parts: string[] = [];
  const chunks = utf8Chunks(source, { encoding, skip, presumed: false, onBytes: () => undefined });
  for await (const chunk of chunks) parts.push(decoder.decode(chunk, { stream: true }));
  parts.push(decoder.decode());
  return parts.join('');
}
