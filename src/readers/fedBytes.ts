import type { Ticker } from '../core/model/problem';
import type { ByteSource } from './byteSource';

/** Hands on every byte of every file once, also where a file must be read again, and says how far reading is. */
export class FedBytes {
  private readonly handed: number[];
  private readonly seen: number[];
  private readonly total: number;

  constructor(
    sources: readonly ByteSource[],
    private readonly options: {
      readonly tick?: Ticker;
      readonly onBytes?: (file: number, chunk: Uint8Array) => void;
    },
  ) {
    this.handed = sources.map(() => 0);
    this.seen = sources.map(() => 0);
    this.total = sources.reduce((sum, { size }) => sum + (size ?? 0), 0);
  }

  take(file: number, chunk: Uint8Array): void {
    const start = this.seen[file] ?? 0;
    const handed = this.handed[file] ?? 0;
    const end = start + chunk.length;
    this.seen[file] = end;
    if (end > handed) {
      this.options.onBytes?.(file, chunk.subarray(Math.max(0, handed - start)));
      this.handed[file] = end;
    }
    const done = this.seen.reduce((sum, bytes) => sum + bytes, 0);
    this.options.tick?.(done, Math.max(done, this.total));
  }

  /** Reading starts again from the first byte of the first file. */
  again(): void {
    this.seen.fill(0);
  }
}
