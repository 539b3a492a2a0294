/** A finite decimal as written: digits / 10^decimals, decimals ≥ 0. */
export interface Decimal {
  readonly digits: bigint;
  readonly decimals: number;
}

const GRAMMAR = {
  '.': /^([+\-\u2212]?)(\d*)(?:\.(\d*))?(?:[eE]([+\-\u2212]?\d+))?$/,
  ',': /^([+\-\u2212]?)(\d*)(?:,(\d*))?(?:[eE]([+\-\u2212]?\d+))?$/,
};

/** Past this a number is far outside of what a double holds, whichever way: the digits need not be written out. */
const LARGEST_EXPONENT = 999;

/**
 * Reads one number by one strict grammar: optional sign (+, -, U+2212), digits with at most one decimal mark, optional
 * exponent; nothing else, no spaces, no thousands marks.
 * @returns its digits and decimals as written (0.10 is 10 with 2 decimals), or null when the text is no such number. An
 * exponent beyond ±999 is held at ±999.
 */
export function parseDecimal(text: string, decimal: '.' | ','): Decimal | null {
  const match = GRAMMAR[decimal].exec(text);
  if (match === null) return null;
  const [, sign = '', whole = '', fraction = '', power = '0'] = match;
  if (whole === '' && fraction === '') return null;
  const magnitude = BigInt(whole + fraction);
  const digits = sign === '' || sign === '+' ? magnitude : -magnitude;
  const exponent = Number(power.replace('\u2212', '-'));
  const held = Math.max(-LARGEST_EXPONENT, Math.min(LARGEST_EXPONENT, exponent));
  const decimals = fraction.length - held;
  return decimals >= 0 ? { digits, decimals } : { digits: digits * 10n ** BigInt(-decimals), decimals: 0 };
}

/** The shortest exact text of digits / 10^decimals, with a point and without an exponent: 0.1, -12, 1500. */
export function decimalText(digits: bigint, decimals: number): string {
  if (digits < 0n) return `-${decimalText(-digits, decimals)}`;
  const all = digits.toString().padStart(decimals + 1, '0');
  const whole = all.slice(0, all.length - decimals);
  const fraction = all.slice(all.length - decimals).replace(/0+$/, '');
  return fraction === '' ? whole : `${whole}.${fraction}`;
}

/** The double nearest to digits / 10^decimals; Infinity or 0 where it has none. */
export const nearestDouble = ({ digits, decimals }: Decimal): number =>
  Number(`${digits.toString()}e-${decimals}`);
