import { describe, expect, it } from 'vitest';
import type { Request } from '../../src/compare/request';
import { start } from '../../src/compare/session';
import { readFromPanel } from '../../src/protocol/fromPanel';
import { readFromWorker } from '../../src/protocol/fromWorker';
import { readPanelState } from '../../src/protocol/panelState';
import { readRequest } from '../../src/protocol/request';
import { readSeen } from '../../src/protocol/session';
import { readToPanel } from '../../src/protocol/toPanel';
import { readToWorker } from '../../src/protocol/toWorker';
import { joinAnswers } from '../../src/protocol/asking';

const when = '2031-04-02T09:31:00+02:00';
const request: Request = {
  files: ['firings/april.csv'],
  wish: { decimal: ',', header: 3, missing: ['n/a'] },
  measured: ['hardness'],
  label: 'schedule',
  test: 'slow cool',
  reference: 'standard',
  per: ['firing'],
  question: 'differs',
  margin: [-15, 15],
  rows: [[5, 76]],
  leaveOut: [{ file: 0, line: 31, reason: 'tile cracked on the saw', afterResult: false }],
  same: [['Slow cool', 'slow cool']],
  options: { seed: 7, thresholds: [1, 2] },
};
const file = { name: 'firings/april.csv', path: '/data/firings/april.csv', bytes: null, stamp: '1' };
const provenance = {
  questionInWords: '',
  sampling: '',
  analyst: '',
  reasons: {},
  changed: [],
  looks: 1,
  plan: null,
  replaces: null,
};
const answer = {
  type: 'answer',
  call: 1,
  revision: 0,
  files: [file],
  session: start(request, when),
  provenance,
  written: when,
  record: true,
  numbers: false,
};

describe('messages to the worker', () => {
  it('pass as they were sent, a request with all its parts', () => {
    expect(readToWorker(answer)).toEqual(answer);
  });

  it('survive being cloned from one thread to the other', () => {
    const flags = new Int32Array(new SharedArrayBuffer(16));
    const began = { type: 'start', words: { Show: 'Zeigen' }, version: '0.1.0', flags };
    expect(readToWorker(structuredClone(began))).toEqual(began);
    const bytes = { ...file, path: null, bytes: new Uint8Array([1, 2]) };
    const survey = { type: 'survey', call: 2, revision: 0, files: [bytes], request: {}, spans: [] };
    expect(readToWorker(structuredClone(survey))).toEqual(survey);
  });

  it.each([
    ['of no known type', { ...answer, type: 'compute' }],
    ['without the number of their call', { ...answer, call: undefined }],
    ['with a file that has neither a path nor bytes', { ...answer, files: [{ ...file, path: null }] }],
    ['with a file that has both', { ...answer, files: [{ ...file, bytes: new Uint8Array() }] }],
    ['with an unknown part', { ...answer, more: 1 }],
    ['with a time that is none', { ...answer, written: 'yesterday' }],
    ['with a step that does not exist', { ...answer, session: { ...start(request, when), at: 3 } }],
    [
      'with an unknown question',
      { ...answer, session: start({ ...request, question: 'bigger' as 'higher' }, when) },
    ],
  ])('are turned away %s', (_, message) => {
    expect(() => readToWorker(message)).toThrow(/to worker/);
  });
});

describe('messages from the worker', () => {
  it('name the place that is wrong and never what stands there', () => {
    const asked = { type: 'asked', call: 1, revision: 0, request: { label: 17_235 }, step: null };
    expect(() => readFromWorker(asked)).toThrow(/request\.label/);
    expect(() => readFromWorker(asked)).not.toThrow(/17/);
  });

  it('hold a view that is an object', () => {
    const answered = {
      type: 'answered',
      call: 1,
      revision: 4,
      blockText: null,
      readings: [],
      cells: '',
      open: [],
      leaveOut: [],
      numbers: null,
    };
    expect(() => readFromWorker({ ...answered, view: 'words' })).toThrow(/view/);
    expect(readFromWorker({ ...answered, view: {} })).toMatchObject({ revision: 4 });
  });
});

describe('messages from a panel', () => {
  it.each([
    { type: 'ready' },
    { type: 'act', revision: 2, action: { kind: 'point', at: { file: 0, line: 31, field: 3 } } },
    { type: 'act', revision: 2, action: { kind: 'change', key: 'question' } },
    { type: 'notice', id: 'saveAndRunAgain' },
    { type: 'tool', id: 'addToNotebook' },
  ])('pass when they are as agreed: %j', message => {
    expect(readFromPanel(message)).toEqual(message);
  });

  it.each([
    { type: 'act', revision: 2, action: { kind: 'change', key: 'files' } },
    { type: 'act', revision: 2, action: { kind: 'show', at: { file: 0, line: 0, field: 3 } } },
    { type: 'act', action: { kind: 'copyBlock' } },
    { type: 'notice', id: 'deleteFile' },
    'ready',
    null,
  ])('are turned away otherwise: %j', message => {
    expect(() => readFromPanel(message)).toThrow(/from panel/);
  });
});

describe('messages to a panel', () => {
  const show = {
    type: 'show',
    revision: 1,
    recipe: { files: ['file:///data/firings/april.csv'], blockText: null, request },
    view: null,
    problem: {
      code: 'file-empty',
      message: 'The file is empty.',
      where: null,
      fix: 'Choose another.',
      at: null,
    },
    notices: [{ text: 'Not saved.', action: { id: 'saveAndRunAgain', label: 'Save and run again' } }],
    tools: [{ id: 'undo', label: 'Undo' }],
    words: { problem: 'Why there is no number', showCell: 'Show', ready: 'Computed' },
  };

  it('hold what is shown and the recipe that brings it back', () => {
    expect(readToPanel(show)).toEqual(show);
    expect(() => readToPanel({ ...show, recipe: null })).toThrow(/recipe/);
  });
});

describe('what is kept between sittings', () => {
  const state = {
    recipe: { files: ['file:///a.csv'], blockText: 'x', request },
    scroll: 120,
    openSections: [0, 2],
  };

  it('is read back, and is nothing when another version kept it', () => {
    expect(readPanelState(state)).toEqual(state);
    expect(readPanelState({ ...state, scroll: 'far' })).toBeNull();
    expect(readPanelState(undefined)).toBeNull();
    const seen = { looks: 3, firstShown: { request, when } };
    expect(readSeen(seen)).toEqual(seen);
    expect(readSeen({ looks: -1 })).toBeNull();
  });
});

describe('requests of other programs', () => {
  it('may hold any part and nothing unknown', () => {
    expect(readRequest({ measured: ['hardness'], per: 'none' })).toEqual({
      measured: ['hardness'],
      per: 'none',
    });
    expect(() => readRequest({ mesured: ['hardness'] })).toThrow(/mesured/);
    expect(() => readRequest({ per: 'firing' })).toThrow(/per/);
  });
});

describe('several answers picked at once', () => {
  it('join their lists in order and replace what is no list', () => {
    expect(joinAnswers([{ columns: ['a'] }, { columns: ['b'], question: 'lower' }])).toEqual({
      columns: ['a', 'b'],
      question: 'lower',
    });
  });
});
