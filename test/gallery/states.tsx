import { readFileSync } from 'node:fs';
import path from 'node:path';
import { render } from 'preact-render-to-string';
import { answer } from '../../src/compare/answer';
import type { Request } from '../../src/compare/request';
import { Refusal } from '../../src/core/model/problem';
import type { Show } from '../../src/protocol/toPanel';
import { bytesSource } from '../../src/readers/byteSource';
import { problemWords } from '../../src/report/problem';
import { viewOf } from '../../src/report/view';
import { blockFrom } from '../../src/settings/block';
import { printBlock } from '../../src/settings/printBlock';
import { Page } from '../../src/webview/page';
import { english as t } from '../report/fixtures/english';
import { platform, provenance, STAMP } from '../settings/recording';

const demo = path.join(process.env['WEIGHBEAM_ROOT'] ?? '.', 'media', 'demo');
/** What a panel shows of a request on a file of the demo, or on this text. */
async function shown(file: string, asked: Partial<Request>, text?: string): Promise<Show> {
  const bytes = text === undefined ? readFileSync(path.join(demo, file)) : new TextEncoder().encode(text);
  const request: Request = { files: [file], wish: {}, ...asked };
  const page = {
    type: 'show',
    revision: 1,
    recipe: { files: [], blockText: null, request },
    view: null,
    problem: null,
    notices: [],
    tools: [],
    words: { problem: 'Why there is no number', showCell: 'Show', ready: 'Computed' },
  } as const;
  try {
    const answered = await answer([bytesSource(file, bytes)], request, platform);
    const { comparison, table, files } = answered;
    const isOpen = comparison.open.length > 0;
    const blockText = isOpen ? null : printBlock(blockFrom(answered, provenance, STAMP));
    const view = viewOf(comparison, { t, table, files, version: STAMP.version, provenance, blockText });
    return {
      ...page,
      view,
      tools: isOpen
        ? [{ id: 'answer', label: 'Answer the open question…' }]
        : [
            { id: 'undo', label: 'Undo' },
            { id: 'addToNotebook', label: 'Add to notebook…' },
          ],
    };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return { ...page, problem: { ...problemWords(error, t, [file]), at: null } };
  }
}

const april: Partial<Request> = {
  measured: ['hardness'],
  label: 'schedule',
  test: 'slow cool',
  reference: 'standard',
  same: [['Slow cool', 'slow cool']],
};
const firings: Partial<Request> = { ...april, per: ['firing'] };
const cracked = { file: 0, line: 31, reason: 'tile cracked on the saw', afterResult: false };

/** Invented: two kilns with 6,000 readings each, more than are drawn one by one. */
const many = `kiln,density\n${Array.from({ length: 12_000 }, (_, index) => {
  const turns = [1, 2, 3, 4, 5, 6].reduce(
    (sum, turn) => sum + (((index + 1) * 7919 * turn * turn) % 997) / 997,
    0,
  );
  return `${index % 2 === 0 ? 'east' : 'west'},${(2.2 + turns / 20 + (index % 2) * 0.004).toFixed(3)}\n`;
}).join('')}`;

const states: Readonly<Record<string, () => Promise<Show>>> = {
  'main case': () => shown('firings-april.csv', { ...firings, matters: 15, leaveOut: [cracked] }),
  'not settled': () => shown('firings-april.csv', { ...firings, confidence: 0.999 }),
  'open question': () => shown('firings-april.csv', { ...firings, same: [] }),
  pairs: () =>
    shown('water-uptake-refired.csv', { columns: ['after (%)', 'before (%)'], pair: 'tile', matters: 0.2 }),
  shares: () =>
    shown('firings-april.csv', {
      ...april,
      measured: ['crazed'],
      measure: 'proportion',
      success: 'yes',
      per: 'none',
    }),
  summaries: () => shown('mills-summary.csv', { summary: true }),
  'many values': () => shown('kilns.csv', { measured: ['density'], label: 'kiln', per: 'none' }, many),
  problem: async () => ({
    ...(await shown('firings-april.csv', { ...april, measured: ['leach_mg_L'] })),
    notices: [
      {
        text: 'firings-april.csv has changed since these numbers were computed.',
        action: { id: 'runAgain', label: 'Run again' },
      },
    ],
  }),
};

const pages: Record<string, string> = {};
for (const [name, state] of Object.entries(states)) {
  pages[name] = render(<Page show={await state()} busy={null} send={() => undefined} />);
}
process.stdout.write(JSON.stringify(pages));
