import type { Comparison } from '../core/model/comparison';
import type { Say } from '../core/model/say';
import type { Scale } from './words/scale';

/** The one line that stands under every answer. */
export const quietCaution = (t: Say): string =>
  t(
    'A calculation on this file; it does not know how the samples were taken. Local rules, protocols and licensed practice come first.',
  );

const PEOPLE =
  /\b(patients?|clinical|doses?|dosage|adverse|serum|blood|mortality|survival|symptoms?|treatment arm)\b/iu;
const ANIMALS = /\b(animals?|mice|mouse|rats?|pigs?|cattle|calves|fish|hens?)\b/iu;
const FOOD_AND_WATER =
  /\b(foods?|feed|milk|meat|drinking|groundwater|wastewater|effluent|discharge|emissions?|exposure|leach\w*|contamina\w*|toxic\w*|residues?|pesticides?|lead|arsenic|cadmium|mercury)\b/iu;
const STRUCTURES = /\b(strength|load|failures?|fatigue|fracture|weld\w*|bridge|brakes?)\b/iu;
const RELEASE = /\b(release|lots?|batch release|limits?|potency|purity|impurit\w*)\b/iu;

/**
 * The fuller text for results that can hurt someone: where the measured column, the groups or the question in words
 * suggest people, animals, food, water, structures or release. Empty elsewhere.
 */
export function cautionsFor(
  comparison: Comparison,
  questionInWords: string,
  scale: Scale,
  t: Say,
): readonly string[] {
  const words = wordsOf(comparison, questionInWords);
  const any = [PEOPLE, ANIMALS, FOOD_AND_WATER, STRUCTURES, RELEASE].some(kind => kind.test(words));
  if (!any) return [];
  const { chosen, settings } = comparison;
  const harm = harmSentence(chosen.result, scale, t);
  return [
    t(
      'The words of this file suggest a result that can hurt someone. This is a calculation on the file you gave: it does not know how samples were taken, whether the measurement was valid, or what rules apply to you. A person licensed or authorised for this decision must judge it against the applicable protocol, regulation or standard; where that names a statistical method, sample size, rounding rule or level, it takes precedence over the defaults here.',
    ),
    ...(FOOD_AND_WATER.test(words) || /\blimits?\b/i.test(words)
      ? [
          t(
            'Not exceeding a limit and not differing from a background are different questions. A difference that is not settled does not show that a limit is met. Use the procedure that your permit or regulation prescribes.',
          ),
        ]
      : []),
    ...(harm === null ? [] : [harm]),
    ...(RELEASE.test(words) && settings.question === 'differs'
      ? [
          t(
            'This comparison looks for a difference. To claim that two groups are equivalent, a margin has to be fixed beforehand and that question asked.',
          ),
        ]
      : []),
    ...(PEOPLE.test(words) ? [t('A difference of averages says nothing about an individual patient.')] : []),
  ];
}

function harmSentence(result: Comparison['chosen']['result'], scale: Scale, t: Say): string | null {
  if (result === null || (result.lower === null && result.upper === null)) return null;
  return t(
    'With few values a real harm is easily missed. Look at the end of the interval on the harmful side: these data allow a true difference of {0}.',
    scale.withUnit(scale.interval(result.twoSided ?? result).text),
  );
}

/** Underscores part words here, so that "leach_mg_L" is read as it is meant. */
function wordsOf({ measured, settings, groups }: Comparison, questionInWords: string): string {
  const column =
    settings.layout.kind === 'long' || settings.layout.kind === 'summary' ? settings.layout.label : '';
  return [measured, column, ...groups.map(group => group.label), questionInWords]
    .join(' ')
    .replace(/_/g, ' ');
}
