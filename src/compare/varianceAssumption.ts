import { Refusal } from '../core/model/problem';
import type { Measure } from '../core/model/settings';
import type { Curve, DfRule, Request, Variance } from './request';

/** The three words of a variance assumption; they only choose a method. */
interface VarianceWords {
  readonly variance: Variance;
  readonly df: DfRule | null;
  readonly curve: Curve;
}

const TABLE: readonly (VarianceWords & { readonly method: string })[] = [
  { variance: 'separate', df: 'welch', curve: 't', method: 'separate-t' },
  { variance: 'separate', df: 'smaller', curve: 't', method: 'conservative-t' },
  { variance: 'separate', df: null, curve: 'normal', method: 'large-n-z' },
  { variance: 'separate', df: 'welch', curve: 'normal-over-30', method: 'separate-t' },
  { variance: 'pooled', df: null, curve: 't', method: 'pooled-t' },
  { variance: 'known', df: null, curve: 'normal', method: 'known-sigma-z' },
];

/** The method of each measure but the mean when nothing else is said, and that of pairs. */
const DEFAULT_METHOD: Readonly<
  Partial<Record<Measure, { readonly usual: string; readonly pairs: string | null }>>
> = {
  proportion: { usual: 'miettinen-nurminen', pairs: null },
};

/** The words behind a method id, or null when the method makes no such assumption. */
export function wordsOf(method: string): VarianceWords | null {
  return TABLE.find(row => row.method === method) ?? null;
}

/**
 * The method that a request asks for: by id, by the words of a variance assumption, or the default of its measure. Words
 * that contradict each other or a named method are refused ('method-not-for-this'). Where pairs are asked for, `separate`
 * is no contradiction: the differences have one SD of their own.
 */
export function methodAsked(
  request: Request,
  measure: Measure,
): { readonly method: string; readonly curve: Curve | null } {
  const { method, pair } = request;
  const spoken = request.variance !== undefined || request.df !== undefined || request.curve !== undefined;
  if (method !== undefined) {
    if (spoken && !TABLE.some(row => row.method === method && agrees(row, request)))
      throw notForThis(request);
    return { method, curve: ruleOf(request) };
  }
  if (measure !== 'mean') {
    const byDefault = DEFAULT_METHOD[measure];
    if (spoken || byDefault === undefined) throw notForThis(request, { measure });
    const { usual, pairs } = byDefault;
    const own = pair === undefined || pair === 'none' ? usual : pairs;
    if (own === null) throw notForThis({ ...request, method: usual }, { pair: pair ?? '' });
    return { method: own, curve: null };
  }
  const row = TABLE.find(words => agrees(words, { ...request, variance: request.variance ?? 'separate' }));
  if (row === undefined) throw notForThis(request);
  if (pair === undefined || pair === 'none') return { method: row.method, curve: ruleOf(request) };
  if (row.method !== 'separate-t' || ruleOf(request) !== null) throw notForThis(request, { pair });
  return { method: 'paired-t', curve: null };
}

/** The one curve that is a rule about n: which method it means is settled by the data. */
const ruleOf = (request: Request): Curve | null =>
  request.curve === 'normal-over-30' ? request.curve : null;

const agrees = (row: VarianceWords, { variance, df, curve }: Request): boolean =>
  (variance === undefined || variance === row.variance) &&
  (df === undefined || df === row.df) &&
  (curve === undefined || curve === row.curve);

function notForThis(request: Request, facts: Readonly<Record<string, string>> = {}): Refusal {
  const { method, variance, df, curve } = request;
  return new Refusal('method-not-for-this', {
    ...(method === undefined ? {} : { method }),
    ...(variance === undefined ? {} : { variance }),
    ...(df === undefined ? {} : { df }),
    ...(curve === undefined ? {} : { curve }),
    ...facts,
  });
}
