import { evidenceChecks } from '../core/evidence/index';
import { methods } from '../core/methods/index';
import type { EvidenceDescriptor } from '../core/model/comparison';
import type { MethodDescriptor, OptionSpec } from '../core/model/methods';
import type { Say } from '../core/model/say';
import { tabulated, wrapped } from './terminal/columns';

const WIDTH = 80;

/** Every method of the registry by measure, one line each: id, short name, what choosing it claims. */
export function methodsText(t: Say, list: readonly MethodDescriptor[] = methods): string {
  const measures = [...new Set(list.map(({ measure }) => measure))];
  const blocks = measures.map(measure => {
    const own = list.filter(method => method.measure === measure);
    const rows = own.map(method => [`  ${method.id}`, method.title(t)]);
    const lines = tabulated(rows, 2).flatMap((line, at) => [
      line,
      ...wrapped(own[at]?.assumes(t) ?? '', WIDTH, '      '),
    ]);
    return [t('measure {0}', measure), ...lines].join('\n');
  });
  return `${blocks.join('\n\n')}\n\n${t('More about one of them: weighbeam explain ID')}\n`;
}

/** What a method or a check of the data does, when not to use it, and its sources; null for an unknown id. */
export function explainText(
  id: string,
  t: Say,
  list: readonly MethodDescriptor[] = methods,
  checks: readonly EvidenceDescriptor[] = evidenceChecks,
): string | null {
  const method = list.find(known => known.id === id);
  if (method !== undefined) return explainMethod(method, t);
  const check = checks.find(known => known.id === id);
  return check === undefined ? null : explainCheck(check, t);
}

function explainMethod(method: MethodDescriptor, t: Say): string {
  return paragraphs([
    [`${method.id}: ${method.title(t)}`],
    wrapped(method.explains(t), WIDTH),
    labelled(t('claims'), method.assumes(t)),
    labelled(t('not when'), method.notWhen(t)),
    labelled(t('answers'), method.questions.join(', ')),
    labelled(
      t('counts'),
      method.counted
        ? t(
            'yes, towards whether the decision depends on the choice, unless something speaks against it on the data',
          )
        : t('no: it is shown beside the others'),
    ),
    optionLines(method.options, t),
    sourceLines(method.references, t),
    [t('version {0}', method.version)],
  ]);
}

function explainCheck(check: EvidenceDescriptor, t: Say): string {
  return paragraphs([
    [`${check.id}: ${check.title(t)}`],
    wrapped(t('A check of what the file shows. It reports; it never changes the method or the data.'), WIDTH),
    optionLines(check.thresholds, t),
    sourceLines(check.references, t),
  ]);
}

const labelled = (label: string, text: string): readonly string[] => wrapped(text, WIDTH, `${label}: `, 2);

function optionLines(options: readonly OptionSpec[], t: Say): readonly string[] {
  return options.flatMap(option => {
    const usual = option.default === null ? '' : ` ${t('(else {0})', String(option.default))}`;
    return wrapped(`${option.says(t)}${usual}`, WIDTH, `--${option.flag}: `, 2);
  });
}

const sourceLines = (references: readonly string[], t: Say): readonly string[] =>
  references.length === 0
    ? [t('source: common practice, none published')]
    : references.flatMap(reference => labelled(t('source'), reference));

const paragraphs = (parts: readonly (readonly string[])[]): string =>
  `${parts
    .filter(lines => lines.length > 0)
    .map(lines => lines.join('\n'))
    .join('\n\n')}\n`;
