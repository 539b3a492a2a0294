import { expect } from 'vitest';

/** −log10 of the relative error, at most 16; the absolute error where the truth is 0. */
export function digits(found: number, truth: number): number {
  if (found === truth) return 16;
  const error = Math.abs(found - truth) / (truth === 0 ? 1 : Math.abs(truth));
  return Math.min(16, -Math.log10(error));
}

/** Holds a number to a relative error; `scale` is what the error is relative to where the truth itself may vanish. */
export function expectClose(
  found: number | null | undefined,
  truth: number,
  relative: number,
  what: string,
  scale = Math.abs(truth),
): void {
  expect(found, what).toBeTypeOf('number');
  const error = Math.abs(Number(found) - truth);
  expect(error, `${what}: ${String(found)} against ${truth}`).toBeLessThanOrEqual(
    relative * (scale === 0 ? 1 : scale),
  );
}

/** Whether a number, rounded to the digits printed, is the printed one. */
export function printsAs(found: number, printed: string): boolean {
  const decimals = printed.split('.')[1]?.length ?? 0;
  return found.toFixed(decimals) === Number(printed).toFixed(decimals);
}
