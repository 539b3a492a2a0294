import type { Say } from '../core/model/say';

/**
 * Words in the reader's language from an editor's bundle of translations (keys are the English literals, a comment may
 * follow a slash); a literal that the bundle lacks stays English. Places {0}, {1} … are filled from the arguments.
 */
export function sayFrom(bundle: Readonly<Record<string, string>> | null): Say {
  return (english, ...args) => {
    const literal = bundle?.[english] ?? english;
    return literal.replace(/\{(\d+)\}/g, (place, index: string) => {
      const arg = args[Number(index)];
      return arg === undefined ? place : String(arg);
    });
  };
}
