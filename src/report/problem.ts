import type { Problem, ProblemCode, Refusal } from '../core/model/problem';
import type { Say } from '../core/model/say';
import { askingProblems } from './problems/asking';
import { computingProblems } from './problems/computing';
import { namingProblems } from './problems/naming';
import { readingProblems } from './problems/reading';
import { toldBy, type SayProblem } from './problems/told';
import { visible } from './words/label';

/** One sentence and one remedy for every way of being refused: a code without words does not compile. */
const words: Readonly<Record<ProblemCode, SayProblem>> = {
  ...readingProblems,
  ...namingProblems,
  ...askingProblems,
  ...computingProblems,
};

/** A refusal in words: what happened, where (file, line and column, each from 1), and what to do. */
export function problemWords(refusal: Refusal, t: Say, files: readonly string[] = []): Problem {
  const { message, fix } = words[refusal.code](toldBy(refusal.facts, t));
  return { code: refusal.code, message, where: whereOf(refusal, message, t, files), fix };
}

/** The same for the command line: what to do also names what to type. */
export function problemWithFlag(refusal: Refusal, t: Say, files: readonly string[] = []): Problem {
  const { flag } = words[refusal.code](toldBy(refusal.facts, t));
  const problem = problemWords(refusal, t, files);
  return flag === undefined ? problem : { ...problem, fix: `${problem.fix.replace(/\.$/u, '')} (${flag}).` };
}

/** A problem on one line, as the command line prints it; surfaces have problems of their own beside those of core. */
export function problemLine({
  code,
  message,
  where,
  fix,
}: Omit<Problem, 'code'> & { readonly code: string }): string {
  return `${code}: ${message}${where === null ? '' : ` (${where})`}. ${fix}`;
}

/** A name that the message bears already is not said twice. */
function whereOf({ where }: Refusal, message: string, t: Say, files: readonly string[]): string | null {
  if (where === null) return null;
  if (typeof where === 'string') return message.includes(visible(where)) ? null : visible(where);
  const file = files[where.file];
  const place = t('line {0}, column {1}', where.line, where.field + 1);
  return file === undefined ? place : `${visible(file)} ${place}`;
}
