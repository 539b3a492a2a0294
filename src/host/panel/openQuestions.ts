import { l10n, window, type QuickPickItem } from 'vscode';
import type { Request } from '../../compare/request';
import type { StepId } from '../../protocol/asking';
import { askComparison } from '../asking/askComparison';
import type { Services } from '../services';
import { now } from '../now';
import type { Comparison } from './comparison';
import { askStep, offerToLeaveOut, showAt } from './panelActions';
import type { Shown } from './shown';

/** What a person can be asked so that a problem goes away. Everything else has to be mended in the file. */
const answers: Readonly<Record<string, 'below' | 'decimal' | 'delimiter' | 'row' | 'all'>> = {
  'censored-unanswered': 'below',
  'decimal-undecidable': 'decimal',
  'layouts-equal': 'delimiter',
  'text-in-measured': 'row',
  'column-unknown': 'all',
  'column-ambiguous': 'all',
  'column-needed': 'all',
  'label-unknown': 'all',
  'label-needed': 'all',
  'label-single-value': 'all',
  'groups-too-few': 'all',
  'groups-too-many': 'all',
  'success-needed': 'all',
  'outcomes-too-many': 'all',
  'units-disagree': 'all',
  'pairs-repeated': 'all',
  'pairs-none': 'all',
  'method-not-for-this': 'all',
  'question-not-for-method': 'all',
};

/** Which question answers a finding that is open. */
const steps: Readonly<Record<string, StepId>> = { 'label-variants': 'same' };

/** What the button says that puts the open question; null: there is none a person could answer here. */
export function questionLabel({ problem, open }: Shown): string | null {
  if (problem === null) return open.length === 0 ? null : l10n.t('Answer the open question…');
  switch (answers[problem.code]) {
    case 'below':
      return l10n.t('Say how they are counted…');
    case 'decimal':
      return l10n.t('Choose the decimal mark…');
    case 'delimiter':
      return l10n.t('Choose the delimiter…');
    case 'row':
      return l10n.t('Leave the row out…');
    case 'all':
      return l10n.t('Ask again…');
    default:
      return null;
  }
}

/** Puts the question that stands in the way. */
export async function answerQuestion(services: Services, comparison: Comparison): Promise<void> {
  const { shown } = comparison;
  if (shown === null) return;
  if (shown.problem === null) return answerFinding(services, comparison, shown);
  const { code, at } = shown.problem;
  switch (answers[code]) {
    case 'below':
      return read(
        services,
        comparison,
        await pick(l10n.t('How are values below or above a limit counted?'), below()),
      );
    case 'decimal':
      return read(services, comparison, await pick(l10n.t('Which mark parts the decimals?'), decimals()));
    case 'delimiter':
      return read(services, comparison, await pick(l10n.t('What parts the columns?'), delimiters()));
    case 'row':
      if (at === null) return;
      await showAt(services, comparison, at);
      return offerToLeaveOut(comparison, at);
    case 'all':
      return askAll(services, comparison);
    default:
      return;
  }
}

async function answerFinding(
  services: Services,
  comparison: Comparison,
  { open, view }: Shown,
): Promise<void> {
  const [id] = open;
  if (id === 'ragged-rows') {
    const at = view?.findings.open.find(finding => finding.id === id)?.cells[0]?.at;
    if (at === undefined) return;
    await showAt(services, comparison, at);
    return offerToLeaveOut(comparison, at);
  }
  const patch =
    id === undefined ? null : await askStep(services, comparison, comparison.request, steps[id] ?? 'units');
  if (patch === null || Object.keys(patch).length === 0) return;
  const unset = (['per', 'pair'] as const).filter(
    key => steps[id ?? ''] === undefined && patch[key] === undefined,
  );
  await comparison.act({ kind: 'change', patch, unset, when: now() });
}

/** Takes up how the file is to be read; what could not be asked before then follows. */
async function read(services: Services, comparison: Comparison, wish: Request['wish'] | null): Promise<void> {
  if (wish === null) return;
  const patch = { wish: { ...comparison.request.wish, ...wish } };
  await comparison.act({ kind: 'change', patch, when: now() });
  const { request, shown } = comparison;
  const wasAsked = request.measured ?? request.columns ?? request.summary;
  if (wasAsked === undefined && shown?.problem?.code === 'column-needed') await askAll(services, comparison);
}

async function askAll(services: Services, comparison: Comparison): Promise<void> {
  const { files, wish, confidence, rows, where } = comparison.request;
  const base: Request = {
    files,
    wish,
    ...(confidence === undefined ? {} : { confidence }),
    ...(rows === undefined ? {} : { rows }),
    ...(where === undefined ? {} : { where }),
  };
  const { files: uris, spans } = comparison.subject;
  await comparison.askAnew(await askComparison(services, uris, rows === undefined ? spans : [], base));
}

interface WishItem extends QuickPickItem {
  readonly wish: Request['wish'];
}

async function pick(title: string, items: readonly WishItem[]): Promise<Request['wish'] | null> {
  const picked = await window.showQuickPick(items, { title, ignoreFocusOut: true });
  return picked?.wish ?? null;
}

const below = (): readonly WishItem[] => [
  {
    label: l10n.t('as half the limit'),
    detail: l10n.t('Common for few values; makes them look alike'),
    wish: { below: 'half' },
  },
  { label: l10n.t('as the limit'), detail: l10n.t('The largest they can be'), wish: { below: 'limit' } },
  { label: l10n.t('as zero'), detail: l10n.t('The smallest they can be'), wish: { below: 'zero' } },
];

const decimals = (): readonly WishItem[] => [
  { label: l10n.t('comma'), description: '12,5', wish: { decimal: ',' } },
  { label: l10n.t('point'), description: '12.5', wish: { decimal: '.' } },
];

const delimiters = (): readonly WishItem[] => [
  { label: l10n.t('semicolon'), description: ';', wish: { delimiter: ';' } },
  { label: l10n.t('comma'), description: ',', wish: { delimiter: ',' } },
  { label: l10n.t('tab'), description: '', wish: { delimiter: '\t' } },
  { label: l10n.t('pipe'), description: '|', wish: { delimiter: '|' } },
];
