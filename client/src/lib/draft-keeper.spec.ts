import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiError } from './api';
import { DraftKeeper, type DraftKind, type Stored } from './draft-keeper';

const browser = new Map<string, string>();
const keptText = () => browser.get('weighhouse.kept.note');

/** A server that holds one text and can be told to fail. */
class Server {
  stored: Stored<string> = { version: 3, value: 'server' };
  failing: ApiError | null = null;
  saves: string[] = [];
  beforeAnswer: () => void = () => undefined;

  kind(): DraftKind<string> {
    return {
      keptKey: 'note',
      readKept: (left) => (left as Stored<string> | null) ?? null,
      same: (one, other) => one.trim() === other.trim(),
      readTheirs: (error) => error.current as Stored<string>,
      save: async (value, version) => {
        await Promise.resolve();
        this.saves.push(value);
        this.beforeAnswer();
        if (this.failing) throw this.failing;
        if (version !== this.stored.version)
          throw new ApiError('stale', 'changed', { status: 409, current: this.stored });
        this.stored = { version: version + 1, value };
        return this.stored;
      },
    };
  }
}

const offline = new ApiError('offline', 'no network', { status: 0 });

describe('DraftKeeper', () => {
  beforeEach(() => {
    browser.clear();
    vi.useFakeTimers();
    vi.stubGlobal('localStorage', {
      getItem: (key: string) => browser.get(key) ?? null,
      setItem: (key: string, text: string) => browser.set(key, text),
      removeItem: (key: string) => browser.delete(key),
    });
    vi.stubGlobal('addEventListener', () => undefined);
    vi.stubGlobal('removeEventListener', () => undefined);
  });
  afterEach(() => {
    vi.useRealTimers();
    vi.unstubAllGlobals();
  });

  it('saves once after the typing stopped and then keeps nothing in the browser', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    keeper.start();
    for (const text of ['a', 'ab', 'abc']) keeper.change(text);
    expect(keptText()).toContain('abc');
    await vi.advanceTimersByTimeAsync(1000);
    expect(server.saves).toEqual(['abc']);
    expect(keeper.read()).toMatchObject({ version: 4, saving: { state: 'saved' } });
    expect(keptText()).toBeUndefined();
  });

  it('sends what was typed during a save with the version of that save', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    keeper.change('first');
    server.beforeAnswer = () => {
      if (server.saves.length === 1) keeper.change('first and second');
    };
    await vi.advanceTimersByTimeAsync(3000);
    expect(server.saves).toEqual(['first', 'first and second']);
    expect(server.stored).toEqual({ version: 5, value: 'first and second' });
  });

  it('keeps the text through an outage and sends it when the network is back', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    server.failing = offline;
    keeper.change('typed offline');
    expect(await keeper.flush()).toBe(false);
    expect(keeper.read().saving).toMatchObject({ state: 'failed', offline: true });
    expect(keptText()).toContain('typed offline');
    server.failing = null;
    await vi.advanceTimersByTimeAsync(11_000);
    expect(server.stored.value).toBe('typed offline');
    expect(keptText()).toBeUndefined();
  });

  it('stops at a stale version, shows both texts and saves only after the choice', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    server.stored = { version: 9, value: 'somebody else' };
    keeper.change('mine');
    expect(await keeper.flush()).toBe(false);
    expect(keeper.read()).toMatchObject({ value: 'mine', theirs: { value: 'somebody else' } });
    keeper.change('mine, longer');
    await vi.advanceTimersByTimeAsync(20_000);
    expect(server.stored.value).toBe('somebody else');
    keeper.keepMine();
    await vi.advanceTimersByTimeAsync(0);
    expect(server.stored).toEqual({ version: 10, value: 'mine, longer' });
  });

  it('takes the other text on request and forgets its own', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    server.stored = { version: 9, value: 'somebody else' };
    keeper.change('mine');
    await keeper.flush();
    keeper.takeTheirs();
    expect(keeper.read()).toMatchObject({ value: 'somebody else', version: 9, theirs: null });
    expect(keptText()).toBeUndefined();
    await vi.advanceTimersByTimeAsync(20_000);
    expect(server.saves).toEqual(['mine']);
  });

  it('takes a lost acknowledgement for what it is, not for somebody else', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    keeper.change('arrived');
    server.stored = { version: 4, value: 'arrived' };
    expect(await keeper.flush()).toBe(true);
    expect(keeper.read()).toMatchObject({ version: 4, theirs: null });
  });

  it('goes on when somebody moved the version and left the text as it was', async () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    server.stored = { version: 7, value: 'server' };
    keeper.change('mine');
    expect(await keeper.flush()).toBe(true);
    expect(server.stored).toEqual({ version: 8, value: 'mine' });
    expect(keeper.read()).toMatchObject({ theirs: null, saving: { state: 'saved' } });
  });

  it('brings back text of a closed tab, and asks when the server moved on meanwhile', async () => {
    const server = new Server();
    browser.set('weighhouse.kept.note', JSON.stringify({ version: 3, value: 'left behind' }));
    const same = new DraftKeeper(server.kind(), server.stored);
    expect(same.read()).toMatchObject({ value: 'left behind', theirs: null });
    same.start();
    await vi.advanceTimersByTimeAsync(1000);
    expect(server.stored.value).toBe('left behind');

    browser.set('weighhouse.kept.note', JSON.stringify({ version: 3, value: 'left behind again' }));
    const moved = new DraftKeeper(server.kind(), { version: 8, value: 'newer' });
    expect(moved.read()).toMatchObject({ value: 'left behind again', theirs: { value: 'newer' } });
  });

  it('takes over what others saved, but never over unsaved text', () => {
    const server = new Server();
    const keeper = new DraftKeeper(server.kind(), server.stored);
    keeper.offer({ version: 5, value: 'newer' });
    expect(keeper.read()).toMatchObject({ value: 'newer', version: 5 });
    keeper.offer({ version: 4, value: 'a late answer' });
    expect(keeper.read().value).toBe('newer');
    keeper.change('mine');
    keeper.offer({ version: 6, value: 'newest' });
    expect(keeper.read().value).toBe('mine');
  });
});
