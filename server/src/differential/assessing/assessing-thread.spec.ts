import { Worker } from 'node:worker_threads';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { PanelRefused } from '@weighhouse/shared/reasoning/assess';
import { afterEach, describe, expect, it } from 'vitest';
import { AssessingThread } from './assessing-thread.js';

/** A stand-in for the program: it answers how many questions it was asked, and does what its panel's name says. */
const program = `
  const { parentPort } = require('node:worker_threads');
  let count = 0;
  parentPort.on('message', ({ panel: { candidates: [name] } }) => {
    count += 1;
    if (name === 'throws') throw new Error('out of memory');
    if (name === 'ends') process.exit(3);
    if (name === 'refused') return parentPort.postMessage({ refused: [{ path: 'candidates', message: 'too many' }] });
    if (name !== 'stays') parentPort.postMessage({ answer: { method: name, standing: [count] } });
  });
`;

let started = 0;
const threads: AssessingThread[] = [];
function makeThread(): AssessingThread {
  started = 0;
  const thread = new AssessingThread(() => {
    started += 1;
    return new Worker(program, { eval: true });
  });
  threads.push(thread);
  return thread;
}
afterEach(() => Promise.all(threads.splice(0).map((thread) => thread.close())));

const named = (name: string): PanelView => ({
  candidates: [name],
  coexistence: 0,
  tempering: 1,
  together: [],
  groups: [],
  findings: [],
  contributors: [],
});

describe('a thread for heavy panels', () => {
  it('is started when it is needed, and answers in order', async () => {
    const thread = makeThread();
    expect(started).toBe(0);
    const answers = await Promise.all(['a', 'b', 'c'].map((name) => thread.ask('standing', named(name))));
    expect(answers).toEqual([
      { method: 'a', standing: [1] },
      { method: 'b', standing: [2] },
      { method: 'c', standing: [3] },
    ]);
    expect(started).toBe(1);
  });

  it('tells a refused panel with every fault, and goes on', async () => {
    const thread = makeThread();
    const refused = thread.ask('whole', named('refused'));
    const next = thread.ask('standing', named('next'));
    await expect(refused).rejects.toBeInstanceOf(PanelRefused);
    await expect(refused).rejects.toMatchObject({ errors: [{ path: 'candidates', message: 'too many' }] });
    expect(await next).toEqual({ method: 'next', standing: [2] });
  });

  it.each([
    ['throws', 'out of memory'],
    ['ends', 'the thread that assessed the panel ended'],
  ])('that breaks (%s) fails the question it was at, and another takes the rest', async (name, reason) => {
    const thread = makeThread();
    const broken = thread.ask('standing', named(name));
    const waiting = thread.ask('standing', named('waiting'));
    await expect(broken).rejects.toThrow(reason);
    expect(await waiting).toEqual({ method: 'waiting', standing: [1] });
    expect(await thread.ask('standing', named('later'))).toEqual({ method: 'later', standing: [2] });
    expect(started).toBe(2);
  });

  it('that is closed leaves nobody waiting and takes no more', async () => {
    const thread = makeThread();
    const stuck = thread.ask('standing', named('stays'));
    const behind = thread.ask('standing', named('behind'));
    const told = Promise.allSettled([stuck, behind]);
    await thread.close();
    expect((await told).map(({ status }) => status)).toEqual(['rejected', 'rejected']);
    await expect(thread.ask('standing', named('late'))).rejects.toThrow('closing');
    expect(started).toBe(1);
  });

  it('that was never needed closes without having been started', async () => {
    await makeThread().close();
    expect(started).toBe(0);
  });
});
