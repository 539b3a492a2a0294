import type { Ask, MethodDescriptor } from '../core/model/methods';
import type { Settings } from '../core/model/settings';

/** What a method is asked: the question and the options, each at its declared default unless set. */
export function askOf(settings: Settings, list: readonly MethodDescriptor[]): Ask {
  const defaults = new Map(
    list.flatMap(({ options }) => options.map(option => [option.key, option.default] as const)),
  );
  const { question, confidence, against, margin, options } = settings;
  return { question, confidence, against, margin, option: key => options[key] ?? defaults.get(key) ?? null };
}
