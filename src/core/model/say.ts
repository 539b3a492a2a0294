/** Words in the reader's language: an English literal with {0} places; the identity in tests and on the command line. */
export type Say = (english: string, ...args: readonly (string | number)[]) => string;

/** Numbers and names that a sentence is made from; core hands out facts, never sentences. */
export type Facts = Readonly<Record<string, string | number | readonly number[] | readonly string[] | null>>;

/** Why something cannot be computed or should not be relied on: a code and its facts. */
export interface Reason {
  readonly code: string;
  readonly facts: Facts;
}
