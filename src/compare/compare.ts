import { evidenceChecks } from '../core/evidence/index';
import { methodById, methods } from '../core/methods/index';
import type { Table } from '../core/model/cells';
import type { Comparison, Effect, EvidenceDescriptor, Row } from '../core/model/comparison';
import type { Group } from '../core/model/groups';
import type { MethodDescriptor } from '../core/model/methods';
import type { Ticker } from '../core/model/problem';
import type { Reason } from '../core/model/say';
import type { Settings } from '../core/model/settings';
import { chosenMethod } from './chosenMethod';
import { meanEffects } from './effects';
import { groupNumbers } from './groupNumbers';
import { leftOutRows } from './leftOutRows';
import { lookAtData } from './lookAtData';
import { measuredColumn, type MeasuredColumn } from './measuredColumn';
import { notesOf } from './notes';
import { prepare, type Prepared } from './prepared';
import { refuseUncomputed } from './refuseUncomputed';
import { runRows } from './runRows';
import { whatIfOf } from './verdict';

export interface CompareOptions {
  /** Compute the chosen row alone, without medians and checks. */
  readonly onlyChosen?: boolean;
  /** Compute these methods beside the chosen one and no others: how an old record keeps the verdict it was given. */
  readonly counted?: readonly string[];
  /** Notes about what was decided before the comparison, printed first. */
  readonly notes?: readonly Reason[];
  readonly methods?: readonly MethodDescriptor[];
  readonly evidence?: readonly EvidenceDescriptor[];
}

/**
 * Everything that is known about one comparison: pure, synchronous, the same on every surface. `table` is null for typed
 * numbers only. Throws Refusal where no number can be given, Cancelled from the ticker.
 */
export function compare(
  table: Table | null,
  settings: Settings,
  tick: Ticker,
  options: CompareOptions = {},
): Comparison {
  const list = options.methods ?? methods;
  const prepared = prepare(table, settings, tick);
  const chosenId = chosenMethod(settings, prepared.groups);
  const only = options.onlyChosen === true ? [] : (options.counted ?? null);
  const method = methodById(chosenId, list);
  if (method === undefined) throw new RangeError(`the settings name a method that is not there: ${chosenId}`);
  const { rows, chosen } = runRows(table, settings, prepared, { chosen: method, list, only, tick });
  refuseUncomputed(table, prepared, chosen);

  const { design } = method;
  const { two } = prepared.designs;
  const groups = design === 'two' && two !== undefined ? [two.test, two.reference] : prepared.groups;
  const checks = options.onlyChosen === true ? [] : (options.evidence ?? evidenceChecks);
  const numbered = groups.map((group, index) => ({
    ...group,
    ...groupNumbers(group, options.onlyChosen !== true),
    count: prepared.counts?.[index] ?? null,
  }));
  const column = measuredColumn(table, settings);
  return {
    settings,
    readings: table?.readings ?? [],
    design,
    groups: numbered,
    unit: column.unit,
    measured: column.name,
    pairs: prepared.pairs,
    chosen,
    whatIf: whatIfOf(rows, chosen, settings.confidence),
    effects: settings.measure === 'mean' ? effectsOf(prepared, design, chosen, column, numbered) : [],
    ...lookAtData({ table, groups, settings, rows }, checks, tick),
    leftOut:
      table === null || prepared.selection === null ? [] : leftOutRows(table, settings, prepared.selection),
    notes: [...(options.notes ?? []), ...notesOf(table, settings, prepared, chosenId)],
    pairsOfGroups: [],
    family: [],
    columns: [],
  };
}

function effectsOf(
  prepared: Prepared,
  design: Comparison['design'],
  chosen: Row,
  { name, unit }: MeasuredColumn,
  groups: readonly (Group & { readonly min: number | null })[],
): readonly Effect[] {
  const data = design === 'pairs' ? prepared.designs.pairs : prepared.designs.two;
  if (data === undefined) return [];
  const lows = groups.flatMap(({ min }) => (min === null ? [] : [min]));
  const lowest = lows.length === 0 ? null : Math.min(...lows);
  return meanEffects(data, chosen, { name, unit, lowest, paired: design === 'pairs' });
}
