import { describe, expect, it } from 'vitest';
import { cellsDigest, recordId, rowDigest } from '../../src/settings/digests';
import { findBlocks } from '../../src/settings/findBlocks';
import { EXPORT, answerOf, blockOf, platform, sha256 } from './recording';

const digestOf = async (text: string): Promise<string> => {
  const { table, comparison } = await answerOf(text);
  return table === null ? '' : cellsDigest(table, comparison.settings, platform.createHasher);
};

describe('cells digest', () => {
  it('is the SHA-256 of label, value and units of each used row, as anyone can write them down', async () => {
    const byHand = [
      'slow cool\t841.5\t1',
      'slow cool\t843\t1',
      'slow cool\t829\t3',
      'slow cool\t852.5\t5',
      'standard\t815\t2',
      'standard\t818.5\t2',
      'standard\t809\t4',
      'standard\t\t4',
      'standard\t821.5\t6',
      '',
    ].join('\n');
    expect(await digestOf(EXPORT)).toBe(sha256(byHand));
  });

  it('survives edits of columns that are not used, of the preamble and of how numbers are written', async () => {
    const before = await digestOf(EXPORT);
    expect(await digestOf(EXPORT.replace('lost', 'found broken'))).toBe(before);
    expect(await digestOf(EXPORT.replaceAll('\n', '\r\n'))).toBe(before);
    expect(await digestOf(EXPORT.replace('841,5', '841,50'))).toBe(before);
  });

  it('changes with a used value, label or unit', async () => {
    const before = await digestOf(EXPORT);
    expect(await digestOf(EXPORT.replace('841,5', '841,6'))).not.toBe(before);
    expect(await digestOf(EXPORT.replace('slow cool;5;a', 'slow cool;7;a'))).not.toBe(before);
  });

  it('holds n, mean and SD of rows that are summaries', async () => {
    const text = 'mill,n,mean,sd\nA,12,31.40,1.1\nB,10,30.2,0.9\n';
    const { table, comparison } = await answerOf(text, { files: ['mills.csv'], wish: {}, summary: true });
    expect(cellsDigest(table ?? never(), comparison.settings, platform.createHasher)).toBe(
      sha256('A\t12\t31.4\t1.1\nB\t10\t30.2\t0.9\n'),
    );
  });

  it('is made of a million rows piece by piece', async () => {
    const rows = Array.from({ length: 1_000_000 }, (_, row) => `${row % 2 === 0 ? 'A' : 'B'},${row % 997}.5`);
    const { table, comparison } = await answerOf(`kiln,x\n${rows.join('\n')}\n`, {
      files: ['x.csv'],
      wish: {},
      measured: ['x'],
      label: 'kiln',
      per: 'none',
      onlyChosen: true,
    });
    const longest = { pieces: 0, length: 0 };
    const digest = cellsDigest(table ?? never(), comparison.settings, () => {
      const hasher = platform.createHasher();
      return {
        update: piece => {
          longest.pieces += 1;
          longest.length = Math.max(longest.length, piece.length);
          hasher.update(piece);
        },
        hex: () => hasher.hex(),
      };
    });
    expect(digest).toBe(sha256(rows.map(row => `${row.replace(',', '\t')}\n`).join('')));
    expect(longest.pieces).toBeGreaterThan(100);
    expect(longest.length).toBeLessThan(100_000);
  });
});

function never(): never {
  throw new Error('there is no table');
}

describe('row digest', () => {
  it('is the SHA-256 of the cells joined by TAB', () => {
    expect(rowDigest(['slow cool', '3', 'b', '731,0'], platform.createHasher)).toBe(
      sha256('slow cool\t3\tb\t731,0'),
    );
  });
});

describe('record id', () => {
  it('is the SHA-256 of the lines above [record]', async () => {
    const block = await blockOf(EXPORT);
    const above = block.slice(0, block.indexOf('[record]'));
    expect(block).toContain(`id = "${sha256(above)}"`);
  });

  it('does not change with indentation, quote marks or line ends of the notebook', async () => {
    const block = await blockOf(EXPORT);
    const id = recordId(block, platform.createHasher);
    for (const around of ['   ', '> ', '- ', '% ']) {
      const [found] = findBlocks(`text\n${block.replace(/^(?=.)/gmu, around)}`.replaceAll('\n', '\r\n'));
      expect(recordId(found?.text ?? '', platform.createHasher), around).toBe(id);
    }
  });

  it('changes with any line above it', async () => {
    const block = await blockOf(EXPORT);
    const edited = block.replace('confidence = 0.95', 'confidence = 0.9');
    expect(recordId(edited, platform.createHasher)).not.toBe(recordId(block, platform.createHasher));
  });
});
