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
  if (relation.kind === 'pairs' && descriptor.design === 'counts') {
    throw new Refusal('method-not-for-this', { method, pair: relation.column });
  }
  if (!descriptor.questions.includes(question)) {
    throw new Refusal('question-not-for-method', { method, question, questions: descriptor.questions });
  }
  return descriptor;
}

/** The margin of a question that needs one: 0 strictly inside it, and for `equivalent` room for an interval. */
export function checkMargin(question: Question, margin: Request['margin'], confidence: number): void {
  const needsOne = question === 'equivalent' || question === 'not-lower' || question === 'not-higher';
  if (needsOne && margin === undefined) throw new Refusal('margin-needed', { question });
  if (margin !== undefined && !(margin[0] < 0 && margin[1] > 0)) {
    throw new Refusal('margin-invalid', { low: margin[0], high: margin[1] });
  }
  if (question === 'equivalent' && bothTailsConfidence(confidence) <= 0) {
    throw new Refusal('confidence-out-of-range', { confidence, question });
  }
}

/** Known standard deviations: both above 0, and there when the method takes them. */
export function checkSigma(method: string, sigma: Request['sigma']): void {
  if (sigma === undefined) {
    if (method === 'known-sigma-z') throw new Refusal('sigma-needed', { method });
    return;
  }
  if (!sigma.every(value => value > 0 && Number.isFinite(value)))
    throw new Refusal('sigma-not-positive', { sigma });
}
