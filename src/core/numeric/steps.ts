/** Whole numbers of the smallest written step, each below 2^53 in size. */
export type Steps = Int32Array | Float64Array;

/** Whole numbers at and above this size are not all doubles. */
export const LARGEST_STEP = 2 ** 53;

const INT32_LIMIT = 2 ** 31;

/** Powers of ten that are exact doubles: 10^0 to 10^22. */
export const EXACT_POWERS: readonly number[] = Array.from({ length: 23 }, (_, power) => 10 ** power);

const POWERS = Array.from({ length: 64 }, (_, power) => 10n ** BigInt(power));

/** 10^power, exactly. */
export const powerOfTen = (power: number): bigint => POWERS[power] ?? 10n ** BigInt(power);

/** 10^decimals · per, exactly. */
export const scaleOf = (decimals: number, per: number | bigint): bigint => powerOfTen(decimals) * BigInt(per);

/** The same steps in four bytes each where they fit, else as they are. */
export function compactSteps(steps: Float64Array): Steps {
  for (const step of steps) if (step >= INT32_LIMIT || step < -INT32_LIMIT) return steps;
  return new Int32Array(steps);
}
