const FIRST_SLOTS = 64;
const FIRST_BYTES = 1024;

/** The different texts of a column, numbered in order of first appearance; number 0 is the empty text. */
export class Levels {
  private count = 1;
  private bytes = new Uint8Array(FIRST_BYTES);
  private used = 0;
  /** Level i stands in bytes from ends[i − 1] to ends[i]. */
  private ends = new Int32Array(FIRST_SLOTS);
  private hashes = new Int32Array(FIRST_SLOTS);
  /** Open addressing: level of each slot, 0 for none. */
  private slots = new Int32Array(FIRST_SLOTS * 2);

  get size(): number {
    return this.count;
  }

  /** The number of this text; a new text gets the next one. */
  codeOf(bytes: Uint8Array, start: number, end: number): number {
    let hash = 0;
    for (let at = start; at < end; at++) hash = (Math.imul(hash, 31) + (bytes[at] as number)) | 0;
    hash = Math.imul(hash ^ (hash >>> 15), 0x2c1b3c6d);
    const mask = this.slots.length - 1;
    let slot = (hash ^ (hash >>> 12)) & mask;
    for (;;) {
      const level = this.slots[slot] as number;
      if (level === 0) return this.add(bytes, start, end, hash, slot);
      if (this.hashes[level] === hash && this.isSame(level, bytes, start, end)) return level;
      slot = (slot + 1) & mask;
    }
  }

  /** All texts, by number. */
  texts(): readonly string[] {
    const decoder = new TextDecoder('utf-8', { ignoreBOM: true });
    return Array.from({ length: this.count }, (_, level) =>
      level === 0 ? '' : decoder.decode(this.bytes.subarray(this.ends[level - 1], this.ends[level])),
    );
  }

  private isSame(level: number, bytes: Uint8Array, start: number, end: number): boolean {
    const own = this.ends[level - 1] as number;
    if ((this.ends[level] as number) - own !== end - start) return false;
    for (let i = 0; i < end - start; i++) if (this.bytes[own + i] !== bytes[start + i]) return false;
    return true;
  }

  private add(bytes: Uint8Array, start: number, end: number, hash: number, slot: number): number {
    const level = this.count++;
    if (this.used + end - start > this.bytes.length) {
      const grown = new Uint8Array(2 * this.bytes.length + end - start);
      grown.set(this.bytes);
      this.bytes = grown;
    }
    this.bytes.set(bytes.subarray(start, end), this.used);
    this.used += end - start;
    if (level === this.ends.length) this.grow();
    this.ends[level] = this.used;
    this.hashes[level] = hash;
    this.slots[slot] = level;
    if (this.count * 2 > this.slots.length) this.rehash();
    return level;
  }

  private grow(): void {
    const [ends, hashes] = [this.ends, this.hashes];
    this.ends = new Int32Array(ends.length * 2);
    this.ends.set(ends);
    this.hashes = new Int32Array(hashes.length * 2);
    this.hashes.set(hashes);
  }

  private rehash(): void {
    this.slots = new Int32Array(this.slots.length * 2);
    const mask = this.slots.length - 1;
    for (let level = 1; level < this.count; level++) {
      const hash = this.hashes[level] as number;
      let slot = (hash ^ (hash >>> 12)) & mask;
      while (this.slots[slot] !== 0) slot = (slot + 1) & mask;
      this.slots[slot] = level;
    }
  }
}
