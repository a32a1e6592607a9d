import type { JudgementDraftInput } from '@weighhouse/shared/contracts/judgements';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { offlineError } from '../../../lib/api-error';
import { emptyDraft, withText } from '../typing/draft';
import { DraftStore, quietBeforeSending, type TypedDraft } from './draft-store';

const typed = (text: string): TypedDraft => ({
  draft: withText(emptyDraft(1), 'still', 0, 1, text),
  wire: { target: 'f1', candidateSet: 1, exposure: null, typed: [[text]], reason: '' },
});

function surroundings() {
  const sent: JudgementDraftInput[] = [];
  const memory = new Map<string, TypedDraft>();
  let offline = false;
  return {
    sent,
    memory,
    goOffline: (now: boolean) => {
      offline = now;
    },
    around: {
      send: (draft: JudgementDraftInput) => {
        if (offline) return Promise.reject(offlineError());
        sent.push(draft);
        return Promise.resolve({ ...draft, savedAt: '2026-12-01T09:00:00.000Z' });
      },
      remember: (target: string, draft: TypedDraft | null) => {
        if (draft) memory.set(target, draft);
        else memory.delete(target);
      },
      recall: (target: string) => memory.get(target) ?? null,
    },
  };
}

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

describe('the drafts', () => {
  it('go to the server once after a quiet moment, with the last text', async () => {
    const world = surroundings();
    const store = new DraftStore(world.around);
    for (const text of ['6', '65']) store.type('f1', typed(text));
    expect(store.saving('f1')).toEqual({ state: 'typing' });
    await vi.advanceTimersByTimeAsync(quietBeforeSending - 1);
    expect(world.sent).toEqual([]);
    await vi.advanceTimersByTimeAsync(1);
    expect(world.sent.map((draft) => draft.typed)).toEqual([[['65']]]);
    expect(store.saving('f1')).toEqual({ state: 'saved', at: '2026-12-01T09:00:00.000Z' });
  });

  it('stay in this browser until the server has them, through a loaded page', async () => {
    const world = surroundings();
    world.goOffline(true);
    const store = new DraftStore(world.around);
    store.type('f1', typed('65'));
    await vi.advanceTimersByTimeAsync(quietBeforeSending);
    expect(store.saving('f1')).toMatchObject({ state: 'failed', offline: true });
    expect(world.memory.has('f1')).toBe(true);

    world.goOffline(false);
    const loadedAgain = new DraftStore(world.around);
    loadedAgain.recall(['prior', 'f1']);
    expect(loadedAgain.drafts()).toEqual(new Map([['f1', typed('65').draft]]));
    await vi.advanceTimersByTimeAsync(0);
    expect(world.sent.map((draft) => draft.typed)).toEqual([[['65']]]);
    expect(world.memory.has('f1')).toBe(false);
  });

  it('try again by themselves while offline', async () => {
    const world = surroundings();
    world.goOffline(true);
    const store = new DraftStore(world.around);
    store.type('f1', typed('65'));
    await vi.advanceTimersByTimeAsync(quietBeforeSending);
    world.goOffline(false);
    await vi.advanceTimersByTimeAsync(5000);
    expect(store.saving('f1').state).toBe('saved');
  });

  it('do not come back after they were saved as a judgement', async () => {
    const world = surroundings();
    const store = new DraftStore(world.around);
    store.type('f1', typed('65'));
    await store.settle('f1');
    store.forget('f1');
    await vi.advanceTimersByTimeAsync(10_000);
    expect(world.sent).toEqual([]);
    expect(store.drafts().size).toBe(0);
    expect(world.memory.size).toBe(0);
  });

  it('do not say saved about an older text', async () => {
    const world = surroundings();
    let answer: () => void = () => undefined;
    const store = new DraftStore({
      ...world.around,
      send: (draft) =>
        new Promise((resolve) => {
          answer = () => {
            resolve({ ...draft, savedAt: '2026-12-01T09:00:00.000Z' });
          };
        }),
    });
    store.type('f1', typed('6'));
    await vi.advanceTimersByTimeAsync(quietBeforeSending);
    store.type('f1', typed('65'));
    answer();
    await vi.advanceTimersByTimeAsync(0);
    expect(store.saving('f1')).toEqual({ state: 'typing' });
    expect(world.memory.get('f1')).toEqual(typed('65'));
  });
});
