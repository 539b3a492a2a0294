import type { Facts, Say } from '../../core/model/say';
import { showLabel } from '../words/label';

/** The facts of a refusal as text; what is absent is null, so that a sentence can do without it. */
export interface Told {
  readonly t: Say;
  readonly text: (name: string) => string | null;
  readonly number: (name: string) => number | null;
  /** Names joined by commas, the first 20 of them; labels with their number of rows where that is known. */
  readonly list: (name: string) => string | null;
  /** The names as they are. */
  readonly names: (name: string) => readonly string[];
}

/** What happened, and what to do. */
export interface ProblemWords {
  readonly message: string;
  readonly fix: string;
  /** What to type on the command line to do it; no other surface shows it. */
  readonly flag?: string;
}

export type SayProblem = (told: Told) => ProblemWords;

const MOST_NAMED = 20;

export function toldBy(facts: Facts, t: Say): Told {
  return {
    t,
    text: name => {
      const fact = facts[name];
      if (typeof fact === 'string') return fact === '' ? null : showLabel(fact);
      return typeof fact === 'number' ? String(fact) : null;
    },
    number: name => {
      const fact = facts[name];
      return typeof fact === 'number' ? fact : null;
    },
    names: name => {
      const fact = facts[name];
      return Array.isArray(fact) ? fact.map(String) : [];
    },
    list: name => {
      const fact = facts[name];
      if (!Array.isArray(fact) || fact.length === 0) return null;
      const names = fact
        .slice(0, MOST_NAMED)
        .map((one, at) => `${showLabel(String(one))}${name === 'labels' ? rowsOf(facts, at) : ''}`);
      return fact.length > MOST_NAMED ? `${names.join(', ')}, …` : names.join(', ');
    },
  };
}

function rowsOf({ counts }: Facts, at: number): string {
  const count = Array.isArray(counts) ? (counts as readonly (string | number)[])[at] : undefined;
  return count === undefined ? '' : ` (${count})`;
}
