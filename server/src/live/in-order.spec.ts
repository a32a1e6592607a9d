import { setTimeout as wait } from 'node:timers/promises';
import { describe, expect, it } from 'vitest';
import { InOrder } from './in-order.js';

describe('tasks in order', () => {
  it('run one after the other for one key, however long each takes', async () => {
    const order = new InOrder();
    const done: string[] = [];
    const task = (name: string, ms: number) => async () => {
      await wait(ms);
      done.push(name);
    };
    await Promise.all([
      order.run('case', task('slow', 20)),
      order.run('case', task('quick', 0)),
      order.run('another case', task('apart', 5)),
    ]);
    expect(done).toEqual(['apart', 'slow', 'quick']);
  });

  it('go on after one that failed, and tell who asked for it', async () => {
    const order = new InOrder();
    const failing = order.run('case', () => Promise.reject(new Error('lost')));
    const done: string[] = [];
    const next = order.run('case', () => {
      done.push('next');
      return Promise.resolve();
    });
    await expect(failing).rejects.toThrow('lost');
    await next;
    expect(done).toEqual(['next']);
  });
});
