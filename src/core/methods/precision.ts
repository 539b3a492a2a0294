import type { Summary } from '../model/groups';
import type { Precision } from './meanPivot';

/**
 * Each group with its own SD: se = √(s₁²/n₁ + s₂²/n₂), df by Satterthwaite,
 * (v₁ + v₂)² / (v₁²/(n₁ − 1) + v₂²/(n₂ − 1)) with v = s²/n, formed from the shares v/(v₁ + v₂) so that no square
 * overflows. Domain: n ≥ 2 in both groups, at least one SD above 0.
 * Sources: Satterthwaite 1946, Biometrics Bulletin 2:110–114; Welch 1947, Biometrika 34:28–35;
 * NIST/SEMATECH e-Handbook 7.3.1.
 */
export function separatePrecision(test: Summary, reference: Summary): Precision & { readonly df: number } {
  const seTest = test.sd / Math.sqrt(test.n);
  const seReference = reference.sd / Math.sqrt(reference.n);
  const se = Math.hypot(seTest, seReference);
  const shareTest = (seTest / se) ** 2;
  const shareReference = (seReference / se) ** 2;
  const df = 1 / (shareTest ** 2 / (test.n - 1) + shareReference ** 2 / (reference.n - 1));
  return { se, df, meanVariances: [seTest ** 2, seReference ** 2], covariance: 0 };
}

/**
 * One SD for both groups: sp² = ((n₁ − 1)s₁² + (n₂ − 1)s₂²) / (n₁ + n₂ − 2), se = sp·√(1/n₁ + 1/n₂).
 * Domain: n₁ + n₂ ≥ 3 with n ≥ 2 wherever an SD is used. Source: NIST/SEMATECH e-Handbook 7.3.1.
 */
export function pooledPrecision(test: Summary, reference: Summary): Precision & { readonly df: number } {
  const sd = pooledSd(test, reference);
  const meanVariances = [sd ** 2 / test.n, sd ** 2 / reference.n] as const;
  return {
    se: sd * Math.sqrt(1 / test.n + 1 / reference.n),
    df: test.n + reference.n - 2,
    meanVariances,
    covariance: 0,
  };
}

/** The root of the mean of the two variances weighted by their degrees of freedom. */
export function pooledSd(test: Summary, reference: Summary): number {
  const df = test.n + reference.n - 2;
  const weight = (group: Summary): number => group.sd * Math.sqrt((group.n - 1) / df);
  return Math.hypot(weight(test), weight(reference));
}
