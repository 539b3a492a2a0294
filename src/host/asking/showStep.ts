import {
  InputBoxValidationSeverity,
  l10n,
  QuickInputButtons,
  window,
  type QuickInput,
  type QuickPickItem,
} from 'vscode';
import type { Request } from '../../compare/request';
import {
  joinAnswers,
  type ChoiceStep,
  type ManyStep,
  type NumberStep,
  type Step,
} from '../../protocol/asking';
import { readNumber } from './readNumber';

/** What came of one question. */
export type StepAnswer = { readonly adds: Partial<Request> } | 'back' | 'escape';

interface Frame {
  readonly title: string;
  readonly canGoBack: boolean;
}

/** Shows one question and waits for its answer. Escape gives up all of them. */
export function showStep(step: Step, frame: Frame): Promise<StepAnswer> {
  switch (step.kind) {
    case 'one':
      return pickOne(step, frame);
    case 'many':
      return pickMany(step, frame);
    case 'number':
      return typeNumber(step, frame);
  }
}

interface Item extends QuickPickItem {
  readonly adds: Partial<Request>;
}

const itemsOf = (step: ChoiceStep | ManyStep): Item[] =>
  step.items.map(({ label, description, detail, adds }) => ({ label, description, detail, adds }));

function pickOne(step: ChoiceStep, frame: Frame): Promise<StepAnswer> {
  const input = window.createQuickPick<Item>();
  input.items = itemsOf(step);
  input.activeItems = input.items.filter((_, index) => index === step.likely);
  input.matchOnDescription = true;
  return settled(input, step, frame, accept => {
    input.onDidAccept(() => {
      const [picked] = input.selectedItems;
      if (picked !== undefined) accept({ adds: picked.adds });
    });
  });
}

function pickMany(step: ManyStep, frame: Frame): Promise<StepAnswer> {
  const input = window.createQuickPick<Item>();
  input.canSelectMany = true;
  input.items = itemsOf(step);
  input.selectedItems = input.items.filter((_, index) => step.likely.includes(index));
  return settled(input, step, frame, accept => {
    input.onDidAccept(() => {
      if (input.selectedItems.length < step.least) {
        input.placeholder = l10n.t('Pick at least {0}', step.least);
        return;
      }
      const inOrder = input.items.filter(item => input.selectedItems.includes(item));
      accept({ adds: joinAnswers(inOrder.map(item => item.adds)) });
    });
  });
}

function typeNumber(step: NumberStep, frame: Frame): Promise<StepAnswer> {
  const input = window.createInputBox();
  input.value = step.likely === null ? '' : String(step.likely);
  input.prompt = step.unit === '' ? step.prompt : `${step.prompt} (${step.unit})`;
  const check = (): number | null => {
    const typed = readNumber(input.value);
    const wrong = typed === null || typed <= 0;
    input.validationMessage =
      wrong && input.value !== ''
        ? {
            message: l10n.t('A number above 0, for example 15 or 0.5'),
            severity: InputBoxValidationSeverity.Error,
          }
        : undefined;
    return wrong ? null : typed;
  };
  return settled(input, step, frame, accept => {
    input.onDidChangeValue(check);
    input.onDidAccept(() => {
      const typed = check();
      if (typed !== null) accept({ adds: { margin: [-typed, typed] } });
    });
  });
}

/** Dresses an input alike for every question and turns its events into one answer. */
function settled(
  input: QuickInput & {
    placeholder: string | undefined;
    buttons: readonly { readonly iconPath: unknown }[];
    onDidTriggerButton: (listener: (button: { readonly iconPath: unknown }) => void) => unknown;
  },
  step: Step,
  frame: Frame,
  listen: (accept: (answer: StepAnswer) => void) => void,
): Promise<StepAnswer> {
  input.title = `${frame.title} · ${step.title}`;
  input.step = step.number;
  input.totalSteps = step.of;
  input.placeholder = step.prompt;
  input.ignoreFocusOut = true;
  input.buttons = frame.canGoBack ? [QuickInputButtons.Back] : [];
  return new Promise(resolve => {
    let answered = false;
    const accept = (answer: StepAnswer): void => {
      if (answered) return;
      answered = true;
      resolve(answer);
      input.dispose();
    };
    listen(accept);
    input.onDidTriggerButton(button => {
      if (button === QuickInputButtons.Back) accept('back');
    });
    input.onDidHide(() => accept('escape'));
    input.show();
  });
}
