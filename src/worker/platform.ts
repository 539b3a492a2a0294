import type { Hasher } from '../core/model/hasher';
import type { ByteSource } from '../readers/byteSource';
import type { FileInput } from '../protocol/files';

/** What the worker needs of the machine it runs on. */
export interface WorkerPlatform {
  /** The bytes of a file: streamed from its path where there is a disk, or those that came with the message. */
  readonly open: (file: FileInput) => ByteSource;
  readonly createHasher: () => Hasher;
}
