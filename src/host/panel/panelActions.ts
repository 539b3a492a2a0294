import { commands, l10n, window } from 'vscode';
import type { Request } from '../../compare/request';
import type { CellRef } from '../../core/model/problem';
import type { StepId } from '../../protocol/asking';
import type { ChangeKey, PanelAction } from '../../report/panel/action';
import { askAnalyst, askConfidence, askMatters, askSampling, askText } from '../asking/askText';
import { showStep } from '../asking/showStep';
import { lastPart } from '../files/root';
import { showCell } from '../files/showCell';
import type { Services } from '../services';
import { now } from '../now';
import type { Comparison } from './comparison';

/** Does what a control of the panel asks for. A person who gives up a question changes nothing. */
export async function actOn(services: Services, comparison: Comparison, action: PanelAction): Promise<void> {
  switch (action.kind) {
    case 'change':
      return change(services, comparison, action.key);
    case 'state':
      return state(comparison, action.key);
    case 'show':
      return showAt(services, comparison, action.at);
    case 'point':
      await showAt(services, comparison, action.at);
      return offerToLeaveOut(comparison, action.at);
    case 'takeBack':
      return comparison.act({ kind: 'take back', file: action.file, line: action.line, when: now() });
    case 'copyBlock':
      await commands.executeCommand('weighbeam.copyBlock');
  }
}

/** Goes to the cell that a problem is about */
export async function showProblemCell(services: Services, comparison: Comparison): Promise<void> {
  const problem = comparison.shown?.problem ?? null;
  if (problem === null || problem.at === null) return;
  await showAt(services, comparison, problem.at);
}

/** Goes to a cell of the comparison's files. */
export async function showAt({ client }: Services, comparison: Comparison, at: CellRef): Promise<void> {
  const { files, wish } = await comparison.open();
  const [uri, input] = [comparison.subject.files[at.file], files[at.file]];
  if (uri !== undefined && input !== undefined) {
    await showCell(client, { uri, input, wish, at });
  }
}

/** Offers to leave a row out; needs a reason. A file that changes meanwhile may hold another row on that line. */
export async function offerToLeaveOut(comparison: Comparison, { file, line }: CellRef): Promise<void> {
  const offered = await comparison.stamps();
  const leaveOut = l10n.t('Leave line {0} out…', line);
  const uri = comparison.subject.files[file];
  const name = uri === undefined ? '' : lastPart(uri);
  const detail = l10n.t('The row stays in the file; the record names it with your reason');
  const picked = await window.showQuickPick([{ label: leaveOut, detail }], {
    title:
      comparison.subject.files.length > 1 ? l10n.t('{0}, line {1}', name, line) : l10n.t('Line {0}', line),
  });
  if (picked === undefined) return;
  const reason = await askText({
    title: leaveOut,
    prompt: l10n.t('Why? It stands in the settings block.'),
    placeholder: l10n.t('for example: tile cracked on the saw'),
    required: true,
  });
  if (reason === null) return;
  if ((await comparison.stamps()).join() !== offered.join()) {
    void window.showWarningMessage(
      l10n.t('The file was changed meanwhile; nothing was left out. Choose the row again.'),
    );
    return;
  }
  await comparison.act({ kind: 'leave out', file, line, reason, when: now() });
}

async function state(comparison: Comparison, key: 'sampling' | 'analyst'): Promise<void> {
  const { sampling, analyst } = comparison.stated;
  const text = key === 'sampling' ? await askSampling(sampling) : await askAnalyst(analyst);
  if (text !== null) await comparison.state({ [key]: text });
}

const steps: Partial<Record<ChangeKey, StepId>> = {
  question: 'question',
  variance: 'variance',
  measure: 'measure',
  margin: 'margin',
};

async function change(services: Services, comparison: Comparison, key: ChangeKey): Promise<void> {
  const patch = await askPatch(services, comparison, key);
  if (patch === null) return;
  const reason = comparison.wasSeen ? await askReason() : '';
  if (reason === null) return;
  const when = now();
  const unset = unsetBy(key, patch);
  await comparison.act(
    { kind: 'change', patch, unset, when },
    ...(reason === ''
      ? []
      : Object.keys(patch).map(changed => ({ kind: 'reason', key: changed, reason }) as const)),
  );
}

/** What an answer leaves open that stood there before: a margin goes with its question, a size that matters can be taken back. */
function unsetBy(key: ChangeKey, patch: Partial<Request>): readonly (keyof Request)[] {
  if (key === 'question' && patch.margin === undefined) return ['margin'];
  if (key === 'matters' && patch.matters === undefined) return ['matters'];
  return [];
}

/** The unit of the difference that is shown; null where it has none. */
function unitOf({ shown }: Comparison): string | null {
  const unit = shown?.view?.figure?.difference?.unit ?? '';
  return unit === '' ? null : unit;
}

async function askPatch(
  services: Services,
  comparison: Comparison,
  key: ChangeKey,
): Promise<Partial<Request> | null> {
  const { request } = comparison;
  if (key === 'confidence') {
    const confidence = await askConfidence(request.confidence ?? 0.95);
    return confidence === null ? null : { confidence };
  }
  if (key === 'matters') {
    const matters = await askMatters(request.matters ?? null, unitOf(comparison));
    if (matters === null) return null;
    return matters === 'none' ? {} : { matters };
  }
  const step = steps[key];
  return step === undefined ? null : askStep(services, comparison, request, step);
}

/** Puts one question again, null when the person gave up; a question that is asked against a margin is followed by that of the margin. */
export async function askStep(
  services: Services,
  comparison: Comparison,
  request: Request,
  only: StepId,
): Promise<Partial<Request> | null> {
  const { files, wish } = await comparison.open();
  const { step } = await services.client.ask({
    type: 'nextStep',
    revision: 0,
    files,
    request: { ...request, wish },
    columns: null,
    remembered: null,
    answered: [],
    only,
  });
  if (step === null) return {};
  const answer = await showStep(step, { title: comparison.title, canGoBack: false });
  if (answer === 'escape' || answer === 'back') return null;
  if (only !== 'question') return answer.adds;
  const margin = await askStep(services, comparison, { ...request, ...answer.adds }, 'margin');
  return margin === null ? null : { ...answer.adds, ...margin };
}

const askReason = (): Promise<string | null> =>
  askText({
    title: l10n.t('Why is it changed?'),
    prompt: l10n.t(
      'A result was seen before: the change stands in the settings block, with your reason if you give one',
    ),
    placeholder: l10n.t('for example: protocol 12'),
  });
