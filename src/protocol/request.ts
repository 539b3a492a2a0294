import * as v from 'valibot';
import { checked } from './checked';
import { countSchema, lineSchema } from './places';
import type { Request } from '../compare/request';

const text = v.string();
const texts = v.array(v.string());
const pair = v.tuple([v.string(), v.string()]);
const numbers = v.tuple([v.number(), v.number()]);

const wishSchema = v.strictObject({
  encoding: v.exactOptional(text),
  delimiter: v.exactOptional(text),
  decimal: v.exactOptional(v.picklist(['.', ','])),
  thousands: v.exactOptional(text),
  header: v.exactOptional(countSchema),
  missing: v.exactOptional(texts),
  below: v.exactOptional(v.picklist(['refuse', 'zero', 'half', 'limit'])),
});

export const leftOutSchema = v.array(
  v.strictObject({
    file: countSchema,
    line: lineSchema,
    reason: text,
    afterResult: v.boolean(),
    digest: v.exactOptional(text),
  }),
);

const typedSchema = v.union([
  v.strictObject({ label: text, n: v.number(), mean: v.number(), sd: v.number() }),
  v.strictObject({ label: text, x: v.number(), n: v.number() }),
]);

const told = {
  measured: v.exactOptional(texts),
  label: v.exactOptional(text),
  columns: v.exactOptional(texts),
  summary: v.exactOptional(v.boolean()),
  typed: v.exactOptional(v.array(typedSchema)),
  test: v.exactOptional(text),
  reference: v.exactOptional(text),
  per: v.exactOptional(v.union([v.literal('none'), texts])),
  pair: v.exactOptional(text),
  measure: v.exactOptional(v.picklist(['mean', 'ratio', 'proportion', 'rank', 'spread'])),
  success: v.exactOptional(text),
  variance: v.exactOptional(v.picklist(['separate', 'pooled', 'known'])),
  sigma: v.exactOptional(numbers),
  df: v.exactOptional(v.picklist(['welch', 'smaller'])),
  curve: v.exactOptional(v.picklist(['t', 'normal', 'normal-over-30'])),
  method: v.exactOptional(text),
  question: v.exactOptional(
    v.picklist(['differs', 'higher', 'lower', 'equivalent', 'not-lower', 'not-higher']),
  ),
  margin: v.exactOptional(numbers),
  matters: v.exactOptional(v.number()),
  against: v.exactOptional(v.number()),
  confidence: v.exactOptional(v.number()),
  rows: v.exactOptional(v.array(v.tuple([lineSchema, lineSchema]))),
  where: v.exactOptional(v.array(pair)),
  leaveOut: v.exactOptional(leftOutSchema),
  same: v.exactOptional(v.array(pair)),
  onlyChosen: v.exactOptional(v.boolean()),
  options: v.exactOptional(
    v.record(text, v.union([v.string(), v.number(), v.boolean(), v.array(v.number())])),
  ),
};

/** What a surface has been told, by names: an unknown key is an error, not something to pass over. */
export const requestSchema: v.GenericSchema<unknown, Request> = v.strictObject({
  files: texts,
  wish: wishSchema,
  ...told,
});

/** Any part of it: an answer of one step, or a request written by another program. */
export const partialRequestSchema: v.GenericSchema<unknown, Partial<Request>> = v.strictObject({
  files: v.exactOptional(texts),
  wish: v.exactOptional(wishSchema),
  ...told,
});

/** A request that another program wrote; throws NotAMessage when it is none. */
export const readRequest = (value: unknown): Partial<Request> =>
  checked('request', partialRequestSchema, value);
