import { createHash } from 'node:crypto';
import { answer, type Answered, type AnswerPlatform } from '../../src/compare/answer';
import type { Request } from '../../src/compare/request';
import type { Provenance } from '../../src/core/model/settings';
import { bytesSource, type ByteSource } from '../../src/readers/byteSource';
import { blockFrom } from '../../src/settings/block';
import { printBlock } from '../../src/settings/printBlock';

export const sha256 = (text: string): string => createHash('sha256').update(text, 'utf8').digest('hex');

export const platform: AnswerPlatform = {
  tick: () => undefined,
  createHasher: () => {
    const hash = createHash('sha256');
    return { update: bytes => void hash.update(bytes), hex: () => hash.digest('hex') };
  },
};

export const source = (name: string, text: string): ByteSource =>
  bytesSource(name, new TextEncoder().encode(text));

export const provenance: Provenance = {
  questionInWords: 'does slow cooling harden the glaze?',
  sampling: '3 tiles a firing, places by lot',
  analyst: 'R. Kolb',
  reasons: {},
  changed: [],
  looks: 1,
  plan: null,
  replaces: null,
};

/** An invented export: preamble, units row, decimal commas, a label variant, a cracked tile, a totals row. */
export const EXPORT = [
  'Kiln log;;;;',
  'schedule;firing;tile;hardness;note',
  ';;;MPa;',
  'slow cool;1;a;841,5;',
  'slow cool;1;b;843,0;',
  'Slow cool;3;a;829,0;',
  'slow cool;3;b;731,0;cracked',
  'slow cool;5;a;852,5;',
  'standard;2;a;815,0;',
  'standard;2;b;818,5;',
  'standard;4;a;809,0;',
  'standard;4;b;;lost',
  'standard;6;a;821,5;',
  'Mean;;;820;',
  '',
].join('\n');

export const ASKED: Request = {
  files: ['kiln.csv'],
  wish: {},
  measured: ['hardness'],
  label: 'schedule',
  test: 'slow cool',
  reference: 'standard',
  per: ['firing'],
  same: [['Slow cool', 'slow cool']],
  leaveOut: [{ file: 0, line: 7, reason: 'tile cracked on the saw', afterResult: false }],
};

export const answerOf = (text: string, request: Request = ASKED): Promise<Answered> =>
  answer(
    request.files.map(file => source(file, text)),
    request,
    platform,
  );

export const STAMP = {
  version: '0.1.0',
  written: '2031-04-02T09:31:00+02:00',
  createHasher: platform.createHasher,
};

/** The printed block of a comparison of a text. */
export async function blockOf(text: string, request: Request = ASKED, given = provenance): Promise<string> {
  return printBlock(blockFrom(await answerOf(text, request), given, STAMP));
}

/** Two exports of one group each, every one in its own dialect. */
export const TWO_FILES: Readonly<Record<string, string>> = {
  'may.csv': 'tile,hardness\na,841.5\nb,843\nc,829\nd,833.5\n',
  'june.csv': 'tile;hardness\na;815,0\nb;818,5\nc;809,0\nd;812,5\n',
};

/** The printed block of the comparison of TWO_FILES. */
export async function twoFilesBlock(): Promise<string> {
  const files = Object.keys(TWO_FILES);
  const sources = files.map(file => source(file, TWO_FILES[file] ?? ''));
  const answered = await answer(sources, { files, wish: {}, measured: ['hardness'] }, platform);
  return printBlock(blockFrom(answered, provenance, STAMP));
}
