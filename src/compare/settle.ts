import { alikeOf } from '../core/methods/alike';
import { methods } from '../core/methods/index';
import type { Table } from '../core/model/cells';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { confidenceAsked } from './confidenceAsked';
import { labelCounts, type LabelCount } from './labelCounts';
import { layoutAsked, relationAsked } from './layoutAsked';
import { measureAsked } from './measureAsked';
import { checkMargin, checkMethod, checkShares, checkSigma } from './methodChecks';
import type { Request } from './request';
import { severalAsked } from './severalAsked';
import { sidesOf, sidesOfSeveral } from './sides';
import { plainSuccess } from './successAsked';
import { methodAsked } from './varianceAssumption';

/** The conventions of reading where there is no file. */
const TYPED_READING = {
  encoding: 'utf-8',
  delimiter: ',',
  decimal: '.',
  thousands: '',
  header: 1,
  missing: [],
} as const;

/**
 * Turns what was asked into Settings: names are looked up, defaults filled in, contradictions refused. `table` is null for
 * typed numbers only. Throws Refusal.
 */
export function settle(
  request: Request,
  table: Table | null,
  list: readonly MethodDescriptor[] = methods,
): Settings {
  const fields = table?.fields ?? [];
  const layout = layoutAsked(request, fields);
  const relation = relationAsked(request);
  const confidence = confidenceAsked(request.confidence);
  const question = request.question ?? 'differs';
  const measure = measureAsked(request, fields, list);
  const grouped = {
    files: request.files,
    layout,
    relation,
    same: request.same ?? [],
    rows: request.rows ?? 'all',
    where: request.where ?? [],
  } as const;
  const present = presentLabels(table, grouped);
  const { method: usual, curve } = methodAsked(request, measure);
  const several = curve === null ? severalAsked(request, usual, relation, present, list) : null;
  const method = several ?? usual;
  const chosen = { method, measure, question, relation, layout };
  const alike = alikeOf(checkMethod(chosen, list));
  checkMargin(question, request.margin, confidence, alike);
  checkSigma(chosen, request.sigma);
  checkNumbers(request, alike);
  checkShares(measure, request);
  const column = layout.kind === 'long' || layout.kind === 'summary' ? layout.label : '';
  const sides =
    several === null
      ? sidesOf(present, request.test, request.reference, column)
      : sidesOfSeveral(present, request.reference, column);
  const settings: Settings = {
    ...grouped,
    ...sides,
    reading: readingOf(table, request),
    numberingRestarts: request.pair === 'none',
    leftOut: leftOutAsked(request),
    measure,
    method,
    question,
    confidence,
    against: request.against ?? alike,
    margin: request.margin ?? null,
    matters: request.matters ?? null,
    options: optionsOf(request, curve),
  };
  const counted = table !== null && measure === 'proportion' && layout.kind !== 'summary';
  if (!counted || settings.options['success'] !== undefined) return settings;
  return { ...settings, options: { ...settings.options, success: plainSuccess(table, settings) } };
}

function presentLabels(
  table: Table | null,
  grouped: Parameters<typeof labelCounts>[1],
): readonly LabelCount[] {
  if (grouped.layout.kind === 'typed')
    return grouped.layout.groups.map(({ label, n }) => ({ label, count: n }));
  return table === null ? [] : labelCounts(table, grouped);
}

function readingOf(table: Table | null, { wish }: Request): Settings['reading'] {
  const read = table?.readings[0];
  const below = wish.below ?? 'refuse';
  if (read === undefined) return { ...TYPED_READING, below };
  const { encoding, delimiter, decimal, thousands, headerLine, missingWords } = read;
  return { encoding, delimiter, decimal, thousands, header: headerLine, missing: missingWords, below };
}

function leftOutAsked(request: Request): Settings['leftOut'] {
  const leftOut = request.leaveOut ?? [];
  const silent = leftOut.find(({ reason }) => reason.trim() === '');
  if (silent !== undefined) throw new Refusal('reason-needed', { line: silent.line });
  return leftOut;
}

function checkNumbers({ matters, against, method }: Request, alike: number): void {
  if (matters !== undefined && !(matters > 0 && Number.isFinite(matters))) {
    throw new Refusal('matters-invalid', { matters });
  }
  if (matters !== undefined && alike !== 0)
    throw new Refusal('method-not-for-this', { method: method ?? '', needs: 'difference' });
  if (against !== undefined && !Number.isFinite(against)) throw new Refusal('number-unusable', { against });
}

/** sigma, success and the curve rule are options like any other; the flags of their own are only easier to type. */
function optionsOf(request: Request, curve: string | null): Settings['options'] {
  return {
    ...request.options,
    ...(request.sigma === undefined ? {} : { sigma: request.sigma }),
    ...(request.success === undefined ? {} : { success: request.success }),
    ...(curve === null ? {} : { curve }),
  };
}
