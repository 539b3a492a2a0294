import type { Request } from './request';

type Key = keyof Request;

const ASSUMPTION: readonly Key[] = ['method', 'variance', 'df', 'curve'];
/** Numbers in the units of what was measured. */
const IN_UNITS: readonly Key[] = ['margin', 'matters', 'against', 'sigma'];
const SIDES: readonly Key[] = ['test', 'reference', 'same'];

/** What else no longer holds when a key is said anew: it was said of another layout, relation, measure or method. */
const REPLACES: Readonly<Partial<Record<Key, readonly Key[]>>> = {
  columns: ['measured', 'label', 'summary', 'typed', ...SIDES],
  measured: ['columns', 'summary', 'typed'],
  label: ['columns', 'summary', 'typed', ...SIDES],
  summary: ['measured', 'label', 'columns', 'typed', 'per', 'pair', ...SIDES],
  measure: ['success', ...IN_UNITS, ...ASSUMPTION],
  method: ['variance', 'df', 'curve'],
  variance: ['method', 'df', 'curve'],
  df: ['method', 'curve'],
  curve: ['method', 'df'],
};

/**
 * A request with a part of it said anew. Keys that the new part takes the place of are dropped unless they are said with
 * it, so that one change in a panel never leaves a contradiction behind. `unset` leaves keys open again.
 */
export function patched(request: Request, patch: Partial<Request>, unset: readonly Key[] = []): Request {
  const replaced = (Object.keys(patch) as Key[]).flatMap(key =>
    isSame(request[key], patch[key]) ? [] : replacedBy(key, request, patch),
  );
  const dropped = new Set<string>([...replaced.filter(key => !(key in patch)), ...unset]);
  const kept = Object.entries({ ...request, ...patch }).filter(([key]) => !dropped.has(key));
  const { files, wish } = { ...request, ...patch };
  return { ...(Object.fromEntries(kept) as Partial<Request>), files, wish };
}

function replacedBy(key: Key, request: Request, patch: Partial<Request>): readonly Key[] {
  const isPaired = names(request.pair);
  if (key === 'pair' && names(patch.pair)) return ['per', 'sigma', ...ASSUMPTION];
  if (key === 'pair') return isPaired ? ASSUMPTION : [];
  if (key === 'per') return isPaired ? ['pair', ...ASSUMPTION] : names(patch.per) ? ['pair'] : [];
  if (key === 'same') return vanished(request, patch);
  return REPLACES[key] ?? [];
}

/** Whether columns are named, rather than said to be none. */
const names = (columns: string | readonly string[] | undefined): boolean =>
  columns !== undefined && columns !== 'none' && columns.length > 0;

/** The groups named so far whose label is now read as another. */
const vanished = (request: Request, { same = [] }: Partial<Request>): readonly Key[] =>
  (['test', 'reference'] as const).filter(side => same.some(([from]) => from === request[side]));

const isSame = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b);
