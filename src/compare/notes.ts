import type { Table } from '../core/model/cells';
import type { Reason } from '../core/model/say';
import type { Settings } from '../core/model/settings';
import type { Prepared } from './prepared';
import type { Request } from './request';
import { countEntries, Entry } from './selection';
import { outcomesUsed } from './successAsked';

/** What `settle` decided because nothing was said, as far as the person should know. */
export function defaultsTaken(request: Request, settings: Settings): readonly Reason[] {
  const { test, reference, options } = settings;
  const success = options['success'];
  return [
    ...(request.test === undefined && request.reference === undefined && test !== null && reference !== null
      ? [{ code: 'first-is-test', facts: { test, reference } }]
      : []),
    ...(request.success === undefined &&
    request.options?.['success'] === undefined &&
    typeof success === 'string'
      ? [{ code: 'success-is', facts: { success } }]
      : []),
  ];
}

/** What the settings and the data bring about that the person should know and that no check of the data says. */
export function notesOf(
  table: Table | null,
  settings: Settings,
  prepared: Prepared,
  chosen: string,
): readonly Reason[] {
  const { selection } = prepared;
  const notes: (Reason | null)[] = [
    prepared.groups.every(group => group.sample === null) && prepared.counts === null
      ? { code: 'summary-only', facts: {} }
      : null,
    chosen === settings.method
      ? null
      : { code: 'curve-resolved', facts: { method: chosen, rule: 'normal-over-30' } },
    settings.confidence < 0.5 ? { code: 'confidence-low', facts: { confidence: settings.confidence } } : null,
    counted('rows-without-label', selection?.withoutLabel ?? 0),
    settings.layout.kind === 'long' ? counted('groups-not-compared', selection?.otherLabels ?? 0) : null,
    counted('rows-without-id', selection === null ? 0 : countEntries(selection, null, Entry.NoId)),
    ...(table === null || settings.layout.kind === 'summary' ? [] : outcomeNotes(table, settings)),
  ];
  return notes.filter(note => note !== null);
}

const counted = (code: string, count: number): Reason | null =>
  count === 0 ? null : { code, facts: { count } };

/** A success that never occurs, and other outcomes taken together. */
function outcomeNotes(table: Table, settings: Settings): readonly (Reason | null)[] {
  const { success } = settings.options;
  if (typeof success !== 'string') return [];
  const outcomes = outcomesUsed(table, settings);
  const others = outcomes.filter(outcome => outcome !== success);
  return [
    outcomes.includes(success)
      ? null
      : { code: 'success-never', facts: { success, outcomes: outcomes.slice(0, 10) } },
    others.length > 1 ? { code: 'outcomes-joined', facts: { success, outcomes: others.slice(0, 10) } } : null,
  ];
}
