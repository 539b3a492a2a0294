/**
 * 1 − confidence, to as many decimals as the confidence is written with: 0.05 for 0.95, not 0.050000000000000044.
 * Domain: 0 < confidence < 1.
 */
export function alphaOf(confidence: number): number {
  return complement(1, confidence);
}

/** 2·confidence − 1, the confidence of the two-sided interval whose two tails are each 1 − confidence: 0.9 for 0.95. */
export function bothTailsConfidence(confidence: number): number {
  return complement(1, 2 * alphaOf(confidence));
}

function complement(whole: number, part: number): number {
  return Number((whole - part).toFixed(Math.min(100, decimalsOf(part))));
}

/** Decimals of the shortest text of a number between 0 and 2. */
function decimalsOf(value: number): number {
  const [digits = '', exponent = '0'] = String(value).split('e');
  const written = digits.split('.')[1]?.length ?? 0;
  return Math.max(0, written - Number(exponent));
}
