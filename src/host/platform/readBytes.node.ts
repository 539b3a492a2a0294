import { createReadStream, statSync } from 'node:fs';
import type { FileInput } from '../../protocol/files';
import { bytesSource, type ByteSource } from '../../readers/byteSource';

const CHUNK_BYTES = 1 << 20;

/** Streams a file from the disk; bytes that came with the message are used as they are. */
export function openFile(file: FileInput): ByteSource {
  const { path, name } = file;
  if (path === null) return bytesSource(name, file.bytes ?? new Uint8Array());
  return {
    name,
    size: statSync(path).size,
    chunks: () => createReadStream(path, { highWaterMark: CHUNK_BYTES }),
  };
}
