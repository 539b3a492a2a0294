/**
 * Watches bytes for what is no UTF-8 (The Unicode Standard 16.0, table 3-7, well-formed byte sequences) and for NUL bytes,
 * chunk by chunk. Runs of plain ASCII are passed over four bytes at a time.
 */
export class Utf8Check {
  /** Place of the first byte that is no UTF-8, from the start of everything fed; −1: none so far. */
  invalidAt = -1;
  /** Place of the first NUL byte; −1: none so far. */
  nulAt = -1;
  /** Whether any byte above 0x7F was met. */
  beyondAscii = false;
  private fed = 0;
  private expected = 0;
  private lowest = 0x80;
  private highest = 0xbf;

  feed(bytes: Uint8Array): void {
    let at = 0;
    while (at < bytes.length) {
      if (this.expected === 0) at = plainUntil(bytes, at);
      if (at < bytes.length) this.take(bytes[at] as number, this.fed + at);
      at++;
    }
    this.fed += bytes.length;
  }

  /** To be called behind the last byte: a sequence that was cut off is invalid. */
  end(): void {
    if (this.expected > 0) this.reject(this.fed);
  }

  private take(byte: number, place: number): void {
    if (this.expected > 0) {
      if (byte < this.lowest || byte > this.highest) this.reject(place);
      else this.expected--;
      [this.lowest, this.highest] = [0x80, 0xbf];
      return;
    }
    if (byte === 0 && this.nulAt < 0) this.nulAt = place;
    if (byte < 0x80) return;
    this.beyondAscii = true;
    if (byte >= 0xc2 && byte <= 0xdf) this.expected = 1;
    else if (byte >= 0xe0 && byte <= 0xef) this.expected = 2;
    else if (byte >= 0xf0 && byte <= 0xf4) this.expected = 3;
    else this.reject(place);
    if (byte === 0xe0) this.lowest = 0xa0;
    if (byte === 0xed) this.highest = 0x9f;
    if (byte === 0xf0) this.lowest = 0x90;
    if (byte === 0xf4) this.highest = 0x8f;
  }

  private reject(place: number): void {
    this.expected = 0;
    if (this.invalidAt < 0) this.invalidAt = place;
  }
}

/** The first place from `at` on whose byte is no plain ASCII, or the end. */
function plainUntil(bytes: Uint8Array, at: number): number {
  let place = at;
  const isPlain = (byte: number): boolean => byte > 0 && byte < 0x80;
  while (place < bytes.length && (bytes.byteOffset + place) % 4 !== 0) {
    if (!isPlain(bytes[place] as number)) return place;
    place++;
  }
  if (place === bytes.length) return place;
  const words = new Int32Array(bytes.buffer, bytes.byteOffset + place, (bytes.length - place) >> 2);
  for (let i = 0; i < words.length; i++) {
    const word = words[i] as number;
    // the first term is set by a byte above 0x7F, the second by a zero byte
    if (((word | ((word - 0x01010101) & ~word)) & 0x80808080) !== 0) break;
    place += 4;
  }
  while (place < bytes.length && isPlain(bytes[place] as number)) place++;
  return place;
}
