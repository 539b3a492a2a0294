import * as v from 'valibot';
import type { Request } from '../compare/request';
import { countSchema } from './places';
import { requestSchema } from './request';

/** What makes a comparison again after the window was reloaded. */
export interface Recipe {
  /** Addresses of the files. */
  readonly files: readonly string[];
  /** The settings block, when there was one: the record itself is the recipe. */
  readonly blockText: string | null;
  /** What was asked, for a comparison that has no block yet (a question is open, the text is not saved). */
  readonly request: Request;
}

/** What the editor keeps of a panel while it is closed down: the recipe, and where the person was. */
export interface PanelState {
  readonly recipe: Recipe;
  readonly scroll: number;
  /** Folded parts that were open, by their place in the page. */
  readonly openSections: readonly number[];
}

export const recipeSchema: v.GenericSchema<unknown, Recipe> = v.strictObject({
  files: v.array(v.string()),
  blockText: v.nullable(v.string()),
  request: requestSchema,
});

const panelStateSchema: v.GenericSchema<unknown, PanelState> = v.strictObject({
  recipe: recipeSchema,
  scroll: v.number(),
  openSections: v.array(countSchema),
});

/** What an earlier page kept; null when there was none, or another version kept it. */
export function readPanelState(value: unknown): PanelState | null {
  const result = v.safeParse(panelStateSchema, value);
  return result.success ? result.output : null;
}
