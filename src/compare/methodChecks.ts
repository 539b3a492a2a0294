import { bothTailsConfidence } from '../core/methods/confidence';
import { methodById } from '../core/methods/index';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { Layout, Measure, Question, Relation } from '../core/model/settings';
import type { Request } from './request';

interface Chosen {
  readonly method: string;
  readonly measure: Measure;
  readonly question: Question;
  readonly relation: Relation;
  readonly layout: Layout;
}

/** Refuses a method that is not known, is for another measure or other data, or does not answer the question. */
export function checkMethod(chosen: Chosen, list: readonly MethodDescriptor[]): MethodDescriptor {
  const { method, measure, question, relation, layout } = chosen;
  const descriptor = methodById(method, list);
  if (descriptor === undefined)
    throw new Refusal('method-unknown', { method, methods: list.map(({ id }) => id) });
  const forPairs = descriptor.design === 'pairs' || descriptor.design === 'pairedCounts';
  if (descriptor.measure !== measure) throw new Refusal('method-not-for-this', { method, measure });
  const summarised = layout.kind === 'summary' || layout.kind === 'typed';
  if (summarised && (relation.kind === 'pairs' || relation.kind === 'units')) {
    throw new Refusal('method-not-for-this', { method, needs: 'values' });
  }
  if (forPairs && relation.kind !== 'pairs')
    throw new Refusal('method-not-for-this', { method, needs: 'pair' });
  if (relation.kind === 'pairs' && (descriptor.design === 'counts' || descriptor.design === 'several')) {
    throw new Refusal('method-not-for-this', { method, pair: relation.column });
  }
  if (!descriptor.questions.includes(question)) {
    throw new Refusal('question-not-for-method', { method, question, questions: descriptor.questions });
  }
  return descriptor;
}

/**
 * The margin of a question that needs one: the value of groups that are alike strictly inside it, ratios above 0, and for
 * `equivalent` room for an interval.
 */
export function checkMargin(
  question: Question,
  margin: Request['margin'],
  confidence: number,
  alike: number,
): void {
  const needsOne = question === 'equivalent' || question === 'not-lower' || question === 'not-higher';
  if (needsOne && margin === undefined) throw new Refusal('margin-needed', { question });
  if (margin !== undefined && !(margin[0] < alike && margin[1] > alike && (alike === 0 || margin[0] > 0))) {
    throw new Refusal('margin-invalid', { low: margin[0], high: margin[1], alike });
  }
  if (question === 'equivalent' && bothTailsConfidence(confidence) <= 0) {
    throw new Refusal('confidence-out-of-range', { confidence, question });
  }
}

/**
 * A difference of shares lies between −1 and 1: what it is held against, a margin and what matters have to lie inside.
 * Refuses 'share-out-of-range', with the share that was meant where the number reads as percentage points.
 */
export function checkShares(measure: Measure, { against, matters, margin = [0, 0] }: Request): void {
  if (measure !== 'proportion') return;
  const outside = [against ?? 0, matters ?? 0, margin[1], margin[0]].find(value => Math.abs(value) >= 1);
  if (outside === undefined) return;
  const meant = Math.abs(outside) < 100 ? { meant: Number(`${outside}e-2`) } : {};
  throw new Refusal('share-out-of-range', { value: outside, ...meant });
}

/** Known standard deviations: both above 0, there when the method takes them, and not said where none could take them. */
export function checkSigma({ method, measure, relation }: Chosen, sigma: Request['sigma']): void {
  if (sigma === undefined) {
    if (method === 'known-sigma-z') throw new Refusal('sigma-needed', { method });
    return;
  }
  if (!sigma.every(value => value > 0 && Number.isFinite(value)))
    throw new Refusal('sigma-not-positive', { sigma });
  if (measure !== 'mean' || relation.kind === 'pairs')
    throw new Refusal('method-not-for-this', { method, needs: 'two-means' });
}
