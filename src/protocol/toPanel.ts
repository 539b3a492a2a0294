import * as v from 'valibot';
import { checked } from './checked';
import type { View } from '../report/view';
import { viewSchema } from './fromWorker';
import { recipeSchema, type Recipe } from './panelState';
import { countSchema, shownProblemSchema, type ShownProblem } from './places';

export const noticeActions = ['saveAndRunAgain', 'runAgain', 'chooseFile'] as const;

/** Something about the file or the calculation that the reader of the numbers must know, with what can be done about it. */
export interface Notice {
  readonly text: string;
  readonly action: { readonly id: (typeof noticeActions)[number]; readonly label: string } | null;
}

export const tools = ['answer', 'undo', 'redo', 'addToNotebook'] as const;

/** A button of the page's own; it is there only while it can do something. */
export interface Tool {
  readonly id: (typeof tools)[number];
  readonly label: string;
}

/** The whole of what a panel shows. A panel that is new, or comes back into sight, gets it anew. */
export interface Show {
  readonly type: 'show';
  readonly revision: number;
  readonly recipe: Recipe;
  /** null: nothing computed yet, or a problem. */
  readonly view: View | null;
  readonly problem: ShownProblem | null;
  readonly notices: readonly Notice[];
  readonly tools: readonly Tool[];
  /** Words of the page's own: headings and labels that no view holds. */
  readonly words: { readonly problem: string; readonly showCell: string; readonly ready: string };
}

/** A calculation is going on; `done` of `total`, 0 where it is not known. What is shown stays until the next `show`. */
export interface Busy {
  readonly type: 'busy';
  readonly revision: number;
  readonly says: string;
  readonly done: number;
  readonly total: number;
}

export type ToPanel = Show | Busy;

const toPanelSchema: v.GenericSchema<unknown, ToPanel> = v.variant('type', [
  v.strictObject({
    type: v.literal('show'),
    revision: countSchema,
    recipe: recipeSchema,
    view: v.nullable(viewSchema),
    problem: v.nullable(shownProblemSchema),
    notices: v.array(
      v.strictObject({
        text: v.string(),
        action: v.nullable(v.strictObject({ id: v.picklist(noticeActions), label: v.string() })),
      }),
    ),
    tools: v.array(v.strictObject({ id: v.picklist(tools), label: v.string() })),
    words: v.strictObject({ problem: v.string(), showCell: v.string(), ready: v.string() }),
  }),
  v.strictObject({
    type: v.literal('busy'),
    revision: countSchema,
    says: v.string(),
    done: v.number(),
    total: v.number(),
  }),
]);

/** The message, once it is known to be one; throws NotAMessage otherwise. */
export const readToPanel = (message: unknown): ToPanel => checked('to panel', toPanelSchema, message);
