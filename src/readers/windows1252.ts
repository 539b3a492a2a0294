/**
 * Code points of the bytes 0x80 to 0x9F in windows-1252 (WHATWG Encoding Standard, index windows-1252); all other bytes
 * stand for the code point of the same number. Platform decoders of this encoding differ in exactly these, so that a panel
 * and a terminal could read different text.
 */
const HIGH_CONTROLS = [
  0x20ac, 0x81, 0x201a, 0x0192, 0x201e, 0x2026, 0x2020, 0x2021, 0x02c6, 0x2030, 0x0160, 0x2039, 0x0152, 0x8d,
  0x017d, 0x8f, 0x90, 0x2018, 0x2019, 0x201c, 0x201d, 0x2022, 0x2013, 0x2014, 0x02dc, 0x2122, 0x0161, 0x203a,
  0x0153, 0x9d, 0x017e, 0x0178,
];

const UTF8_OF_BYTE: readonly Uint8Array[] = Array.from({ length: 256 }, (_, byte) =>
  new TextEncoder().encode(String.fromCodePoint(HIGH_CONTROLS[byte - 0x80] ?? byte)),
);

const LONGEST = 3;

/** The same text in UTF-8. */
export function windows1252ToUtf8(bytes: Uint8Array): Uint8Array {
  const utf8 = new Uint8Array(bytes.length * LONGEST);
  let length = 0;
  for (const byte of bytes) {
    if (byte < 0x80) {
      utf8[length++] = byte;
      continue;
    }
    const encoded = UTF8_OF_BYTE[byte] ?? new Uint8Array();
    utf8.set(encoded, length);
    length += encoded.length;
  }
  return utf8.slice(0, length);
}
