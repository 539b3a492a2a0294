/**
 * What was read, kept for the next question about the same files. The key holds the stamps of the files, so what is on
 * the shelf is never older than the file; what was not asked for longest goes first.
 */
export class Shelf<T> {
  private readonly kept = new Map<string, Promise<T>>();

  constructor(private readonly size: number) {}

  /**
   * What is kept under the key, or what `make` makes of it. A failure is not kept; one that befell another caller, who
   * may have given up, is not this one's: it makes its own.
   */
  get(key: string, make: () => Promise<T>): Promise<T> {
    const found = this.kept.get(key);
    if (found === undefined) return this.keep(key, make());
    this.kept.delete(key);
    this.kept.set(key, found);
    return found.catch(() => this.keep(key, make()));
  }

  private keep(key: string, value: Promise<T>): Promise<T> {
    this.kept.set(key, value);
    value.catch(() => {
      if (this.kept.get(key) === value) this.kept.delete(key);
    });
    for (const oldest of this.kept.keys()) {
      if (this.kept.size <= this.size) break;
      this.kept.delete(oldest);
    }
    return value;
  }
}

/** A key made of anything that can be written as JSON. */
export const shelfKey = (...parts: readonly unknown[]): string => JSON.stringify(parts);
