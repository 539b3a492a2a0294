import * as v from 'valibot';
import { checked } from './checked';
import type { PanelAction } from '../report/panel/action';
import { cellRefSchema, countSchema, lineSchema } from './places';
import { noticeActions, tools } from './toPanel';

/** The page has loaded and listens. */
export interface Ready {
  readonly type: 'ready';
}

/** A control was used; `revision` is that of what the person was looking at. */
export interface Act {
  readonly type: 'act';
  readonly revision: number;
  readonly action: PanelAction;
}

/** The button of a notice was pressed. */
export interface NoticeAct {
  readonly type: 'notice';
  readonly id: (typeof noticeActions)[number];
}

/** A button of the page's own was pressed. */
export interface ToolUse {
  readonly type: 'tool';
  readonly id: (typeof tools)[number];
}

/** The place of the problem is to be shown. */
export interface ShowProblem {
  readonly type: 'showProblem';
}

export type FromPanel = Ready | Act | NoticeAct | ToolUse | ShowProblem;

const actionSchema: v.GenericSchema<unknown, PanelAction> = v.variant('kind', [
  v.strictObject({
    kind: v.literal('change'),
    key: v.picklist(['question', 'variance', 'confidence', 'measure', 'matters', 'margin']),
  }),
  v.strictObject({ kind: v.literal('state'), key: v.picklist(['sampling', 'analyst']) }),
  v.strictObject({ kind: v.literal('show'), at: cellRefSchema }),
  v.strictObject({ kind: v.literal('point'), at: cellRefSchema }),
  v.strictObject({ kind: v.literal('takeBack'), file: countSchema, line: lineSchema }),
  v.strictObject({ kind: v.literal('copyBlock') }),
]);

const fromPanelSchema: v.GenericSchema<unknown, FromPanel> = v.variant('type', [
  v.strictObject({ type: v.literal('ready') }),
  v.strictObject({ type: v.literal('act'), revision: countSchema, action: actionSchema }),
  v.strictObject({ type: v.literal('notice'), id: v.picklist(noticeActions) }),
  v.strictObject({ type: v.literal('tool'), id: v.picklist(tools) }),
  v.strictObject({ type: v.literal('showProblem') }),
]);

/** The message, once it is known to be one; throws NotAMessage otherwise. */
export const readFromPanel = (message: unknown): FromPanel => checked('from panel', fromPanelSchema, message);
