import type { Request } from '../../compare/request';
import { joinAnswers, stepIds, type Step, type StepId } from '../../protocol/asking';
import type { AskContext, Asker, StepDraft } from './askContext';
import { columnsStep } from './columnsStep';
import { referenceStep, testStep } from './groupsSteps';
import { labelStep } from './labelStep';
import { marginStep } from './marginStep';
import { measureStep } from './measureStep';
import { measuredStep } from './measuredStep';
import { questionStep } from './questionStep';
import { sameStep } from './sameStep';
import { successStep } from './successStep';
import { unitsStep } from './unitsStep';
import { varianceStep } from './varianceStep';

const askers: Readonly<Record<StepId, Asker>> = {
  measured: measuredStep,
  columns: columnsStep,
  success: successStep,
  label: labelStep,
  same: sameStep,
  reference: referenceStep,
  test: testStep,
  units: unitsStep,
  question: questionStep,
  margin: marginStep,
  variance: varianceStep,
  measure: () => null,
};

/** The parts of a request that a question answers: without them it can be put again. */
const answeredBy: Partial<Record<StepId, readonly (keyof Request)[]>> = {
  success: ['success'],
  same: ['same'],
  units: ['per', 'pair'],
  question: ['question', 'method', 'variance', 'df', 'curve'],
  margin: ['margin'],
  variance: ['method', 'variance', 'df', 'curve'],
  measure: ['measure', 'method', 'variance', 'df', 'curve'],
};

interface Found {
  readonly request: Partial<Request>;
  readonly next: { readonly id: StepId; readonly draft: StepDraft } | null;
}

/**
 * The next question that has no plain answer, and the request with the plain answers taken on the way to it. The count
 * of questions follows the likely answers; another answer can make it longer or shorter.
 */
export function nextStep(context: AskContext): {
  readonly step: Step | null;
  readonly request: Partial<Request>;
} {
  const { request, next } = find(context);
  if (next === null) return { step: null, request };
  const number = context.answered.length + 1;
  let of = number;
  let ahead = likelyAnswered(context, request, next.id, next.draft);
  for (let found = find(ahead); found.next !== null; found = find(ahead)) {
    of++;
    ahead = likelyAnswered(ahead, found.request, found.next.id, found.next.draft);
  }
  return { step: { ...next.draft, id: next.id, number, of }, request };
}

/** One question put again: the answer that stands is the likely one. null: it has but one answer, or none. */
export function onlyStep(context: AskContext, id: StepId): Step | null {
  const without = new Set<string>(answeredBy[id] ?? []);
  const request = Object.fromEntries(Object.entries(context.request).filter(([key]) => !without.has(key)));
  const asker = id === 'measure' ? measureStep : askers[id];
  const draft = asker({ ...context, request, remembered: context.request, answered: [] });
  return draft === null || 'plain' in draft ? null : { ...draft, id, number: 1, of: 1 };
}

function find(context: AskContext): Found {
  let { request } = context;
  const done = new Set(context.answered);
  for (const id of stepIds) {
    if (done.has(id)) continue;
    const asking = askers[id]({ ...context, request });
    if (asking === null) continue;
    if (!('plain' in asking)) return { request, next: { id, draft: asking } };
    request = { ...request, ...asking.plain };
  }
  return { request, next: null };
}

function likelyAnswered(
  context: AskContext,
  request: Partial<Request>,
  id: StepId,
  draft: StepDraft,
): AskContext {
  return {
    ...context,
    request: { ...request, ...likelyAnswer(draft) },
    answered: [...context.answered, id],
  };
}

function likelyAnswer(draft: StepDraft): Partial<Request> {
  switch (draft.kind) {
    case 'one':
      return draft.items[draft.likely]?.adds ?? {};
    case 'many':
      return joinAnswers(draft.likely.map(index => draft.items[index]?.adds ?? {}));
    case 'number':
      return { margin: [-(draft.likely ?? 1), draft.likely ?? 1] };
  }
}
