import type { Decision, Row } from '../core/model/comparison';
import type { Designs } from '../core/model/groups';
import type { Ask, MethodDescriptor } from '../core/model/methods';
import type { Ticker } from '../core/model/problem';
import type { Reason } from '../core/model/say';
import { inOneUnit } from '../core/methods/alike';
import { askFor } from './askFor';
import { decide } from './decision';

/** Rough operations above which a row waits to be asked for. */
const WORK_BUDGET = 2e7;

export type DesignData = { readonly [D in keyof Designs]?: Designs[D] };

export interface RowAsk {
  readonly ask: Ask;
  readonly data: string;
  readonly chosen: MethodDescriptor;
  /** Ids that the person ruled out, with a reason kept elsewhere. */
  readonly ruledOut: ReadonlySet<string>;
  readonly tick: Ticker;
}

/**
 * Whether a method has a row at all beside the chosen one: pairs and unpaired groups are each other's neighbours, and so
 * are means, ratios and ranks, which are other questions about the same values.
 */
export function standsBeside(
  method: MethodDescriptor,
  chosen: MethodDescriptor,
  design: keyof Designs,
): boolean {
  const near = <T>(one: T, other: T, neighbours: readonly T[]): boolean =>
    one === other || (neighbours.includes(one) && neighbours.includes(other));
  return (
    near(method.design, design, ['two', 'pairs']) &&
    near(method.measure, chosen.measure, ['mean', 'ratio', 'rank'])
  );
}

/** One row under other assumptions: computed, or saying why not; counted, or saying why not. */
export function runRow(method: MethodDescriptor, designs: DesignData, asked: RowAsk): Row {
  const { data, chosen } = asked;
  const own = designs[method.design];
  const ask = askFor(method, chosen, asked.ask);
  if (own === undefined) return notComputed(method.id, data, missingDesign(method, designs));
  if (ask === null) return notComputed(method.id, data, reasonOf('other-unit'));
  const absent = whyNot(method, own, designs, { ...asked, ask });
  if (absent !== null) return notComputed(method.id, data, absent);
  const result = method.run(own, ask, asked.tick);
  const unpaired = designs.pairs !== undefined && method.design === 'two';
  const reason = unpaired ? reasonOf('pairs-given') : (method.doubts(own, ask) ?? ruledOut(method.id, asked));
  const sameQuantity = method.measure === chosen.measure && inOneUnit(method, chosen);
  const counted = method.counted && sameQuantity && reason === null;
  return {
    id: method.id,
    data,
    result,
    applies: true,
    counted,
    reason,
    decision: decided(method, decide(ask.question, result, ask)),
  };
}

const decided = ({ design }: MethodDescriptor, decision: Decision): Decision =>
  design === 'several' && decision === 'differs' ? 'some differ' : decision;

function whyNot(
  method: MethodDescriptor,
  own: Designs[keyof Designs],
  designs: DesignData,
  { ask, chosen }: RowAsk,
): Reason | null {
  if (designs.pairs !== undefined && method.design === 'two' && method !== chosen)
    return reasonOf('pairs-given');
  if (!method.questions.includes(ask.question)) return reasonOf('question-not-for-method');
  if (method !== chosen && method.work(sizeOf(own), ask) > WORK_BUDGET) return reasonOf('too-much-work');
  return method.applies(own, ask);
}

const missingDesign = (method: MethodDescriptor, designs: DesignData): Reason =>
  reasonOf(method.design === 'pairs' && designs.two !== undefined ? 'no-pairs' : 'not-this-design');

const ruledOut = (id: string, asked: RowAsk): Reason | null =>
  asked.ruledOut.has(id) ? reasonOf('ruled-out') : null;

const reasonOf = (code: string): Reason => ({ code, facts: {} });

export const notComputed = (id: string, data: string, reason: Reason | null): Row => ({
  id,
  data,
  result: null,
  applies: false,
  counted: false,
  reason,
  decision: null,
});

/** Number of values that a method would have to go through. */
function sizeOf(data: Designs[keyof Designs]): number {
  if ('groups' in data) return data.groups.reduce((sum, group) => sum + group.n, 0);
  return 'test' in data
    ? data.test.n + data.reference.n
    : data.both + data.testOnly + data.referenceOnly + data.neither;
}
