import type { Table } from '../core/model/cells';
import type { Ticker } from '../core/model/problem';
import type { FileInput } from '../protocol/files';
import type { ReadingWish } from '../readers/readingWish';
import { readTable } from '../readers/readTable';
import { scout, type Scouted } from '../readers/scout';
import { survey, type Survey } from '../readers/survey';
import type { Desk } from './desk';
import { shelfKey } from './shelf';
import { wholeText } from './wholeText';

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
    Promise.all(files.map((file, index) => scout(desk.platform.open(file), wish, index))),
  );

/** Every column of one file: what quick picks and defaults need. */
export const surveyFile = (desk: Desk, file: FileInput, wish: ReadingWish, tick: Ticker): Promise<Survey> =>
  desk.surveys.get(filesKey([file], wish), () => survey(desk.platform.open(file), wish, tick));

/** The rows of one file with the labels of these columns; read once for the same columns. */
export const tableOf = (
  desk: Desk,
  file: FileInput,
  wish: ReadingWish,
  labels: readonly number[],
  tick: Ticker,
): Promise<Table> =>
  desk.tables.get(shelfKey(filesKey([file], wish), labels), async () =>
    readTable(
      [desk.platform.open(file)],
      await scoutFiles(desk, [file], wish),
      { numbers: [], labels },
      { tick },
    ),
  );

/** The text of one file, as an editor shows it. */
export const textOf = (desk: Desk, file: FileInput, wish: ReadingWish, tick: Ticker): Promise<string> =>
  desk.texts.get(filesKey([file], wish), async () => {
    const [scouted] = await scoutFiles(desk, [file], wish);
    const { readings } = await tableOf(desk, file, wish, [], tick);
    const encoding = readings[0]?.encoding ?? 'utf-8';
    return scouted === undefined ? '' : wholeText(desk.platform.open(file), scouted, encoding);
  });
