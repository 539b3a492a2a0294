import type { Say } from '../core/model/say';

/** The command line speaks English: the literal itself, with its places filled. */
export const english: Say = (text, ...args) =>
  text.replace(/\{(\d+)\}/g, (place, index: string) => String(args[Number(index)] ?? place));
