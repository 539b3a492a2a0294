import type { Facts, Reason, Say } from '../core/model/say';
import type { Outcome, OutcomeChange } from '../recheck/outcome';
import { fullText, printSignificant, withMinus } from './numbersPrinted';
import { problemWords } from './problem';
import { visible } from './words/label';
import { withFacts } from './words/withFacts';

const MOST_NAMED = 3;
const LEAST_DIGITS = 3;
const MOST_DIGITS = 17;

/** What is named first of all that moved: what decides, then how large, then how sure. */
const FIRST = ['result.decision', 'result.depends-on-choice', 'result.difference', 'result.p'];

/** What became of a settings block, in one sentence that names what was and what is. */
export function outcomeSentence(outcome: Outcome, t: Say): string {
  const notes = outcome.notes.map(note => outcomeNote(note, t));
  return [kindSentence(outcome, t), ...notes].join('; ');
}

function kindSentence(outcome: Outcome, t: Say): string {
  const changes = changesWords(outcome.changes, t);
  switch (outcome.kind) {
    case 'same':
      return t('the data used and the numbers are the same');
    case 'moved':
      return t('the data changed; the conclusion holds{0}', changes);
    case 'turned':
      return t('the data changed and the conclusion with them{0}', changes);
    case 'altered':
      return t('the data are the same, but the record does not follow from them{0}', changes);
    case 'reworked':
      return t('data and settings are the same; this version computes the method otherwise{0}', changes);
    case 'planned':
      return t('no result yet');
    case 'blocked': {
      if (outcome.reason === null) return t('cannot be computed');
      const { message, where, fix } = problemWords(outcome.reason, t, outcome.files);
      const place = where ?? dataPlace(outcome.files, message);
      return place === null ? `${message}. ${fix}` : `${message} (${place}). ${fix}`;
    }
  }
}

/** The data files, for a problem that names no place of its own. */
function dataPlace(files: readonly string[], message: string): string | null {
  const names = files.map(visible);
  return names.length === 0 || names.some(name => message.includes(name)) ? null : names.join(', ');
}

/** ": p was 0.003, is 0.004; difference was …", or ''. */
function changesWords(changes: readonly OutcomeChange[], t: Say): string {
  if (changes.length === 0) return '';
  const rank = ({ key }: OutcomeChange): number => (FIRST.includes(key) ? FIRST.indexOf(key) : FIRST.length);
  const sorted = [...changes].sort((a, b) => rank(a) - rank(b));
  const named = sorted.slice(0, MOST_NAMED).map(change => changeWords(change, t));
  const more = changes.length - named.length;
  return `: ${named.join('; ')}${more === 0 ? '' : `; ${t('{0} more', more)}`}`;
}

/** "p was 0.003, is 0.004". */
function changeWords(change: OutcomeChange, t: Say): string {
  const { was, is } = changeTexts(change);
  return t('{0} was {1}, is {2}', keyWords(change.key), was, is);
}

/** Both values with as few digits as tell them apart, three at least. */
function changeTexts({ was, is }: OutcomeChange): { readonly was: string; readonly is: string } {
  const text = (value: string | number, digits: number): string =>
    typeof value === 'string' ? visible(value) : printSignificant(value, digits);
  for (let digits = LEAST_DIGITS; digits < MOST_DIGITS; digits += 1) {
    const pair = { was: text(was, digits), is: text(is, digits) };
    if (pair.was !== pair.is) return pair;
  }
  const full = (value: string | number): string =>
    typeof value === 'string' ? visible(value) : withMinus(fullText(value));
  return { was: full(was), is: full(is) };
}

const keyWords = (key: string): string => visible(key.replace(/^result\./, ''));

function outcomeNote({ code, facts }: Reason, words: Say): string {
  const t = withFacts(words);
  switch (code) {
    case 'lines-moved':
      return t('lines of the file have moved');
    case 'file-changed':
      return t('the file has changed elsewhere');
    case 'text-edited':
      return t('the text of the block was edited after it was written');
    case 'questions-open':
      return t('the data now ask a question that was not answered: {0}', listed(facts['ids']));
    case 'unknown-keys':
      return t('keys that this version does not know were kept: {0}', listed(facts['keys']));
    case 'replaced':
      return t('replaced by the record on line {0}', listed(facts['lines']));
    default:
      return visible(code);
  }
}

const listed = (names: Facts[string] | undefined): string => (Array.isArray(names) ? names.join(', ') : '');
