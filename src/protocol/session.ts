import * as v from 'valibot';
import type { Session, Step } from '../compare/session';
import { countSchema } from './places';
import { requestSchema } from './request';

const sessionStepSchema: v.GenericSchema<unknown, Step> = v.strictObject({
  request: requestSchema,
  when: v.string(),
});

export const sessionSchema: v.GenericSchema<unknown, Session> = v.pipe(
  v.strictObject({
    history: v.pipe(v.array(sessionStepSchema), v.minLength(1)),
    at: countSchema,
    firstShown: v.nullable(sessionStepSchema),
    reasons: v.record(v.string(), v.string()),
  }),
  v.check(({ at, history }) => at < history.length, 'a step in force'),
);

/** What was seen of some data before, as it is kept between sittings. */
export interface Seen {
  readonly looks: number;
  readonly firstShown: Step;
}

const seenSchema: v.GenericSchema<unknown, Seen> = v.strictObject({
  looks: countSchema,
  firstShown: sessionStepSchema,
});

/** What was kept; null when nothing was, or another version kept it. */
export function readSeen(value: unknown): Seen | null {
  const result = v.safeParse(seenSchema, value);
  return result.success ? result.output : null;
}
