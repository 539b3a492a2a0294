/** ±digits · 10^exponent, read from the shortest text that gives the same double. */
interface Decimal {
  readonly negative: boolean;
  readonly digits: bigint;
  readonly exponent: number;
}

function decimalOf(value: number): Decimal {
  const [mantissa = '0', power = '0'] = Math.abs(value).toExponential().split('e');
  const [whole = '0', part = ''] = mantissa.split('.');
  return { negative: value < 0, digits: BigInt(whole + part), exponent: Number(power) - part.length };
}

/** The power of ten of the first significant digit: 1 for 22.6, −2 for 0.0412. Domain: finite and not 0. */
export function firstDigitExponent(value: number): number {
  return Number(Math.abs(value).toExponential().split('e')[1]);
}

/**
 * A finite number rounded half to even to `place` decimals (negative: to tens, hundreds, …), on the decimal text of its
 * full-precision value, so that it is rounded once. Never "-0".
 * Source: ISO 80000-1:2022 annex B, rule A.
 */
export function roundedText(value: number, place: number): string {
  const { negative, digits, exponent } = decimalOf(value);
  const kept = keep(digits, exponent + place);
  const body = place > 0 ? pointed(kept.toString(), place) : kept.toString() + '0'.repeat(-place);
  const text = kept === 0n ? body.replace(/^0+$/, '0') : body;
  return negative && kept !== 0n ? `-${text}` : text;
}

/** digits · 10^shift to the nearest whole number, half to even. */
function keep(digits: bigint, shift: number): bigint {
  if (shift >= 0) return digits * 10n ** BigInt(shift);
  const unit = 10n ** BigInt(-shift);
  const whole = digits / unit;
  const twice = 2n * (digits % unit);
  return twice > unit || (twice === unit && whole % 2n === 1n) ? whole + 1n : whole;
}

function pointed(digits: string, place: number): string {
  const padded = digits.padStart(place + 1, '0');
  return `${padded.slice(0, -place)}.${padded.slice(-place)}`;
}

/** The place to which a number has `digits` significant digits after rounding (9.996 to three digits is 10.0). */
export function significantPlace(value: number, digits: number): number {
  if (value === 0) return digits - 1;
  const place = digits - 1 - firstDigitExponent(value);
  const rounded = Number(roundedText(value, place));
  return rounded !== 0 && firstDigitExponent(rounded) > firstDigitExponent(value) ? place - 1 : place;
}

/** value · 10^power without a rounding of its own: the nearest double of the decimal text moved by `power` places. */
export function movedPoint(value: number, power: number): number {
  const [mantissa = '0', exponent = '0'] = value.toExponential().split('e');
  return Number(`${mantissa}e${Number(exponent) + power}`);
}
