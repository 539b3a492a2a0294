import { alphaOf } from '../methods/confidence';
import { fLowerTail, fUpperQuantile, fUpperTail } from '../numeric/fisherF';
import type { Evidence, EvidenceDescriptor, Seen } from '../model/comparison';
import type { Group } from '../model/groups';
import { threshold, valueOf } from './threshold';

/** Common practice, no source. */
const sdRatio = threshold('sd-ratio', 2, t =>
  t('SD ratio from which the groups are said to scatter differently'),
);
const sdRatioUnequal = threshold('sd-ratio-unequal-n', 1.5, t =>
  t('the same where one group is larger than the other by the factor n-ratio'),
);
const nRatio = threshold('n-ratio', 1.5, t => t('ratio of the group sizes from which they are unequal'));

/** Below this the F test sees even a threefold SD in less than half of all cases (simulated). */
const LEAST_N = 5;

/**
 * F = test variance / reference variance with its two-sided p, and the interval of the SD ratio in the facts. Its level is
 * a warning only where pooling was chosen and the sizes are unequal: there pooling misstates the evidence.
 * Source: NIST/SEMATECH e-Handbook of Statistical Methods 1.3.5.9; ISO 2854:1976 tables F and G.
 */
export const varianceRatio: EvidenceDescriptor<'variance-ratio'> = {
  id: 'variance-ratio',
  thresholds: [sdRatio, sdRatioUnequal, nRatio],
  references: ['NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.9', 'ISO 2854:1976'],
  look(seen) {
    const pair = scatteringPair(seen);
    if (pair === null) return [];
    const evidence = ratioOf(pair.test, pair.reference, seen.settings.confidence);
    const { sdRatio: ratio } = evidence.facts;
    if (!differ(Number(ratio), pair.test, pair.reference, seen)) return [evidence];
    const { id, group, count, cells, answers, facts } = evidence;
    const pooled =
      seen.settings.method === 'pooled-t' &&
      !alike(pair.test.n, pair.reference.n, valueOf(nRatio, seen.settings));
    return [evidence, { id, group, count, cells, answers, facts, level: pooled ? 'warn' : 'note' }];
  },
  canTell: ({ groups }) => groups.length === 2 && groups.every(({ n }) => n >= LEAST_N),
  title: t => t('ratio of the variances'),
  say({ facts }, t) {
    const [lower = 0, upper = 0] = Array.isArray(facts['interval']) ? facts['interval'].map(Number) : [];
    return t(
      'The SD of {0} is {1} times that of {2} ({3} to {4}). The F test reacts to values that are not normal as much as to unequal SDs.',
      String(facts['test']),
      Number(facts['sdRatio']),
      String(facts['reference']),
      lower,
      upper,
    );
  },
};

function scatteringPair({
  groups,
  settings,
}: Seen): { readonly test: Group; readonly reference: Group } | null {
  const [test, reference] = groups;
  if (test === undefined || reference === undefined || groups.length !== 2) return null;
  if (settings.measure !== 'mean' || settings.relation.kind === 'pairs') return null;
  return test.sd > 0 && reference.sd > 0 ? { test, reference } : null;
}

function ratioOf(test: Group, reference: Group, confidence: number): Evidence {
  const df = [test.n - 1, reference.n - 1] as const;
  const statistic = (test.sd / reference.sd) ** 2;
  const tail = alphaOf(confidence) / 2;
  const interval = [
    statistic / fUpperQuantile(tail, df[0], df[1]),
    statistic * fUpperQuantile(tail, df[1], df[0]),
  ] as const;
  return {
    id: 'variance-ratio',
    level: 'note',
    facts: {
      test: test.label,
      reference: reference.label,
      sdRatio: test.sd / reference.sd,
      interval: interval.map(Math.sqrt),
      varianceInterval: interval,
      nTest: test.n,
      nReference: reference.n,
    },
    group: null,
    count: test.n + reference.n,
    cells: [],
    answers: [],
    statistic,
    df,
    p: Math.min(1, 2 * Math.min(fLowerTail(statistic, df[0], df[1]), fUpperTail(statistic, df[0], df[1]))),
  };
}

function differ(ratio: number, test: Group, reference: Group, { settings }: Seen): boolean {
  const unequal = !alike(test.n, reference.n, valueOf(nRatio, settings));
  return !alike(ratio, 1, valueOf(unequal ? sdRatioUnequal : sdRatio, settings));
}

const alike = (a: number, b: number, factor: number): boolean => Math.max(a, b) <= factor * Math.min(a, b);
