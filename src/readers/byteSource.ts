/** Where bytes come from: a file on a disk, an editor's text, a message. Can be read more than once. */
export interface ByteSource {
  /** Relative to the root, '/' separated; what problems name. */
  readonly name: string;
  /** null: not known before it is read. */
  readonly size: number | null;
  chunks(): AsyncIterable<Uint8Array>;
}

const CHUNK_BYTES = 1 << 20;

/** A source whose bytes are all there. */
export const bytesSource = (name: string, bytes: Uint8Array): ByteSource => ({
  name,
  size: bytes.length,
  chunks: () => slices(bytes),
});

// eslint-disable-next-line @typescript-eslint/require-await -- an AsyncIterable is what a disk gives; this one never waits
async function* slices(bytes: Uint8Array): AsyncGenerator<Uint8Array> {
  for (let at = 0; at < bytes.length; at += CHUNK_BYTES) yield bytes.subarray(at, at + CHUNK_BYTES);
}
