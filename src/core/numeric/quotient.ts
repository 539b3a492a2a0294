const SAFE = 9007199254740992n; // 2^53
const KEPT_BITS = 66; // 53 of the result, and enough behind them that one sticky bit decides the rounding

/** Number of bits, to within three. */
function bitLength(n: bigint): number {
  const size = Number(n);
  return size === Infinity ? n.toString(16).length * 4 : Math.ceil(Math.log2(size));
}

/**
 * The double nearest to numerator / denominator (ties to even), rounded once.
 * @param denominator above 0. Results below 2^-1022 in size may be rounded twice.
 */
export function quotient(numerator: bigint, denominator: bigint): number {
  if (numerator < 0n) return -quotient(-numerator, denominator);
  if (numerator <= SAFE && denominator <= SAFE) return Number(numerator) / Number(denominator);
  if (numerator === 0n) return 0;
  const shift = KEPT_BITS - bitLength(numerator) + bitLength(denominator);
  const n = shift >= 0 ? numerator << BigInt(shift) : numerator;
  const d = shift >= 0 ? denominator : denominator << BigInt(-shift);
  const kept = n / d;
  const sticky = kept * d === n ? kept : kept | 1n;
  const half = Math.trunc(shift / 2); // 2^-shift alone may leave the range of doubles
  return Number(sticky) * 2 ** -half * 2 ** (half - shift);
}
