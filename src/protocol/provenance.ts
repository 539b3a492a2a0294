import * as v from 'valibot';
import type { Provenance } from '../core/model/settings';

const optionValue = v.union([v.string(), v.number(), v.boolean(), v.array(v.number())]);

export const provenanceSchema: v.GenericSchema<unknown, Provenance> = v.strictObject({
  questionInWords: v.string(),
  sampling: v.string(),
  analyst: v.string(),
  reasons: v.record(v.string(), v.string()),
  changed: v.array(
    v.strictObject({
      key: v.string(),
      from: optionValue,
      to: optionValue,
      when: v.string(),
      reason: v.string(),
    }),
  ),
  looks: v.pipe(v.number(), v.integer(), v.minValue(0)),
  plan: v.nullable(v.string()),
  replaces: v.nullable(v.string()),
});
