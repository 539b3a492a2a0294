/** SHA-256 fed piece by piece; the platform gives it (text is taken as UTF-8). */
export interface Hasher {
  update(bytes: Uint8Array | string): void;
  /** The digest as 64 lower-case hexadecimal digits; called once, at the end. */
  hex(): string;
}
