import { describe, expect, it } from 'vitest';
import { changedAfterShown } from '../../src/compare/changedAfterShown';
import { requestPatch } from '../../src/compare/requestPatch';
import {
  canRedo,
  canUndo,
  reduce,
  requestOf,
  start,
  type Action,
  type Session,
} from '../../src/compare/session';
import type { Request } from '../../src/compare/request';
import { refusal } from './ask';

const request: Request = { files: ['a.csv'], wish: {}, measured: ['x'], label: 'g' };
const at = (minute: number): string => `2031-04-02T09:${String(minute).padStart(2, '0')}:00+02:00`;
const after = (...actions: readonly Action[]): Session => actions.reduce(reduce, start(request, at(0)));
const change = (patch: Partial<Request>, minute: number): Action => ({
  kind: 'change',
  patch,
  when: at(minute),
});
const out = (line: number, minute: number, reason = 'cracked'): Action => ({
  kind: 'leave out',
  file: 0,
  line,
  reason,
  when: at(minute),
});
const shown = (minute: number): Action => ({ kind: 'shown', when: at(minute) });

describe('a session', () => {
  it('goes back and forth, and forgets what was undone when something else is changed', () => {
    const changed = after(change({ confidence: 0.9 }, 1), change({ variance: 'pooled' }, 2));
    expect(requestOf(changed)).toEqual({ ...request, confidence: 0.9, variance: 'pooled' });
    const back = reduce(changed, { kind: 'undo' });
    expect(requestOf(back)).toEqual({ ...request, confidence: 0.9 });
    expect(requestOf(reduce(back, { kind: 'redo' }))).toEqual(requestOf(changed));
    const other = reduce(back, change({ question: 'higher' }, 3));
    expect([canRedo(back), canRedo(other), canUndo(start(request, at(0)))]).toEqual([true, false, false]);
    expect(reduce(other, { kind: 'redo' })).toBe(other);
    expect(reduce(start(request, at(0)), { kind: 'undo' }).at).toBe(0);
  });

  it('keeps the names that the files have now, whatever is undone', () => {
    const renamed = after(change({ confidence: 0.9 }, 1), shown(2), { kind: 'moved', files: ['b.csv'] });
    expect(requestOf(renamed)).toEqual({ ...request, files: ['b.csv'], confidence: 0.9 });
    expect(requestOf(reduce(renamed, { kind: 'undo' }))).toEqual({ ...request, files: ['b.csv'] });
    expect(changedAfterShown(renamed)).toEqual([]);
  });

  it('names the rows left out by the lines they stand on now, whatever is undone', () => {
    const left = after(out(31, 1), shown(2), out(12, 3));
    const found = [
      { file: 0, line: 33, reason: 'cracked', afterResult: false, digest: 'd31' },
      { file: 0, line: 14, reason: 'cracked', afterResult: true, digest: 'd12' },
    ];
    const moved = reduce(left, { kind: 'found', leaveOut: found });
    expect(requestOf(moved).leaveOut).toEqual(found);
    expect(requestOf(reduce(moved, { kind: 'undo' })).leaveOut).toEqual([found[0]]);
    expect(changedAfterShown(moved)).toEqual([]);
  });

  it('never changes what it was given', () => {
    const before = Object.freeze(start(Object.freeze({ ...request }), at(0)));
    reduce(before, change({ confidence: 0.9 }, 1));
    expect(before.history).toHaveLength(1);
  });

  it('leaves a key open again', () => {
    const pooled = after(change({ variance: 'pooled' }, 1));
    const open = reduce(pooled, { kind: 'change', patch: {}, unset: ['variance'], when: at(2) });
    expect(requestOf(open)).toEqual(request);
  });

  it('leaves a row out only with a reason, and takes it back', () => {
    expect(refusal(() => after(out(31, 1, '  ')))).toMatchObject({
      code: 'reason-needed',
      facts: { line: 31 },
    });
    const left = after(out(31, 1), out(12, 2), out(31, 3, 'cracked on the saw'));
    expect(requestOf(left).leaveOut).toEqual([
      { file: 0, line: 12, reason: 'cracked', afterResult: false },
      { file: 0, line: 31, reason: 'cracked on the saw', afterResult: false },
    ]);
    const back = reduce(left, { kind: 'take back', file: 0, line: 31, when: at(4) });
    expect(requestOf(back).leaveOut?.map(({ line }) => line)).toEqual([12]);
  });

  it('marks a row that was left out after a result was seen', () => {
    expect(requestOf(after(shown(1), out(31, 2))).leaveOut?.[0]?.afterResult).toBe(true);
  });

  it('merges labels and takes up the answer to a question', () => {
    const merged = after({ kind: 'merge labels', from: 'Slow', to: 'slow', when: at(1) });
    expect(requestOf(merged).same).toEqual([['Slow', 'slow']]);
    const paired = after({
      kind: 'answer',
      answer: { relation: { kind: 'pairs', column: 'plot' } },
      when: at(1),
    });
    expect(requestOf(paired).pair).toBe('plot');
    const restarts = after({ kind: 'answer', answer: { numberingRestarts: true }, when: at(1) });
    expect(requestOf(restarts).pair).toBe('none');
  });

  it('an answer of pairs by a unit column takes the place of the units', () => {
    const units = after(change({ per: ['plot'] }, 1), {
      kind: 'answer',
      answer: { relation: { kind: 'pairs', column: 'plot' } },
      when: at(2),
    });
    expect(requestOf(units)).not.toHaveProperty('per');
  });
});

describe('a change', () => {
  it.each<[Partial<Request>, Partial<Request>, Partial<Request>]>([
    [{ method: 'conservative-t' }, { variance: 'pooled' }, { variance: 'pooled' }],
    [{ variance: 'separate', df: 'smaller' }, { variance: 'pooled' }, { variance: 'pooled' }],
    [{ variance: 'pooled' }, { method: 'separate-t' }, { method: 'separate-t' }],
    [{ variance: 'separate' }, { df: 'smaller' }, { variance: 'separate', df: 'smaller' }],
    [{ per: ['plot'], variance: 'pooled' }, { pair: 'plot' }, { pair: 'plot' }],
    [{ pair: 'plot' }, { per: ['plot'] }, { per: ['plot'] }],
    [{ per: ['plot'] }, { pair: 'none' }, { per: ['plot'], pair: 'none' }],
    [{ pair: 'plot', method: 'paired-t' }, { pair: 'none' }, { pair: 'none' }],
    [{ pair: 'plot', method: 'paired-t' }, { per: 'none' }, { per: 'none' }],
    [
      { test: 'Slow', reference: 'b' },
      { same: [['Slow', 'slow']] },
      { reference: 'b', same: [['Slow', 'slow']] },
    ],
    [
      { matters: 5, against: 1, margin: [-9, 9], sigma: [1, 2], variance: 'known' },
      { measure: 'proportion' },
      { measure: 'proportion' },
    ],
    [{ test: 'a', reference: 'b' }, { label: 'site' }, { label: 'site' }],
    [{ test: 'a', reference: 'b' }, { label: 'g' }, { test: 'a', reference: 'b' }],
    [
      { variance: 'pooled' },
      { measure: 'proportion', success: 'yes' },
      { measure: 'proportion', success: 'yes' },
    ],
  ])('of %j by %j leaves no contradiction behind', (was, patch, is) => {
    const session = reduce(start({ ...request, ...was }, at(0)), change(patch, 1));
    expect(requestOf(session)).toEqual({ ...request, ...is });
  });

  it('from one column a group to a label column and back drops what was said of the other', () => {
    const wide = reduce(start(request, at(0)), change({ columns: ['x', 'y'] }, 1));
    expect(requestOf(wide)).toEqual({ files: ['a.csv'], wish: {}, columns: ['x', 'y'] });
    const long = reduce(wide, change({ measured: ['x'], label: 'g' }, 2));
    expect(requestOf(long)).toEqual(request);
  });
});

describe('what was changed after a result was seen', () => {
  it('is nothing before a result was seen, and nothing that is as it was', () => {
    expect(changedAfterShown(after(change({ confidence: 0.9 }, 1)))).toEqual([]);
    expect(changedAfterShown(after(shown(1), change({ confidence: 0.9 }, 2), { kind: 'undo' }))).toEqual([]);
    expect(changedAfterShown(after(shown(1), change({ confidence: 0.95, variance: 'separate' }, 2)))).toEqual(
      [],
    );
  });

  it('is named by key, from, to, time and reason', () => {
    const session = after(
      shown(1),
      change({ confidence: 0.9 }, 2),
      change({ question: 'higher' }, 3),
      { kind: 'reason', key: 'confidence', reason: 'protocol 12' },
      change({ variance: 'pooled' }, 4),
    );
    expect(changedAfterShown(session)).toEqual([
      { key: 'method', from: 'separate-t', to: 'pooled-t', when: at(4), reason: '' },
      { key: 'question', from: 'differs', to: 'higher', when: at(3), reason: '' },
      { key: 'confidence', from: 0.95, to: 0.9, when: at(2), reason: 'protocol 12' },
    ]);
  });

  it('is measured from the first result, not from the last', () => {
    const session = after(
      shown(1),
      change({ confidence: 0.9 }, 2),
      shown(3),
      change({ confidence: 0.99 }, 4),
      shown(5),
    );
    expect(changedAfterShown(session)).toMatchObject([
      { key: 'confidence', from: 0.95, to: 0.99, when: at(4) },
    ]);
  });

  it('names a margin set since, and a row taken back since', () => {
    const session = after(out(31, 1), shown(2), change({ margin: [-1, 1] }, 3), {
      kind: 'take back',
      file: 0,
      line: 31,
      when: at(4),
    });
    expect(changedAfterShown(session)).toEqual([
      { key: 'left-out', from: 'line 31', to: 'none', when: at(4), reason: '' },
      { key: 'margin', from: 'none', to: [-1, 1], when: at(3), reason: '' },
    ]);
  });

  it('is kept over a restart that hands in what was first seen', () => {
    const earlier = { request, when: at(0) };
    const session = start({ ...request, confidence: 0.9 }, at(30), earlier);
    expect(changedAfterShown(session)).toMatchObject([
      { key: 'confidence', from: 0.95, to: 0.9, when: at(30) },
    ]);
  });

  it('does not stumble over words that contradict each other', () => {
    const session = after(shown(1), change({ variance: 'pooled', df: 'smaller' }, 2));
    expect(changedAfterShown(session)).toMatchObject([
      { key: 'method', from: 'separate-t', to: 'pooled smaller' },
    ]);
  });
});

describe('a part of Settings as a part of a request', () => {
  it('holds no key that was not set', () => {
    expect(requestPatch({})).toEqual({});
    expect(requestPatch({ margin: null, rows: 'all', test: null, relation: { kind: 'rows' } })).toEqual({});
  });

  it('speaks the words of a request', () => {
    expect(
      requestPatch({
        relation: { kind: 'independent' },
        layout: { kind: 'wide', columns: ['a', 'b'] },
        rows: [[2, 5]],
        margin: [-1, 1],
        same: [['a', 'b']],
      }),
    ).toEqual({ per: 'none', columns: ['a', 'b'], rows: [[2, 5]], margin: [-1, 1], same: [['a', 'b']] });
  });
});
