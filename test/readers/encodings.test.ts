import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decideEncoding } from '../../src/readers/encoding';
import { Utf8Check } from '../../src/readers/utf8Check';
import { windows1252ToUtf8 } from '../../src/readers/windows1252';

const checked = (bytes: Uint8Array, size: number): Utf8Check => {
  const check = new Utf8Check();
  for (let at = 0; at < bytes.length; at += size) check.feed(bytes.subarray(at, at + size));
  check.end();
  return check;
};

const isUtf8 = (bytes: Uint8Array): boolean => {
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    return true;
  } catch {
    return false;
  }
};

describe('windows-1252', () => {
  it('has the characters of the Encoding Standard, also where decoders differ', () => {
    // WHATWG Encoding Standard, index windows-1252: the bytes 0x80 to 0x9F in order.
    const high = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';
    const bytes = Uint8Array.from({ length: 256 }, (_, byte) => byte);
    const text = new TextDecoder('utf-8', { ignoreBOM: true }).decode(windows1252ToUtf8(bytes));
    expect(text.slice(0x80, 0xa0)).toBe(high);
    const others = Array.from({ length: 256 }, (_, byte) => byte).filter(byte => byte < 0x80 || byte >= 0xa0);
    expect(others.map(byte => text.charCodeAt(byte))).toEqual(others);
  });
});

describe('the look for what is no UTF-8', () => {
  it('agrees with the strict decoder of the platform on any bytes in any chunks', () => {
    const bytes = fc.oneof(
      fc.uint8Array({ maxLength: 24, min: 1 }),
      fc
        .string({ unit: 'binary', maxLength: 12 })
        .map(text => new TextEncoder().encode(text.replace(/\0/g, 'x'))),
      fc
        .tuple(
          fc.constantFrom(0xe0, 0xed, 0xf0, 0xf4, 0xc1, 0xf5),
          fc.uint8Array({ maxLength: 4, min: 0x7f }),
        )
        .map(([lead, rest]) => Uint8Array.of(97, lead, ...rest, 98)),
    );
    fc.assert(
      fc.property(bytes, fc.integer({ min: 1, max: 9 }), (content, size) => {
        expect(checked(content, size).invalidAt < 0).toBe(isUtf8(content));
      }),
      { numRuns: 2000 },
    );
  });

  it('finds the place of the first byte that is wrong, and the first NUL', () => {
    const bytes = new TextEncoder().encode('plain text, more of it, ö, and on, and on');
    bytes[33] = 0xff;
    bytes[7] = 0;
    expect([checked(bytes, 5).invalidAt, checked(bytes, 64).invalidAt]).toEqual([33, 33]);
    expect([checked(bytes, 5).nulAt, checked(bytes, 64).nulAt]).toEqual([7, 7]);
  });
});

describe('the encoding', () => {
  const of = (bytes: readonly number[], wish?: string) => decideEncoding(Uint8Array.from(bytes), wish);
  const ascii = [...new TextEncoder().encode('a,b\n1,2\n')];

  it('follows a byte order mark before a wish', () => {
    expect(of([0xff, 0xfe, 97, 0], 'utf-8')).toMatchObject({ encoding: 'utf-16le', skip: 2 });
    expect(of([0xfe, 0xff, 0, 97])).toMatchObject({ encoding: 'utf-16be', skip: 2 });
    expect(of([0xef, 0xbb, 0xbf, 97], 'windows-1252')).toMatchObject({ encoding: 'utf-8', skip: 3 });
  });

  it('follows a wish before what the bytes look like, and knows its many spellings', () => {
    for (const label of ['cp1252', 'windows1252', 'ISO-8859-1', 'iso88591', 'latin1']) {
      expect(of(ascii, label)?.encoding).toBe('windows-1252');
    }
    expect([
      of(ascii, 'utf8')?.encoding,
      of(ascii, 'UTF-8')?.encoding,
      of(ascii, 'utf16le')?.encoding,
    ]).toEqual(['utf-8', 'utf-8', 'utf-16le']);
    expect(of(ascii, 'iso-8859-2')?.encoding).toBe('iso-8859-2');
  });

  it('is windows-1252 only when nothing else fits, and that is said', () => {
    expect(of([...ascii, 0xf6, 10])).toMatchObject({ encoding: 'windows-1252', fallback: true });
    expect(of(ascii)).toMatchObject({ encoding: 'utf-8', fallback: false, certain: false });
  });

  it('does not exist for bytes that are no text', () => {
    expect(of([0x89, 0x50, 0, 0, 0, 1, 2, 3])).toBeNull();
  });
});
