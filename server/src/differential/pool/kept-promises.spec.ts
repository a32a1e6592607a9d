import { describe, expect, it } from 'vitest';
import { KeptPromises } from './kept-promises.js';

describe('promises that are kept', () => {
  it('are made once for everybody who asks, also while they are being worked out', async () => {
    const kept = new KeptPromises<number>(2);
    let made = 0;
    let finish = (_: number): void => undefined;
    const make = () => {
      made += 1;
      return new Promise<number>((resolve) => (finish = resolve));
    };
    const asked = [kept.of('case 1', make), kept.of('case 1', make)];
    finish(7);
    expect(await Promise.all([...asked, kept.of('case 1', make)])).toEqual([7, 7, 7]);
    expect(made).toBe(1);
  });

  it('are not kept when they failed', async () => {
    const kept = new KeptPromises<number>(2);
    await expect(kept.of('case 1', () => Promise.reject(new Error('broke')))).rejects.toThrow('broke');
    expect(await kept.of('case 1', () => Promise.resolve(3))).toBe(3);
  });

  it('are as many as said; the one unused for longest goes first', async () => {
    const kept = new KeptPromises<string>(2);
    const ask = (key: string, value: string) => kept.of(key, () => Promise.resolve(value));
    await ask('a', 'first a');
    await ask('b', 'first b');
    await ask('a', 'second a');
    await ask('c', 'first c');
    expect(await ask('a', 'third a')).toBe('first a');
    expect(await ask('b', 'second b')).toBe('second b');
  });
});
