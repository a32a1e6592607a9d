import { describe, expect, it, vi } from 'vitest';
import { UploadQueue } from './upload-queue';

const file = (name: string) => new File(['x'], name);

/** A sender whose answers the test gives. */
function sender() {
  const open: {
    name: string;
    signal: AbortSignal;
    progress: (share: number) => void;
    done: () => void;
    fail: (error: unknown) => void;
  }[] = [];
  const send = (sent: File, progress: (share: number) => void, signal: AbortSignal) =>
    new Promise<void>((resolve, reject) => {
      open.push({ name: sent.name, signal, progress, done: resolve, fail: reject });
      signal.addEventListener('abort', () => {
        reject(new DOMException('cancelled', 'AbortError'));
      });
    });
  return { open, send };
}

function begin(check: (one: File) => string | null = () => null) {
  const { open, send } = sender();
  const onDone = vi.fn();
  const queue = new UploadQueue({
    send,
    check,
    faultOf: () => ({ fault: 'failed because', retry: true }),
    onDone,
  });
  return { open, onDone, queue };
}

const settle = () => new Promise((resolve) => setTimeout(resolve));

describe('UploadQueue', () => {
  it('sends two at a time and the next when one is done', async () => {
    const { open, onDone, queue } = begin();
    queue.add([file('a'), file('b'), file('c')]);
    expect(open.map(({ name }) => name)).toEqual(['a', 'b']);
    open[0]?.progress(0.5);
    expect(queue.uploads().map(({ state, sent }) => [state, sent])).toEqual([
      ['sending', 0.5],
      ['sending', 0],
      ['waiting', 0],
    ]);
    open[0]?.done();
    await settle();
    expect(open.map(({ name }) => name)).toEqual(['a', 'b', 'c']);
    expect(onDone).toHaveBeenCalledTimes(1);
    expect(queue.uploads().map((upload) => upload.file.name)).toEqual(['b', 'c']);
  });

  it('stops a cancelled file and goes on with the next', async () => {
    const { open, queue } = begin();
    queue.add([file('a'), file('b'), file('c')]);
    queue.cancel(queue.uploads()[0]?.id ?? 0);
    await settle();
    expect(open[0]?.signal.aborted).toBe(true);
    expect(queue.uploads().map((upload) => [upload.file.name, upload.state])).toEqual([
      ['b', 'sending'],
      ['c', 'sending'],
    ]);
  });

  it('keeps a failed file with its reason and sends it again when asked', async () => {
    const { open, queue } = begin();
    queue.add([file('a')]);
    open[0]?.fail(new Error('no'));
    await settle();
    const [failed] = queue.uploads();
    expect(failed).toMatchObject({ state: 'failed', fault: 'failed because', retry: true });
    queue.retry(failed?.id ?? 0);
    expect(open).toHaveLength(2);
    expect(queue.uploads()[0]).toMatchObject({ state: 'sending', fault: null });
  });

  it('sends nothing that is wrong from the start', () => {
    const { open, queue } = begin((one) => (one.name === 'bad' ? 'too large' : null));
    queue.add([file('bad'), file('good')]);
    expect(open.map(({ name }) => name)).toEqual(['good']);
    expect(queue.uploads()[0]).toMatchObject({ state: 'failed', fault: 'too large', retry: false });
  });
});
