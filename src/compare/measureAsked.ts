import { methodById, methods } from '../core/methods/index';
import type { Field } from '../core/model/cells';
import type { MethodDescriptor } from '../core/model/methods';
import type { Measure } from '../core/model/settings';
import type { Request } from './request';

/** The measure asked for, or the one that follows from the method, from a success value or from counts; else the mean. */
export function measureAsked(
  request: Request,
  fields: readonly Field[],
  list: readonly MethodDescriptor[] = methods,
): Measure {
  if (request.measure !== undefined) return request.measure;
  const named = request.method === undefined ? undefined : methodById(request.method, list);
  if (named !== undefined) return named.measure;
  if (request.success !== undefined) return 'proportion';
  if (request.typed !== undefined) return request.typed.some(group => 'x' in group) ? 'proportion' : 'mean';
  const has = (name: string): boolean => fields.some(field => field.name.trim().toLowerCase() === name);
  return request.summary === true && has('x') && !has('mean') ? 'proportion' : 'mean';
}

/** Whether the measured column holds outcomes (words that are success or not) rather than numbers. */
export function measuresOutcomes(measure: Measure, success: unknown): boolean {
  return measure === 'proportion' || success !== undefined;
}
