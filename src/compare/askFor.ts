import { alikeOf, inOneUnit } from '../core/methods/alike';
import type { Ask, MethodDescriptor } from '../core/model/methods';

/**
 * What is asked of a method that stands beside the chosen one: the same, where both estimate in one unit. Else whether the
 * groups are alike is asked of it in its own unit; null where something other than that was asked.
 */
export function askFor(method: MethodDescriptor, chosen: MethodDescriptor, ask: Ask): Ask | null {
  if (inOneUnit(method, chosen)) return ask;
  const isAboutAlike = ask.against === alikeOf(chosen) && ASKS_ALIKE.includes(ask.question);
  return isAboutAlike ? { ...ask, against: alikeOf(method), margin: null } : null;
}

const ASKS_ALIKE: readonly Ask['question'][] = ['differs', 'higher', 'lower'];
