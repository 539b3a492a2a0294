import type { LabelColumn } from '../../core/model/cells';
import type { Say } from '../../core/model/say';
import type { Request } from '../../compare/request';
import type { StepId, ManyStep, ChoiceStep, NumberStep } from '../../protocol/asking';
import type { Survey } from '../../readers/survey';

export type ColumnFacts = Survey['columns'][number];

/** What a question is made from: the columns of the file, the answers so far, and what was answered last time. */
export interface AskContext {
  readonly t: Say;
  /** Names of the files: two of them are one group each. */
  readonly files: readonly string[];
  readonly rows: number;
  readonly columns: readonly ColumnFacts[];
  readonly request: Partial<Request>;
  /** Columns that the selection singled out; null: none. */
  readonly picked: readonly string[] | null;
  readonly remembered: Partial<Request> | null;
  readonly answered: readonly StepId[];
  /** A column's labels, one a row; null when they are too many to be held. */
  labelsOf(name: string): LabelColumn | null;
}

type Draft<S> = Omit<S, 'id' | 'number' | 'of'>;
export type StepDraft = Draft<ChoiceStep> | Draft<ManyStep> | Draft<NumberStep>;

/** What comes of a question: nothing to ask, a plain answer taken without asking, or the question itself. */
export type Asking = null | { readonly plain: Partial<Request> } | StepDraft;

/** One question. */
export type Asker = (context: AskContext) => Asking;

/** Whether a question was answered: by picking, or because the request already says it. */
export const isAnswered = (context: AskContext, id: StepId, ...keys: readonly (keyof Request)[]): boolean =>
  context.answered.includes(id) || keys.some(key => context.request[key] !== undefined);

/** Index of the item that was picked last time, when it is still among them and nothing else is. */
function rememberedItem(
  items: readonly { readonly adds: Partial<Request> }[],
  remembered: Partial<Request> | null,
): number {
  if (remembered === null) return -1;
  return items.findIndex(({ adds }) => {
    const keys = Object.keys(adds) as (keyof Request)[];
    return (
      keys.length > 0 && keys.every(key => JSON.stringify(adds[key]) === JSON.stringify(remembered[key]))
    );
  });
}

/** A step with one answer of many: last time's answer is likely, else the guess. */
export function choice(
  context: AskContext,
  draft: Omit<Draft<ChoiceStep>, 'kind' | 'likely'>,
  guess = 0,
): Draft<ChoiceStep> {
  const before = rememberedItem(draft.items, context.remembered);
  return { kind: 'one', ...draft, likely: before >= 0 ? before : Math.max(0, guess) };
}
