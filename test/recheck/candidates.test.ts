import { describe, expect, it } from 'vitest';
import { candidates } from '../../src/recheck/candidates';

describe('where a file of a block may stand', () => {
  it('is the root, then the folders from the notebook up to it', () => {
    expect(candidates('firings/april.csv', 'lab/notes')).toEqual([
      'firings/april.csv',
      'lab/notes/firings/april.csv',
      'lab/firings/april.csv',
    ]);
    expect(candidates('april.csv', '')).toEqual(['april.csv']);
    expect(candidates('april.csv', '.')).toEqual(['april.csv']);
    expect(candidates('./firings/../april.csv', 'lab')).toEqual(['april.csv', 'lab/april.csv']);
    expect(candidates('lot\\2.csv', '')).toEqual(['lot\\2.csv']);
  });

  it('is never outside the root', () => {
    for (const name of [
      '../april.csv',
      'a/../../april.csv',
      '/etc/april.csv',
      'C:/april.csv',
      'C:april.csv',
    ]) {
      expect(() => candidates(name, 'lab/notes'), name).toThrow('file-outside-root');
    }
    for (const name of ['..\\april.csv', 'a\\..\\..\\april.csv', '\\\\server\\april.csv']) {
      expect(() => candidates(name, 'lab/notes'), name).toThrow('file-outside-root');
    }
  });
});
