import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { forgetAll, keep, keepFor, kept } from './kept';

/** A browser's storage: what is kept are own properties of it, as Object.keys() finds them. */
function storage(): Storage {
  const methods = {
    getItem: (key: string) => (Object.hasOwn(held, key) ? (held[key] ?? null) : null),
    setItem: (key: string, value: string) => void (held[key] = value),
    removeItem: (key: string) => void Reflect.deleteProperty(held, key),
  };
  const held = Object.create(methods) as Record<string, string>;
  return held as unknown as Storage;
}

beforeEach(() => {
  vi.stubGlobal('localStorage', storage());
  vi.stubGlobal('sessionStorage', storage());
});
afterEach(() => {
  vi.unstubAllGlobals();
});

describe('what the server has not acknowledged yet', () => {
  it('is found again by the same person, after signing in again too', () => {
    keepFor('ann');
    keep('new-referral', 'Which illness?');
    keepFor('ann');
    expect(kept('new-referral')).toBe('Which illness?');
  });

  it('is gone when somebody else signs in at the same computer, and so is a trial of theirs', () => {
    keepFor('ann');
    keep('new-referral', 'Which illness?');
    keep('draft.ann.case.prior', { cells: ['37.3'] });
    sessionStorage.setItem('weighhouse.reading.ann.case', '{"trial":[37.3]}');
    localStorage.setItem('weighhouse.theme', 'dark');
    keepFor('ben');
    expect(Object.keys(localStorage).sort()).toEqual(['weighhouse.keptFor', 'weighhouse.theme']);
    expect(Object.keys(sessionStorage)).toEqual([]);
  });

  it('is all gone at signing out', () => {
    keepFor('ann');
    keep('a', 1);
    sessionStorage.setItem('weighhouse.reading.ann.case', '{}');
    forgetAll();
    expect([kept('a'), ...Object.keys(sessionStorage)]).toEqual([null]);
  });

  it('does not stand in the way where a browser keeps nothing', () => {
    const refuse = () => {
      throw new Error('denied');
    };
    vi.stubGlobal('localStorage', { getItem: refuse, setItem: refuse, removeItem: refuse });
    expect(() => {
      keepFor('ann');
      keep('a', 1);
    }).not.toThrow();
    expect(kept('a')).toBeNull();
  });
});
