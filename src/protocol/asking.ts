import * as v from 'valibot';
import type { Request } from '../compare/request';
import { countSchema, lineSchema } from './places';
import { partialRequestSchema } from './request';

/**
 * The questions put before a comparison, in this order; those with a plain answer are skipped. The scale is asked only
 * when a person wants to change it.
 */
export const stepIds = [
  'measured',
  'columns',
  'success',
  'label',
  'same',
  'reference',
  'test',
  'units',
  'question',
  'margin',
  'variance',
  'measure',
] as const;
export type StepId = (typeof stepIds)[number];

/** One answer to pick: what it says, the facts behind it, what choosing it claims, and what it adds to the request. */
export interface StepItem {
  readonly label: string;
  readonly description: string;
  readonly detail: string;
  readonly adds: Partial<Request>;
}

interface StepShown {
  readonly id: StepId;
  readonly title: string;
  readonly prompt: string;
  /** Which question this is, from 1, of how many that will be put as far as is known now. */
  readonly number: number;
  readonly of: number;
}

/** A question answered by one item. `likely` is under the cursor when it opens: last time's answer, else the best guess. */
export interface ChoiceStep extends StepShown {
  readonly kind: 'one';
  readonly items: readonly StepItem[];
  readonly likely: number;
}

/** A question answered by several items at once; their lists are joined in the order of the items. */
export interface ManyStep extends StepShown {
  readonly kind: 'many';
  readonly items: readonly StepItem[];
  readonly likely: readonly number[];
  readonly least: number;
}

/** A question answered by a number above 0, typed; `unit` stands behind it. It becomes the margin on both sides. */
export interface NumberStep extends StepShown {
  readonly kind: 'number';
  readonly unit: string;
  readonly likely: number | null;
}

export type Step = ChoiceStep | ManyStep | NumberStep;

const shown = {
  id: v.picklist(stepIds),
  title: v.string(),
  prompt: v.string(),
  number: lineSchema,
  of: lineSchema,
};
const items = v.pipe(
  v.array(
    v.strictObject({
      label: v.string(),
      description: v.string(),
      detail: v.string(),
      adds: partialRequestSchema,
    }),
  ),
  v.minLength(1),
);

export const stepSchema: v.GenericSchema<unknown, Step> = v.variant('kind', [
  v.strictObject({ kind: v.literal('one'), ...shown, items, likely: countSchema }),
  v.strictObject({
    kind: v.literal('many'),
    ...shown,
    items,
    likely: v.array(countSchema),
    least: countSchema,
  }),
  v.strictObject({ kind: v.literal('number'), ...shown, unit: v.string(), likely: v.nullable(v.number()) }),
]);

/** What picking these items adds: plain answers replace each other, lists are joined. */
export function joinAnswers(picked: readonly Partial<Request>[]): Partial<Request> {
  const joined: Record<string, unknown> = {};
  for (const [key, value] of picked.flatMap(adds => Object.entries<unknown>(adds))) {
    const before = joined[key];
    joined[key] = isList(before) && isList(value) ? [...before, ...value] : value;
  }
  return joined;
}

const isList = (value: unknown): value is readonly unknown[] => Array.isArray(value);
