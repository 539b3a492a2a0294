import { Utf8Check } from './utf8Check';

export interface EncodingChoice {
  /** As the Encoding Standard names it: utf-8, utf-16le, windows-1252, … */
  readonly encoding: string;
  /** Bytes of the byte order mark to pass over. */
  readonly skip: number;
  /** Whether anything said so: a mark, a person, or bytes that fit no other. */
  readonly certain: boolean;
  /** Whether nothing said so and windows-1252 was taken. */
  readonly fallback: boolean;
}

const MARKS: readonly (readonly [encoding: string, mark: readonly number[]])[] = [
  ['utf-8', [0xef, 0xbb, 0xbf]],
  ['utf-16le', [0xff, 0xfe]],
  ['utf-16be', [0xfe, 0xff]],
];

/**
 * Decides the encoding from the first bytes: byte order mark, then what a person said, then the pattern of NUL bytes that
 * UTF-16 leaves, then UTF-8 where the bytes are valid, else windows-1252.
 * @param wish an encoding label, or undefined
 * @returns null where there are NUL bytes that are not UTF-16: no text
 */
export function decideEncoding(head: Uint8Array, wish: string | undefined): EncodingChoice | null {
  for (const [encoding, mark] of MARKS) {
    if (mark.every((byte, i) => head[i] === byte))
      return { encoding, skip: mark.length, certain: true, fallback: false };
  }
  if (wish !== undefined) return { encoding: encodingName(wish), skip: 0, certain: true, fallback: false };
  const check = new Utf8Check();
  check.feed(head);
  if (check.nulAt >= 0) {
    const encoding = utf16ByNuls(head);
    return encoding === null ? null : { encoding, skip: 0, certain: true, fallback: false };
  }
  return check.invalidAt < 0
    ? { encoding: 'utf-8', skip: 0, certain: check.beyondAscii, fallback: false }
    : { encoding: 'windows-1252', skip: 0, certain: false, fallback: true };
}

/** The Encoding Standard reads latin-1 and ASCII labels as windows-1252 too. */
function encodingName(label: string): string {
  const name = label.trim().toLowerCase().replace(/_/g, '-');
  if (/^(utf-?8|utf8bom)$/.test(name)) return 'utf-8';
  if (/^utf-?16(-?le)?$/.test(name)) return 'utf-16le';
  if (/^utf-?16-?be$/.test(name)) return 'utf-16be';
  return /^(windows-?1252|cp-?1252|iso-?8859-?1|latin-?1|ascii|us-ascii)$/.test(name) ? 'windows-1252' : name;
}

/** ASCII letters, digits and marks in UTF-16 leave every second byte 0. */
function utf16ByNuls(head: Uint8Array): string | null {
  const nuls = [0, 0];
  for (let i = 0; i < head.length; i++) if (head[i] === 0) nuls[i % 2] = (nuls[i % 2] ?? 0) + 1;
  const [even = 0, odd = 0] = nuls;
  const half = head.length / 2;
  if (odd > 0.4 * half && even < 0.05 * half) return 'utf-16le';
  if (even > 0.4 * half && odd < 0.05 * half) return 'utf-16be';
  return null;
}
