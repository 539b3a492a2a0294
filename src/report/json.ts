import type { Comparison, Finding, Row } from '../core/model/comparison';
import type { Say } from '../core/model/say';
import { verdictSentence } from './view/verdictSentence';
import { summarySentence } from './view/summarySentence';
import { findingSentence } from './view/findings';
import { reasonWords } from './words/methodWords';
import { noteWords } from './words/noteWords';
import { scaleOf } from './words/scale';

type Json = Readonly<Record<string, unknown>>;

/**
 * A comparison as a plain object for other programs: every number as the double it is (null where there is none or it is
 * not finite), sentences in the reader's language. The keys are a contract; more may be added, none may go.
 */
export function jsonReport(comparison: Comparison, t: Say): Json {
  const { settings, whatIf, chosen } = comparison;
  const scale = scaleOf(comparison, t);
  const row = (own: Row): Json => rowOf(own, comparison, t);
  return {
    format: 'weighbeam comparison 1',
    settings,
    design: comparison.design,
    measured: comparison.measured,
    unit: comparison.unit,
    open: comparison.open,
    groups: comparison.groups.map(groupOf),
    matched: comparison.pairs,
    chosen: row(chosen),
    whatIf: {
      depends: whatIf.depends,
      sentence: verdictSentence(comparison, scale, t),
      rows: whatIf.rows.map(row),
    },
    effects: comparison.effects.map(({ id, value, lower, upper }) => ({
      id,
      value: finite(value),
      lower: finite(lower),
      upper: finite(upper),
    })),
    evidence: comparison.evidence.map(({ id, group, statistic, p, df, level, count, ...rest }) => ({
      id,
      group,
      statistic: finite(statistic),
      p: finite(p),
      df,
      level,
      sentence: findingSentence({ id, group, level, count, ...rest }, t),
      count,
      lines: rest.cells.map(({ line }) => line),
    })),
    findings: comparison.findings.map(finding => findingOf(finding, comparison, t)),
    leftOut: comparison.leftOut.map(({ file, line, value, group, unit, reason, afterResult }) => ({
      file: settings.files[file] ?? null,
      line,
      value,
      group,
      unit: Object.fromEntries(unit),
      reason,
      afterResult,
    })),
    notes: comparison.notes.map(note => noteWords(note, t)),
    pairs: comparison.pairsOfGroups.map(({ a, b, row: { result }, pAdjusted }) => ({
      a,
      b,
      difference: finite(result?.estimate),
      lower: finite(result?.lower),
      upper: finite(result?.upper),
      p: finite(result?.p),
      pAdjusted,
    })),
    family: comparison.family,
    columns: comparison.columns.map(column => jsonReport(column, t)),
    sentence: summarySentence(comparison, scale, t),
  };
}

const finite = (value: number | null | undefined): number | null =>
  typeof value === 'number' && Number.isFinite(value) ? value : null;

function groupOf(group: Comparison['groups'][number]): Json {
  const { label, n, missing, leftOut, readings, count } = group;
  return {
    label,
    n,
    ...(count === null ? {} : { x: count.x }),
    mean: finite(group.mean),
    sd: finite(group.sd),
    se: finite(group.se),
    median: finite(group.median),
    q1: finite(group.q1),
    q3: finite(group.q3),
    min: finite(group.min),
    max: finite(group.max),
    missing,
    leftOut,
    readings,
  };
}

function rowOf(row: Row, { settings }: Comparison, t: Say): Json {
  const { id, data, result, applies, counted, decision } = row;
  const twoSided = result?.twoSided;
  return {
    id,
    data,
    estimate: finite(result?.estimate),
    se: finite(result?.se),
    statistic: finite(result?.statistic),
    df: result?.df ?? null,
    p: finite(result?.p),
    lower: finite(result?.lower),
    upper: finite(result?.upper),
    confidence: result?.confidence ?? settings.confidence,
    question: settings.question,
    applies,
    counted,
    why: reasonWords(row, t),
    decision,
    twoSided:
      twoSided === undefined
        ? null
        : { p: finite(twoSided.p), lower: finite(twoSided.lower), upper: finite(twoSided.upper) },
  };
}

function findingOf(finding: Finding, { settings }: Comparison, t: Say): Json {
  const { id, level, group, count, cells } = finding;
  return {
    id,
    level,
    group,
    sentence: findingSentence(finding, t),
    count,
    lines: cells.map(({ line }) => line),
    cells: cells.map(({ file, line, field }) => `${settings.files[file] ?? ''}:${line}:${field + 1}`),
  };
}
