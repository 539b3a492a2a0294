import { describe, expect, it } from 'vitest';
import type { Request } from '../../src/compare/request';
import { reduce, start } from '../../src/compare/session';
import type { Provenance } from '../../src/core/model/settings';
import { giveUp, makeCancelFlags } from '../../src/protocol/cancelFlags';
import type { FileInput } from '../../src/protocol/files';
import type { WorkerReply } from '../../src/protocol/fromWorker';
import { parseBlock } from '../../src/settings/parseBlock';
import { requestFrom } from '../../src/settings/requestFrom';
import { fileOf, makeWorker } from './fakePort';

const when = '2031-04-02T09:31:00+02:00';
const provenance: Provenance = {
  questionInWords: '',
  sampling: 'drawn by lot',
  analyst: 'R. Kolb',
  reasons: {},
  changed: [],
  looks: 1,
  plan: null,
  replaces: null,
};
const text = `kiln;tile;hardness
east;1;840,5
east;2;851,0
east;3;846,0
east;4;839,5
west;1;817,9
west;2;809,2
west;3;821,4
west;4;813,3
`;
const file = fileOf('firings/april.csv', text);
const request: Request = {
  files: [file.name],
  wish: {},
  measured: ['hardness'],
  label: 'kiln',
  test: 'east',
  reference: 'west',
  per: 'none',
};

function of<T extends WorkerReply['type']>(type: T, reply: WorkerReply): Extract<WorkerReply, { type: T }> {
  if (reply.type !== type) throw new Error(`a reply of type ${reply.type}: ${JSON.stringify(reply)}`);
  return reply as Extract<WorkerReply, { type: T }>;
}

const answerTo = (asked: Request, more: { files?: readonly FileInput[]; record?: boolean } = {}) =>
  ({
    type: 'answer',
    files: [file],
    session: start(asked, when),
    provenance,
    written: when,
    record: true,
    numbers: true,
    ...more,
  }) as const;

describe('the worker', () => {
  it('lives on after a call it does not understand, and says so to who sent it', async () => {
    const { ask } = makeWorker();
    const odd = answerTo({ ...request, confidence: '0.9' as unknown as number });
    expect((await ask(odd)).type).toBe('failed');
    expect((await ask(answerTo(request))).type).toBe('answered');
  });

  it('computes typed numbers anew when something else is asked of them', async () => {
    const { ask } = makeWorker();
    const typed = [
      { label: 'east', n: 9, mean: 840, sd: 12 },
      { label: 'west', n: 9, mean: 820, sd: 14 },
    ];
    for (const confidence of [0.95, 0.99]) {
      const asked = { ...answerTo({ files: [], wish: {}, typed, confidence }), files: [] };
      const { numbers } = of('answered', await ask(asked));
      expect(numbers?.['chosen']).toMatchObject({ confidence });
    }
  });

  it('surveys a file and says what a selection takes of it', async () => {
    const span = { startLine: 2, startCharacter: 3, endLine: 4, endCharacter: 0 };
    const { ask } = makeWorker();
    const reply = of('surveyed', await ask({ type: 'survey', files: [file], request: {}, spans: [span] }));
    expect(reply.says).toBe('lines 3–4, 3 columns');
    expect(reply.rows).toEqual([[3, 4]]);
    expect(reply.readings).toEqual([
      { file: file.name, encoding: 'utf-8', delimiter: ';', decimal: ',', headerLine: 1, rows: 8, met: [] },
    ]);
  });

  it('gives each reply the number and the revision of its call', async () => {
    const { ask } = makeWorker();
    const survey = { type: 'survey', files: [file], request: {}, spans: [] } as const;
    const replies = await Promise.all([ask(survey, 4, 11), ask(survey, 5, 12)]);
    expect(replies.map(({ call, revision }) => [call, revision])).toEqual([
      [11, 4],
      [12, 5],
    ]);
  });

  it('asks what the file leaves open', async () => {
    const { ask } = makeWorker();
    const call = {
      type: 'nextStep',
      files: [file],
      request: {},
      columns: null,
      remembered: null,
      answered: [],
      only: null,
    } as const;
    const { step } = of('asked', await ask(call));
    expect(step).toMatchObject({ id: 'measured', number: 1 });
  });

  it('answers with a view, the block, the numbers and what is open', async () => {
    const { ask } = makeWorker();
    const { view, blockText, numbers, open } = of('answered', await ask(answerTo(request)));
    // Means 844.25 and 815.45: the difference is 28.8.
    expect(view.answer.headline).toContain('28.8');
    expect(open).toEqual([]);
    expect(blockText).toContain('written = 2031-04-02T09:31:00+02:00');
    expect(blockText).toContain('weighbeam = "9.9.9"');
    expect(numbers).toMatchObject({ chosen: { id: 'separate-t', estimate: 28.8 } });
  });

  it('makes no record of text that stands in no file', async () => {
    const { ask } = makeWorker();
    const { blockText, view } = of('answered', await ask(answerTo(request, { record: false })));
    expect(blockText).toBeNull();
    expect(view.notebook.blockText).toBeNull();
  });

  it('reads a file once for questions of the same columns, and again when the file has changed', async () => {
    const { ask, opened } = makeWorker();
    await ask(answerTo(request));
    const once = opened.length;
    const other = of('answered', await ask(answerTo({ ...request, confidence: 0.9 })));
    const alone = of('answered', await makeWorker().ask(answerTo({ ...request, confidence: 0.9 })));
    expect(other).toEqual({ ...alone, call: other.call });
    expect(opened.length).toBe(once);

    const changed = fileOf(file.name, text.replace('840,5', '860,5'), '2');
    const after = of('answered', await ask(answerTo(request, { files: [changed] })));
    expect(after.numbers).toMatchObject({ chosen: { estimate: 33.8 } });
  });

  it('marks in the block what was changed after a result was seen', async () => {
    const seen = reduce(start(request, when), { kind: 'shown', when });
    const session = reduce(seen, { kind: 'change', patch: { confidence: 0.9 }, when });
    const { blockText } = of('answered', await makeWorker().ask({ ...answerTo(request), session }));
    expect(blockText).toContain('[[changed]]\nkey = "confidence"');
  });

  it('refuses in words, with the cell', async () => {
    const broken = fileOf(file.name, text.replace('809,2', 'cracked'), '3');
    const { problem } = of('refused', await makeWorker().ask(answerTo(request, { files: [broken] })));
    expect(problem.code).toBe('text-in-measured');
    expect(problem.at).toEqual({ file: 0, line: 7, field: 2 });
    expect(problem.fix).not.toBe('');
  });

  it('speaks the language it was started with', async () => {
    const words = { 'lines {0}': 'Zeilen {0}', '{0} columns': '{0} Spalten' };
    const span = { startLine: 2, startCharacter: 3, endLine: 4, endCharacter: 0 };
    const reply = await makeWorker({ words }).ask({
      type: 'survey',
      files: [file],
      request: {},
      spans: [span],
    });
    expect(of('surveyed', reply).says).toBe('Zeilen 3–4, 3 Spalten');
  });

  it('stops a call that was given up, and answers the next', async () => {
    const flags = makeCancelFlags();
    if (flags === null) throw new Error('Node shares memory');
    const { ask } = makeWorker({ flags });
    giveUp(flags, 21);
    expect((await ask(answerTo(request), 1, 21)).type).toBe('cancelled');
    expect((await ask(answerTo(request), 2, 22)).type).toBe('answered');
  });

  it('finds a cell in the text of its file', async () => {
    const { ask } = makeWorker();
    const place = { type: 'locate', files: [file], request: {}, file: 0, line: 7, field: 2 } as const;
    expect(await ask(place)).toMatchObject({ type: 'located', line: 7, startColumn: 8, endColumn: 13 });
  });
});

describe('blocks', () => {
  it('are found, and hold the request and give back the words they were made from', async () => {
    const { ask } = makeWorker();
    const { blockText } = of('answered', await ask(answerTo(request)));
    const note = `Kilns\n\n\`\`\`toml\n${blockText ?? ''}\`\`\`\n`;
    const found = of('blocksFound', await ask({ type: 'blocks', text: note }));
    expect(found.blocks).toMatchObject([{ firstLine: 4, files: [file.name] }]);
    const restored = of('restored', await ask({ type: 'restore', blockText: blockText ?? '' }));
    const held = requestFrom(parseBlock(blockText ?? '', 1).block);
    expect(held).toMatchObject({
      measured: ['hardness'],
      test: 'east',
      reference: 'west',
      per: 'none',
    });
    expect(restored.provenance).toMatchObject({ sampling: 'drawn by lot', analyst: 'R. Kolb' });
    const again = of('answered', await ask(answerTo(held)));
    expect(again.blockText).toBe(blockText);
  });

  it('are rechecked against the files that were found', async () => {
    const { ask } = makeWorker();
    const { blockText } = of('answered', await ask(answerTo(request)));
    const recheck = async (input: FileInput | null, outside = false) => {
      const files = [{ name: file.name, input, outside }];
      const reply = await ask({ type: 'recheck', text: blockText ?? '', files });
      return of('rechecked', reply).outcomes.map(({ kind, line }) => [kind, line > 1]);
    };
    expect(await recheck(file)).toEqual([['same', false]]);
    const changed = fileOf(file.name, text.replace('840,5', '841,5'), '2');
    expect(await recheck(changed)).toEqual([['moved', true]]);
    expect(await recheck(null)).toEqual([['blocked', false]]);
    expect(await recheck(file, true)).toEqual([['blocked', false]]);
  });
});

describe('columns without a name of their own', () => {
  it('are called by their place in questions and answers', async () => {
    const doubled = fileOf(
      'doubled.csv',
      'kiln,x,x\neast,1.5,2.5\neast,1.7,2.1\nwest,1.2,2.0\nwest,1.4,2.2\n',
    );
    const { ask } = makeWorker();
    const call = {
      type: 'nextStep',
      files: [doubled],
      request: {},
      columns: null,
      remembered: null,
      answered: [],
      only: null,
    } as const;
    const { step } = of('asked', await ask(call));
    if (step?.kind !== 'one') throw new Error('one answer is picked');
    expect(step.items.map(item => item.adds.measured?.[0])).toEqual(['#2', '#3', undefined]);
  });
});
