import type { Table } from '../core/model/cells';
import type { Ticker } from '../core/model/problem';
import type { Say } from '../core/model/say';
import type { Answered } from '../compare/answer';
import type { Request } from '../compare/request';
import type { Scouted } from '../readers/scout';
import type { Survey } from '../readers/survey';
import type { WorkerPlatform } from './platform';
import { Shelf } from './shelf';

const SURVEYS_KEPT = 8;
const TABLES_KEPT = 3;
const TEXTS_KEPT = 1;

/** What the worker has before it: the machine, the reader's words, and what was read so far. */
export interface Desk {
  readonly platform: WorkerPlatform;
  readonly t: Say;
  readonly version: string;
  readonly scouted: Shelf<readonly Scouted[]>;
  readonly surveys: Shelf<Survey>;
  readonly tables: Shelf<Table>;
  readonly texts: Shelf<string>;
  readonly answers: Shelf<{ readonly request: Request; readonly answered: Answered }>;
}

export const makeDesk = (platform: WorkerPlatform, t: Say, version: string): Desk => ({
  platform,
  t,
  version,
  scouted: new Shelf(SURVEYS_KEPT),
  surveys: new Shelf(SURVEYS_KEPT),
  tables: new Shelf(TABLES_KEPT),
  texts: new Shelf(TEXTS_KEPT),
  answers: new Shelf(TABLES_KEPT),
});

/** A call at the desk: its ticker throws Cancelled once the person gave it up. */
export interface Sitting {
  readonly desk: Desk;
  readonly tick: Ticker;
}
