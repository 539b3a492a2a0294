import { createReadStream } from 'node:fs';
import { stat } from 'node:fs/promises';
import { Refusal } from '../core/model/problem';
import type { ByteSource } from '../readers/byteSource';

const chunkBytes = 1 << 20;

/** A file on disk, read in chunks each time it is asked for, so that its size does not matter; `name` is what blocks call it. */
export async function diskSource(file: string, name: string): Promise<ByteSource> {
  const found = await stat(file).catch(() => null);
  if (found === null || found.isDirectory()) throw new Refusal('file-not-found', { name }, name);
  return {
    name,
    size: found.isFile() ? found.size : null, // a pipe has no size
    async *chunks() {
      for await (const chunk of createReadStream(file, { highWaterMark: chunkBytes })) {
        if (chunk instanceof Uint8Array) yield chunk;
      }
    },
  };
}
