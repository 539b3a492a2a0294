import { Refusal } from '../core/model/problem';
import type { Change, LeftOut, Measure, OptionValue } from '../core/model/settings';
import { measureAsked } from './measureAsked';
import type { Request } from './request';
import { requestOf, type Session, type Step } from './session';
import { methodAsked } from './varianceAssumption';

/**
 * What is asked otherwise now than when a result was first seen, by settings-block key, with the time at which each came
 * to be so and the reason given ('' where none was). Rows left out since carry that mark themselves; a row taken back
 * since is named here.
 */
export function changedAfterShown(session: Session): readonly Change[] {
  const { firstShown, reasons } = session;
  if (firstShown === null) return [];
  const watched = firstShown.request.leaveOut ?? [];
  const was = spoken(firstShown.request, watched);
  const is = spoken(requestOf(session), watched);
  const keys = [...new Set([...Object.keys(was), ...Object.keys(is)])];
  return keys
    .filter(key => textOf(was[key]) !== textOf(is[key]))
    .map(key => ({
      key,
      from: was[key] ?? 'none',
      to: is[key] ?? 'none',
      when: sinceWhen(session, key, watched),
      reason: reasons[key] ?? '',
    }));
}

/** When the key came to have the value it has now. */
function sinceWhen({ history, at }: Session, key: string, watched: readonly LeftOut[]): string {
  const latestFirst: readonly Step[] = history.slice(0, at + 1).reverse();
  const texts = latestFirst.map(({ request }) => textOf(spoken(request, watched)[key]));
  const other = texts.findIndex(text => text !== texts[0]);
  return latestFirst[other < 0 ? texts.length - 1 : other - 1]?.when ?? '';
}

const textOf = (value: OptionValue | undefined): string => JSON.stringify(value ?? null);

/** A request under the keys of the settings block, defaults filled in, so that saying a default aloud is no change. */
function spoken(request: Request, watched: readonly LeftOut[]): Readonly<Record<string, OptionValue>> {
  const measure = measureAsked(request, []);
  const { method, curve } = methodSpoken(request, measure);
  const { per, wish } = request;
  const parts: Record<string, OptionValue | undefined> = {
    measured: request.measured?.join(', '),
    label: request.label,
    columns: request.columns?.join(', '),
    test: request.test,
    reference: request.reference,
    merged: linked(request.same),
    per: typeof per === 'object' ? per.join(', ') : undefined,
    'rows-are': per === 'none' ? 'independent' : undefined,
    pair: request.pair,
    rows: request.rows?.map(([from, to]) => `${from}-${to}`).join(', ') ?? 'all',
    where: request.where?.map(([column, label]) => `${column}=${label}`).join(', '),
    below: wish.below,
    decimal: wish.decimal,
    delimiter: wish.delimiter,
    header: wish.header,
    'missing-words': wish.missing?.join(', '),
    measure,
    method,
    curve: curve ?? undefined,
    question: request.question ?? 'differs',
    confidence: request.confidence ?? 0.95,
    against: request.against ?? 0,
    margin: request.margin,
    matters: request.matters,
    sigma: request.sigma,
    success: request.success,
    'left-out': watched.length === 0 ? undefined : stillOut(request, watched),
    ...request.options,
  };
  return Object.fromEntries(
    Object.entries(parts).flatMap(([key, value]) => (value === undefined ? [] : [[key, value]])),
  );
}

/** A step whose words contradict each other was refused and never shown: its words stand for themselves. */
function methodSpoken(request: Request, measure: Measure): ReturnType<typeof methodAsked> {
  try {
    return methodAsked(request, measure);
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const { method, variance, df, curve } = request;
    return {
      method: [method, variance, df, curve].filter(word => word !== undefined).join(' '),
      curve: null,
    };
  }
}

/** Which of the rows that were left out when the result was first seen are left out in this request. */
function stillOut({ leaveOut = [] }: Request, watched: readonly LeftOut[]): string {
  const out = watched.filter(row =>
    leaveOut.some(({ file, line }) => file === row.file && line === row.line),
  );
  return out.length === 0 ? 'none' : out.map(({ line }) => `line ${line}`).join(', ');
}

const linked = (same: Request['same']): string | undefined =>
  same === undefined || same.length === 0
    ? undefined
    : same.map(([from, to]) => `${from} -> ${to}`).join(', ');
