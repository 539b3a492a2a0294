import { describe, expect, it, vi } from 'vitest';
import { Shelf } from '../../src/worker/shelf';

describe('what was read', () => {
  it('is made once for the same files', async () => {
    const shelf = new Shelf<number>(2);
    const make = vi.fn(() => Promise.resolve(1));
    expect([await shelf.get('a', make), await shelf.get('a', make)]).toEqual([1, 1]);
    expect(make).toHaveBeenCalledTimes(1);
  });

  it('makes room by what was not asked for longest', async () => {
    const shelf = new Shelf<string>(2);
    const made: string[] = [];
    const get = (key: string): Promise<string> =>
      shelf.get(key, () => {
        made.push(key);
        return Promise.resolve(key);
      });
    for (const key of ['a', 'b', 'a', 'c', 'a', 'b']) await get(key);
    expect(made).toEqual(['a', 'b', 'c', 'b']);
  });

  it('is made anew after a failure, and by a caller who waited for another that gave up', async () => {
    const shelf = new Shelf<string>(2);
    const first = shelf.get('a', () => Promise.reject(new Error('given up')));
    const second = shelf.get('a', () => Promise.resolve('read'));
    await expect(first).rejects.toThrow('given up');
    expect(await second).toBe('read');
    expect(await shelf.get('a', () => Promise.resolve('again'))).toBe('read');
  });
});
