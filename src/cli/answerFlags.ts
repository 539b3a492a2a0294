import type { Comparison, Finding } from '../core/model/comparison';
import type { Settings } from '../core/model/settings';
import type { View } from '../report/view';

/** One way of answering a question as it is typed, or null where no flag says it. */
function flagOf(answer: Partial<Settings>, settings: Settings): string | null {
  const { relation, numberingRestarts, same } = answer;
  if (numberingRestarts === true) return '--pair none';
  if (relation?.kind === 'pairs') return `--pair ${worded(relation.column)}`;
  if (relation?.kind === 'units') return `--per ${worded(relation.columns.join(','))}`;
  if (relation?.kind === 'independent') return '--per none';
  const merges = same?.slice(settings.same.length) ?? [];
  return merges.length === 0 ? null : merges.map(([from, to]) => `--same "${from} -> ${to}"`).join(' ');
}

const worded = (text: string): string => (/^[\w.,#-]+$/.test(text) ? text : `"${text}"`);

function flagsOf({ answers }: Finding, settings: Settings): string {
  const flags = answers.map(answer => flagOf(answer, settings)).filter(flag => flag !== null);
  return flags.length === 0 ? '' : ` Answer with ${flags.map(tied).join(', or ')}.`;
}

/** Stands for a space inside a flag while lines are broken, so that a flag can be copied from one line. */
const TIE = '\u{e000}';
const tied = (flag: string): string => flag.replaceAll(' ', TIE);

/** Loosens what `withFlags` has tied, once lines are broken. */
export const untied = (text: string): string => text.replaceAll(TIE, ' ');

/** A view whose open questions end with the flags that answer them, each tied to stay on one line. */
export function withFlags(view: View, { findings, settings }: Comparison): View {
  const asked = findings.filter(({ level }) => level === 'ask');
  const open = view.answer.open.map((sentence, at) => {
    const finding = asked[at];
    return finding === undefined ? sentence : `${sentence}${flagsOf(finding, settings)}`;
  });
  return { ...view, answer: { ...view.answer, open } };
}
