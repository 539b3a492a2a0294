import { describe, expect, it } from 'vitest';
import { answer } from '../../../src/compare/answer';
import type { Request } from '../../../src/compare/request';
import { alikeLabels } from '../../../src/core/evidence/alikeLabels';
import { evidenceById } from '../../../src/core/evidence/index';
import type { Finding } from '../../../src/core/model/comparison';
import { bytesSource } from '../../../src/readers/byteSource';
import { noTick } from '../groupsFrom';

const createHasher = () => ({ update: () => undefined, hex: () => '' });
const english = (text: string, ...args: readonly (string | number)[]) =>
  text.replace(/\{(\d)\}/g, (_, at: string) => String(args[Number(at)]));

async function findings(text: string, request: Partial<Request> = {}): Promise<readonly Finding[]> {
  const source = bytesSource('a.csv', new TextEncoder().encode(text));
  const asked = {
    files: ['a.csv'],
    wish: {},
    measured: ['mass'],
    label: 'site',
    per: 'none' as const,
    ...request,
  };
  return (await answer([source], asked, { tick: noTick, createHasher })).comparison.findings;
}
const saidOf = (finding: Finding | undefined) =>
  finding === undefined ? '' : (evidenceById(finding.id)?.say(finding, english) ?? '');

const rows = ['north,1.5', 'north,1.6', 'North,1.7', 'south,2.5', 'south,2.4', 'south,2.6', 'north,1.4'];
const file = `site,mass\n${rows.join('\n')}\n`;
const two = { test: 'north', reference: 'south' };

describe('labels that are spelt in two ways', () => {
  it('are asked about, with the rows of the rarer spelling and the merge that answers', async () => {
    const [found] = await findings(file, two);
    expect(found).toMatchObject({
      id: 'label-variants',
      level: 'ask',
      count: 1,
      answers: [{ same: [['North', 'north']] }, { same: [['North', 'North']] }],
    });
    expect(found?.cells).toEqual([{ file: 0, line: 4, field: 0 }]);
    expect(saidOf(found)).toBe(
      'site holds labels that differ only in capitals or spaces: "north" (3), "North" (1). Are they the same group?',
    );
  });

  it('are settled once they are declared the same, or one of them a label of its own', async () => {
    expect(await findings(file, { ...two, same: [['North', 'north']] })).toEqual([]);
    expect(await findings(file, { ...two, same: [['North', 'North']] })).toEqual([]);
  });

  it('are two groups where both are named, and then only a warning', async () => {
    const text = file.replace('north,1.6', 'North,1.6');
    const [found] = await findings(text, { test: 'north', reference: 'North' });
    expect(found).toMatchObject({ id: 'label-variants', level: 'warn' });
  });

  it('are no matter where none of them is compared', async () => {
    expect(await findings(`${file}west,1\nWest,2\n`, { ...two, same: [['North', 'north']] })).toEqual([]);
  });

  it('are alike in capitals, spaces and width, and not otherwise', () => {
    expect(alikeLabels(['a', 'A ', 'ａ', 'b', 'a b', 'A  b', ''])).toEqual([
      ['a', 'A ', 'ａ'],
      ['a b', 'A  b'],
    ]);
  });
});

describe('a totals row at the foot', () => {
  it('is named with its line, its text and its column', async () => {
    const text = file
      .replace('North', 'north')
      .replace('site,mass', 'tile;site;mass')
      .replace(/^(north|south),/gm, 'x;$1;');
    const [found] = await findings(`${text}"Mean";;1.96\n`, two);
    expect(found).toMatchObject({
      id: 'footer-row',
      level: 'warn',
      count: 1,
      cells: [{ file: 0, line: 9, field: 0 }],
    });
    expect(saidOf(found)).toBe('Line 9 reads "Mean" under tile: taken as a totals row, not as data.');
  });
});

describe('rows that have not as many cells as there are columns', () => {
  const plain = 'site,mass\nnorth,1.5\nnorth,1.6\nnorth,1.4\nsouth,2.5\nsouth,2.4\nsouth,2\n';
  const about = async (text: string, request: Partial<Request> = {}) =>
    (await findings(text, request)).filter(({ id }) => id === 'ragged-rows');

  it('are asked about where a decimal comma could have split a number, until they are left out', async () => {
    const text = plain.replace('south,2\n', 'south,2,7\n');
    const [found] = await about(text);
    expect(found).toMatchObject({
      level: 'ask',
      facts: { what: 'split', text: 'south,2,7', count: 1 },
      cells: [{ file: 0, line: 7 }],
    });
    expect(saidOf(found)).toContain('"south,2,7"');
    const leaveOut = [{ file: 0, line: 7, reason: 'two numbers', afterResult: false }];
    expect(await about(text, { leaveOut })).toEqual([]);
  });

  it('are a warning where the cells too many are no part of a number, or too few', async () => {
    const [long] = await about(plain.replace('south,2\n', 'south,2,wet\n'));
    expect(long).toMatchObject({ level: 'warn', facts: { what: 'long', count: 1 } });
    const [short] = await about(
      plain
        .replace('site,mass', 'site,mass,note')
        .replaceAll(/(\d)\n/g, '$1,x\n')
        .replace('2.4,x', '2.4'),
    );
    expect(short).toMatchObject({ level: 'warn', facts: { what: 'short', count: 1 }, cells: [{ line: 6 }] });
    expect(saidOf(short)).toMatch(/^1 row has fewer cells/);
  });

  it('are no matter where only empty cells are too many', async () => {
    expect(await about(plain.replace('south,2\n', 'south,2,,\n'))).toEqual([]);
  });
});

describe('cells and lines that are read otherwise than they look', () => {
  const of = async (id: string, text: string, request: Partial<Request> = {}) =>
    (await findings(text, request)).filter(own => own.id === id);
  const many = 'site;mass\nnorth;1.234,5\nnorth;1.236,0\nsouth;1.301,5\nsouth;1.299,0\n';

  it('have their thousands marks taken off with a note', async () => {
    const [found] = await of('thousands-marks', many);
    expect(found).toMatchObject({ level: 'note', count: 4 });
    expect(saidOf(found)).toContain('"1.234,5"');
    expect(await of('thousands-marks', many.replaceAll('1.', '1'))).toEqual([]);
  });

  it('are named: quotation marks inside a cell, comment lines', async () => {
    const text = 'site,mass\nnorth,1.5\n# scale changed\n"nor"th",1.6\nnorth,1.7\nsouth,2.5\nsouth,2.6\n';
    const found = await of('read-otherwise', text, { test: 'north', reference: 'south' });
    expect(found.map(({ level, facts }) => [level, facts['what']])).toEqual([
      ['warn', 'quote-inside'],
      ['note', 'comment-line'],
    ]);
    expect(saidOf(found[1])).toBe('1 comment line was passed over: "# scale changed".');
    expect(await of('read-otherwise', 'site,mass\nnorth,1.5\nnorth,1.6\nsouth,2.5\nsouth,2.6\n')).toEqual([]);
  });
});
