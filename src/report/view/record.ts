import { methodById } from '../../core/methods/index';
import type { Comparison, Row } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { fullDf, fullText } from '../numbersPrinted';
import { visible } from '../words/label';
import { statisticName } from '../words/methodWords';
import { recordIdOf, recordKeyOf } from '../words/recordKeys';
import type { ViewContext } from './context';
import { choiceRows, designRows, exclusionRows } from './recordChoices';
import { dataParts } from './recordData';
import type { RecordPart, RecordShown } from './shown';
import { statedOr } from './stated';

/** The full record of an exported page, every number at full precision; what each part holds follows design and results. */
export function recordOf(comparison: Comparison, context: ViewContext): RecordShown {
  const { t } = context;
  return {
    heading: t('Full record'),
    parts: [
      identity(context),
      ...dataParts(comparison, context),
      { heading: t('Design'), rows: designRows(comparison, context) },
      { heading: t('Left out'), rows: exclusionRows(comparison, t) },
      { heading: t('Choices'), rows: choiceRows(comparison, context) },
      ...comparison.groups.map(group => groupPart(group, t)),
      ...comparison.whatIf.rows.filter(row => row.result !== null).map(row => rowPart(row, comparison, t)),
      effectsPart(comparison, t),
      evidencePart(comparison, t),
      computation(comparison, context),
    ].filter(part => part.rows.length > 0),
    signOff: signOff(context),
  };
}

function identity({ t, provenance, blockText }: ViewContext): RecordPart {
  return {
    heading: t('Identity'),
    rows: [
      [t('record id'), recordIdOf(blockText) ?? t('none')],
      [t('written'), recordKeyOf(blockText, 'written') ?? t('not yet')],
      [t('replaces'), provenance.replaces ?? t('none')],
      [t('plan'), provenance.plan ?? t('none')],
      [t('question in words'), statedOr(provenance.questionInWords, t)],
      [t('analyst'), statedOr(provenance.analyst, t)],
    ],
  };
}

function groupPart(group: Comparison['groups'][number], t: Say): RecordPart {
  const numbers: readonly (readonly [string, number | null])[] = [
    [t('n'), group.n],
    [t('readings'), group.readings],
    [t('missing'), group.missing],
    [t('left out'), group.leftOut],
    ...(group.count === null ? [] : ([[t('counted outcomes'), group.count.x]] as const)),
    [group.count === null ? t('mean') : t('share'), group.mean],
    [t('SD'), group.sd],
    [t('standard error'), group.se],
    [t('median'), group.median],
    [t('lower quartile'), group.q1],
    [t('upper quartile'), group.q3],
    [t('lowest'), group.min],
    [t('highest'), group.max],
  ];
  return { heading: t('Group {0}', visible(group.label)), rows: filled(numbers) };
}

const filled = (
  numbers: readonly (readonly [string, number | null])[],
): readonly (readonly [string, string])[] =>
  numbers.map(([name, value]) => [name, fullText(value)] as const).filter(([, value]) => value !== '');

function rowPart(row: Row, { chosen }: Comparison, t: Say): RecordPart {
  const { result } = row;
  const name = `${row.id}, ${row.data}`;
  const isChosen = row.id === chosen.id && row.data === chosen.data;
  return {
    heading: isChosen ? t('Result: {0} (chosen)', name) : t('Result: {0}', name),
    rows: [
      ...filled([
        [t('difference'), result?.estimate ?? null],
        [t('standard error'), result?.se ?? null],
        [statisticName(row.id, t), result?.statistic ?? null],
      ]),
      ...(result === null || result.df === null
        ? []
        : [[t('degrees of freedom'), fullDf(result.df)] as const]),
      ...filled([
        ['p', result?.p ?? null],
        [t('confidence'), result?.confidence ?? null],
        [t('lower limit'), result?.lower ?? null],
        [t('upper limit'), result?.upper ?? null],
        [t('two-sided p'), result?.twoSided?.p ?? null],
        [t('two-sided lower limit'), result?.twoSided?.lower ?? null],
        [t('two-sided upper limit'), result?.twoSided?.upper ?? null],
      ]),
      [t('decision'), row.decision ?? t('none')],
      [t('counted'), row.counted ? t('yes') : t('no')],
    ],
  };
}

function effectsPart({ effects }: Comparison, t: Say): RecordPart {
  return {
    heading: t('Effect sizes'),
    rows: effects.map(({ id, value, lower, upper }) => [
      id,
      [value, lower, upper]
        .map(fullText)
        .filter(text => text !== '')
        .join('; '),
    ]),
  };
}

function evidencePart({ evidence }: Comparison, t: Say): RecordPart {
  return {
    heading: t('Evidence on the assumptions'),
    rows: evidence.map(({ id, statistic, df, p }) => [
      id,
      [fullText(statistic), fullDf(df), p === null ? '' : `p ${fullText(p)}`]
        .filter(text => text !== '')
        .join('; '),
    ]),
  };
}

function computation({ chosen }: Comparison, { t, version, provenance }: ViewContext): RecordPart {
  const method = methodById(chosen.id);
  return {
    heading: t('Computation'),
    rows: [
      [t('computed by'), t('Weighbeam {0}', version)],
      [t('method'), t('{0}, version {1}', chosen.id, method?.version ?? 0)],
      ...(method?.references ?? []).map(
        (reference, index) => [index === 0 ? t('sources') : '', reference] as const,
      ),
      [t('results looked at before this one'), String(provenance.looks)],
    ],
  };
}

function signOff({ t, blockText }: ViewContext): RecordShown['signOff'] {
  return {
    heading: t('Signed'),
    rows: [t('Performed'), t('Checked')],
    columns: [t('meaning'), t('name'), t('date'), t('record id')],
    recordId: recordIdOf(blockText) ?? '',
    foot: [
      t('A typed name is not an electronic signature.'),
      t(
        'This page records a calculation; it does not by itself make a laboratory’s records meet any standard or rule.',
      ),
    ],
  };
}
