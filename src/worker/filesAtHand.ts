import type { Ticker } from '../core/model/problem';
import type { FileInput } from '../protocol/files';
import type { ReadingWish } from '../readers/readingWish';
import { scout, type Scouted } from '../readers/scout';
import { survey, type Survey } from '../readers/survey';
import type { Desk } from './desk';
import { shelfKey } from './shelf';

/** What tells apart what was read from these files under this wish. */
export const filesKey = (files: readonly FileInput[], wish: ReadingWish): string =>
  shelfKey(
    files.map(({ name, stamp }) => [name, stamp]),
    wish,
  );

/** The head of each file: delimiter, decimal mark, header. */
export const scoutFiles = (
  desk: Desk,
  files: readonly FileInput[],
  wish: ReadingWish,
): Promise<readonly Scouted[]> =>
  desk.scouted.get(filesKey(files, wish), () =>
    Promise.all(files.map(file => scout(desk.platform.open(file), wish))),
  );

/** Every column of one file: what quick picks and defaults need. */
export const surveyFile = (desk: Desk, file: FileInput, wish: ReadingWish, tick: Ticker): Promise<Survey> =>
  desk.surveys.get(filesKey([file], wish), () => survey(desk.platform.open(file), wish, tick));
