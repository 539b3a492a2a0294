import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import type { Layout, Relation, Settings } from '../../core/model/settings';
import { estimateName } from '../words/estimates';
import { showLabel, visible } from '../words/label';
import { methodAssumes } from '../words/methodWords';
import type { ViewContext } from './context';
import { changedSentences } from './changed';
import type { RecordPart } from './shown';
import { statedOr } from './stated';

type Rows = RecordPart['rows'];

/** What was compared with what, and how rows belong together. */
export function designRows(comparison: Comparison, { t, provenance }: ViewContext): Rows {
  const { settings, unit, pairs } = comparison;
  return [
    ...layoutRows(settings.layout, t),
    [t('unit'), unit ?? t('not stated')],
    [t('difference'), estimateName(comparison, t)],
    ...settings.same.map(
      ([from, to]) => [t('labels declared the same'), `${showLabel(from)} \u2192 ${showLabel(to)}`] as const,
    ),
    [
      t('rows'),
      settings.rows === 'all' ? t('all') : settings.rows.map(([from, to]) => `${from}\u2013${to}`).join(', '),
    ],
    ...settings.where.map(
      ([column, label]) => [t('only where'), `${showLabel(column)} = ${showLabel(label)}`] as const,
    ),
    ...relationRows(settings.relation, settings, t),
    ...(pairs === null
      ? []
      : [[t('without a partner'), pairs.unmatched.map(showLabel).join(', ') || t('none')] as const]),
    [t('sampling'), statedOr(provenance.sampling, t)],
  ];
}

function layoutRows(layout: Layout, t: Say): Rows {
  switch (layout.kind) {
    case 'long':
      return [
        [t('measured column'), layout.measured.map(showLabel).join(', ')],
        [t('label column'), showLabel(layout.label)],
      ];
    case 'wide':
      return [[t('one column a group'), layout.columns.map(showLabel).join(', ')]];
    case 'files':
      return [[t('measured column, one group a file'), showLabel(layout.measured)]];
    case 'summary':
      return [[t('rows are summaries, label column'), showLabel(layout.label)]];
    case 'typed':
      return [[t('numbers typed'), layout.groups.map(group => showLabel(group.label)).join(', ')]];
  }
}

function relationRows(relation: Relation, { numberingRestarts }: Settings, t: Say): Rows {
  const restarts: Rows = numberingRestarts ? [[t('ids'), t('start again in each group')]] : [];
  switch (relation.kind) {
    case 'rows':
      return [[t('rows are'), t('not stated')], ...restarts];
    case 'independent':
      return [[t('rows are'), t('independent, as stated')], ...restarts];
    case 'units':
      return [[t('unit columns, outermost first'), relation.columns.map(showLabel).join(', ')], ...restarts];
    case 'pairs':
      return [[t('pair column'), showLabel(relation.column)], ...restarts];
  }
}

/** Every row left out, or that there is none. */
export function exclusionRows({ leftOut }: Comparison, t: Say): Rows {
  if (leftOut.length === 0) return [[t('rows'), t('none')]];
  return leftOut.map(row => {
    const unit = row.unit.map(([column, id]) => `${showLabel(column)} ${showLabel(id)}`).join(', ');
    const when = row.afterResult ? t('after the result was seen') : t('before the result');
    const parts = [showLabel(row.group), unit, showLabel(row.value), visible(row.reason), when];
    return [t('line {0}', row.line), parts.filter(part => part !== '').join('; ')] as const;
  });
}

/** Question, method and every number typed, each with its reason where one was given; what was changed after a result. */
export function choiceRows(comparison: Comparison, { t, provenance }: ViewContext): Rows {
  const { settings } = comparison;
  const options = Object.entries(settings.options).map(
    ([key, value]) => [key, visible(typeof value === 'object' ? value.join(', ') : String(value))] as const,
  );
  return [
    [t('measure'), settings.measure],
    [t('method'), t('{0}: {1}', settings.method, methodAssumes(settings.method, t))],
    [t('question'), settings.question],
    [t('confidence'), String(settings.confidence)],
    [t('held against'), String(settings.against)],
    [t('matters'), settings.matters === null ? t('not stated') : String(settings.matters)],
    ...(settings.margin === null ? [] : [[t('margin'), settings.margin.join(', ')] as const]),
    ...options,
    ...Object.entries(provenance.reasons).map(
      ([key, reason]) => [t('reason for {0}', visible(key)), visible(reason)] as const,
    ),
    ...changedSentences(provenance, comparison, t).map(
      (sentence, index) => [index === 0 ? t('changed') : '', sentence] as const,
    ),
  ];
}
