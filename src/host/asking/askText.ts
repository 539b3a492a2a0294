import { InputBoxValidationSeverity, l10n, window } from 'vscode';
import { readNumber } from './readNumber';

interface TextWanted {
  readonly title: string;
  readonly prompt: string;
  readonly value?: string;
  readonly placeholder?: string;
  readonly required?: boolean;
}

/** One line of text; null when the person gave up. */
export async function askText(wanted: TextWanted): Promise<string | null> {
  const text = await window.showInputBox({
    title: wanted.title,
    prompt: wanted.prompt,
    value: wanted.value ?? '',
    placeHolder: wanted.placeholder ?? '',
    ignoreFocusOut: true,
    validateInput: typed =>
      wanted.required === true && typed.trim() === ''
        ? { message: l10n.t('A few words are needed'), severity: InputBoxValidationSeverity.Error }
        : null,
  });
  return text === undefined ? null : text.trim();
}

/** How the samples were taken, one line for the record, which may stay empty; null when the person gave up. */
export const askSampling = (value: string, step = ''): Promise<string | null> =>
  askText({
    title: l10n.t('How were the samples taken?') + step,
    prompt: l10n.t('One line for the settings block; leave it empty when it is not known'),
    placeholder: l10n.t('for example: 3 tiles a firing, places by lot'),
    value,
  });

/** Who did the analysis, which may stay empty; null when the person gave up. */
export const askAnalyst = (value: string, step = ''): Promise<string | null> =>
  askText({
    title: l10n.t('Who did the analysis?') + step,
    prompt: l10n.t('A name for the settings block; it is not a signature, and may stay empty'),
    value,
  });

/** A confidence between 0 and 1; typed as percent it is turned down with what to type instead. */
export async function askConfidence(now: number): Promise<number | null> {
  const typed = await window.showInputBox({
    title: l10n.t('Confidence of the interval'),
    prompt: l10n.t('Between 0 and 1, for example 0.95'),
    value: String(now),
    ignoreFocusOut: true,
    validateInput: text => wrongConfidence(readNumber(text)),
  });
  return typed === undefined ? null : readNumber(typed);
}

function wrongConfidence(
  value: number | null,
): { message: string; severity: InputBoxValidationSeverity } | null {
  if (value !== null && value > 0 && value < 1) return null;
  const message =
    value !== null && value > 1 && value < 100
      ? l10n.t('Between 0 and 1: for {0} percent type {1}', value, value / 100)
      : l10n.t('Between 0 and 1, for example 0.95');
  return { message, severity: InputBoxValidationSeverity.Error };
}

/** The smallest difference that matters; 'none' takes it back; null when the person gave up. */
export async function askMatters(now: number | null, unit: string | null): Promise<number | 'none' | null> {
  const typed = await window.showInputBox({
    title: l10n.t('From which difference on does it matter in practice?'),
    prompt:
      unit === null
        ? l10n.t('In units of the measured column; leave it empty when nothing is stated')
        : l10n.t('In {0}; leave it empty when nothing is stated', unit),
    value: now === null ? '' : String(now),
    ignoreFocusOut: true,
    validateInput: text => {
      const value = readNumber(text);
      if (text.trim() === '' || (value !== null && value > 0)) return null;
      return {
        message: l10n.t('A number above 0, for example 15 or 0.5'),
        severity: InputBoxValidationSeverity.Error,
      };
    },
  });
  if (typed === undefined) return null;
  return typed.trim() === '' ? 'none' : readNumber(typed);
}
