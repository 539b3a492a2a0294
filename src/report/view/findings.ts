import { evidenceById } from '../../core/evidence/index';
import type { Comparison, Evidence, Finding } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { printDf, printThree, sayP } from '../numbersPrinted';
import { placeWords } from '../words/places';
import { counted, unitNoun } from '../words/unitNoun';
import { withFacts } from '../words/withFacts';
import type { FindingShown, FindingsShown } from './shown';

const MOST_OPEN = 5;
const LEVELS = ['stop', 'ask', 'warn', 'note'] as const;

/** What the file shows: what needs attention open, gravest first; notes folded; how much was looked at and saw nothing. */
export function findingsOf(comparison: Comparison, t: Say): FindingsShown {
  const sorted = LEVELS.flatMap(level => comparison.findings.filter(finding => finding.level === level));
  const shown = sorted.map(finding => findingOf(finding, comparison, t));
  const open = shown.filter(finding => finding.level !== 'note').slice(0, MOST_OPEN);
  const rest = shown.filter(finding => !open.includes(finding));
  return {
    heading: t('What the file shows'),
    open,
    folded: rest.length === 0 ? null : { summary: restSummary(rest, t), list: rest },
    quiet: quietSentence(comparison, t),
  };
}

function findingOf(finding: Finding, { settings }: Comparison, t: Say): FindingShown {
  return {
    id: finding.id,
    level: finding.level,
    levelWord: levelWord(finding.level, t),
    sentence: findingSentence(finding, t),
    cells: finding.cells.map(at => ({ at, label: placeWords(at, settings.files, t) })),
  };
}

function levelWord(level: Finding['level'], t: Say): string {
  switch (level) {
    case 'stop':
      return t('stop');
    case 'ask':
      return t('ask');
    case 'warn':
      return t('warn');
    case 'note':
      return t('note');
  }
}

function restSummary(rest: readonly FindingShown[], t: Say): string {
  if (rest.some(({ level }) => level !== 'note')) return t('{0} more', rest.length);
  return rest.length === 1 ? t('1 note') : t('{0} notes', rest.length);
}

function quietSentence(comparison: Comparison, t: Say): string {
  const { quiet, groups, settings } = comparison;
  if (settings.layout.kind === 'typed' || settings.layout.kind === 'summary')
    return t('No check of the data was possible.');
  const saw =
    quiet.sawNothing === 1 ? t('1 check saw nothing') : t('{0} checks saw nothing', quiet.sawNothing);
  if (quiet.cannotTell === 0) return `${saw}.`;
  const smallest = Math.min(...groups.map(group => group.n));
  return t(
    '{0}; {1} cannot tell with {2}.',
    saw,
    quiet.cannotTell,
    counted(smallest, unitNoun(comparison, t)),
  );
}

/** The sentence of a finding, in the words of the check that found it. */
export function findingSentence(finding: Finding, t: Say): string {
  return evidenceById(finding.id)?.say(finding, withFacts(t)) ?? finding.id;
}

/** Evidence on an assumption: what was looked at, its statistic and p, and what the check says of it. */
export function evidenceSentence(found: Evidence, { settings }: Comparison, t: Say): string {
  const title = evidenceById(found.id)?.title(t) ?? found.id;
  const numbers = evidenceNumbers(found, settings.confidence, t);
  const sentence = findingSentence(found, t);
  return numbers === null ? `${title}. ${sentence}` : `${title}: ${numbers}. ${sentence}`;
}

function evidenceNumbers({ statistic, df, p }: Evidence, confidence: number, t: Say): string | null {
  const parts: string[] = [];
  if (statistic !== null && Number.isFinite(statistic)) {
    const value = printThree(statistic);
    parts.push(
      df === null
        ? t('statistic {0}', value)
        : typeof df === 'number'
          ? t('statistic {0} on {1} degrees of freedom', value, printDf(df))
          : t('F {0} on {1} and {2} degrees of freedom', value, printDf(df[0]), printDf(df[1])),
    );
  }
  if (p !== null && Number.isFinite(p)) parts.push(sayP(p, confidence));
  return parts.length === 0 ? null : parts.join(', ');
}
