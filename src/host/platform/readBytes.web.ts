import type { FileInput } from '../../protocol/files';
import { bytesSource, type ByteSource } from '../../readers/byteSource';

/** There is no disk: the bytes always come with the message. */
export function openFile(file: FileInput): ByteSource {
  return bytesSource(file.name, file.bytes ?? new Uint8Array());
}
