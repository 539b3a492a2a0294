import { wordsOf } from '../../compare/varianceAssumption';
import { methods } from '../../core/methods/index';
import type { Comparison } from '../../core/model/comparison';
import type { Measure, Question } from '../../core/model/settings';
import type { MethodDescriptor } from '../../core/model/methods';
import type { Say } from '../../core/model/say';
import { printPercent } from '../numbersPrinted';
import { estimatesOf } from '../words/estimates';
import type { Scale } from '../words/scale';
import { marginText } from './marginHeadline';
import type { ControlShown } from './shown';

/** What can be changed beside the answer, each with what it is set to now. */
export function controlsOf(comparison: Comparison, scale: Scale, t: Say): readonly ControlShown[] {
  const { settings, design } = comparison;
  const { question, confidence, measure, matters, margin } = settings;
  const all: readonly (ControlShown | null)[] = [
    { key: 'question', label: t('Does'), value: questionWords(question, t) },
    design === 'two' && measure === 'mean'
      ? { key: 'variance', label: t('variances'), value: varianceWords(settings.method, t) }
      : null,
    { key: 'confidence', label: t('confidence'), value: t('{0}%', printPercent(confidence)) },
    scales().length > 1 && measure !== 'proportion'
      ? { key: 'measure', label: t('scale'), value: measureWords(measure, t) }
      : null,
    estimatesOf(comparison.chosen) === 'difference'
      ? {
          key: 'matters',
          label: t('matters'),
          value: matters === null ? t('not stated') : scale.typed(matters),
        }
      : null,
    margin === null
      ? null
      : { key: 'margin', label: t('margin'), value: marginText(scale, margin[0], margin[1], t) },
  ];
  return all.filter(control => control !== null);
}

/** Measures of numbers that some method compares. */
function scales(): readonly Measure[] {
  const list: readonly MethodDescriptor[] = methods;
  return [...new Set(list.map(method => method.measure).filter(measure => measure !== 'proportion'))];
}

function questionWords(question: Question, t: Say): string {
  switch (question) {
    case 'differs':
      return t('differ');
    case 'higher':
      return t('lie higher');
    case 'lower':
      return t('lie lower');
    case 'equivalent':
      return t('stay within the margin');
    case 'not-lower':
      return t('stay not lower by the margin');
    case 'not-higher':
      return t('stay not higher by the margin');
  }
}

function varianceWords(method: string, t: Say): string {
  const words = wordsOf(method);
  if (words === null) return t('not assumed');
  const variance =
    words.variance === 'separate' ? t('separate') : words.variance === 'pooled' ? t('pooled') : t('known');
  if (words.df === 'smaller') return t('{0}, smaller df', variance);
  return words.curve === 'normal' && words.variance !== 'known' ? t('{0}, normal curve', variance) : variance;
}

function measureWords(measure: Measure, t: Say): string {
  switch (measure) {
    case 'mean':
      return t('as measured');
    case 'ratio':
      return t('logarithms');
    case 'proportion':
      return t('shares');
    case 'rank':
      return t('ranks');
    case 'spread':
      return t('spread');
  }
}
