import { l10n, window, type Memento } from 'vscode';
import { fenced } from '../../settings/fenced';
import { askAnalyst, askSampling } from '../asking/askText';
import type { Comparison } from '../panel/comparison';

interface HandedOut {
  /** The settings block as it stands in a notebook. */
  readonly fenced: string;
  /** One paragraph that says the result. */
  readonly paragraph: string;
}

/** What may be said for the record by a program that asks for the block, so that nothing is asked. */
export interface Stated {
  readonly sampling: string;
  readonly analyst: string;
}

const ANALYST = 'analyst';
const asked = new WeakSet<Comparison>();

/**
 * The block of a comparison. The first time it is handed out, how the samples were taken and who did the analysis is
 * asked; both may stay empty. null: there is none, which is then said, or the person gave up.
 */
export async function blockToHandOut(
  comparison: Comparison | null,
  memory: Memento,
  stated: Stated | null,
): Promise<HandedOut | null> {
  if (comparison === null) {
    void window.showInformationMessage(
      l10n.t('Compare groups first: there is no comparison to take a settings block from.'),
    );
    return null;
  }
  if (blockOf(comparison) === null) return tellWhy(comparison);
  const said = stated ?? (asked.has(comparison) ? comparison.stated : await askStated(comparison, memory));
  if (said === null) return null;
  asked.add(comparison);
  const { sampling, analyst } = comparison.stated;
  if (said.sampling !== sampling || said.analyst !== analyst) {
    await comparison.state({ sampling: said.sampling, analyst: said.analyst });
  }
  return blockOf(comparison) ?? tellWhy(comparison);
}

function blockOf({ shown }: Comparison): HandedOut | null {
  if (shown === null || shown.blockText === null || shown.view === null) return null;
  return { fenced: fenced(shown.blockText), paragraph: shown.view.notebook.paragraph };
}

function tellWhy(comparison: Comparison): null {
  const { shown } = comparison;
  const why =
    shown?.view?.notebook.noBlock ?? shown?.problem?.message ?? l10n.t('It is still being computed.');
  void window.showWarningMessage(l10n.t('There is no settings block yet. {0}', why));
  return null;
}

async function askStated(comparison: Comparison, memory: Memento): Promise<Stated | null> {
  const { sampling, analyst } = comparison.stated;
  const how = await askSampling(sampling, l10n.t(' ({0} of {1})', 1, 2));
  if (how === null) return null;
  const known = analyst === '' ? (memory.get<string>(ANALYST) ?? '') : analyst;
  const who = await askAnalyst(known, l10n.t(' ({0} of {1})', 2, 2));
  if (who === null) return null;
  await memory.update(ANALYST, who);
  return { sampling: how, analyst: who };
}

/** What a program states with the command; null: nothing, so it is asked. */
export function statedBy(value: unknown): Stated | null {
  if (typeof value !== 'object' || value === null) return null;
  const { sampling, analyst } = value as Partial<Record<keyof Stated, unknown>>;
  return typeof sampling === 'string' && typeof analyst === 'string' ? { sampling, analyst } : null;
}
