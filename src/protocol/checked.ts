import * as v from 'valibot';

/** A message that no side sends: names the first place that is wrong, never what stands there. */
class NotAMessage extends Error {
  constructor(what: string, issues: readonly v.BaseIssue<unknown>[]) {
    const [first] = issues;
    const path = first === undefined ? null : v.getDotPath(first);
    super(
      `${what}: ${path ?? 'the value'} is not as agreed (expected ${first?.expected ?? 'something else'})`,
    );
    this.name = 'NotAMessage';
  }
}

/** The value, once it is known to be of its schema; throws NotAMessage otherwise. */
export function checked<T>(what: string, schema: v.GenericSchema<unknown, T>, value: unknown): T {
  const result = v.safeParse(schema, value, { abortEarly: true });
  if (!result.success) throw new NotAMessage(what, result.issues);
  return result.output;
}
