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
