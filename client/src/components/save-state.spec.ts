import { describe, expect, it } from 'vitest';
import { saveWords } from './save-state';

const time = () => '14:02';

describe('saveWords', () => {
  it('says where the text is', () => {
    expect(saveWords({ state: 'saved', at: '2026-12-01T12:02:00Z' }, time)).toBe('Saved 14:02');
    expect(saveWords({ state: 'failed', offline: true }, time)).toBe('Not saved: offline, kept here');
    expect(saveWords({ state: 'failed', offline: false }, time)).toBe('Not saved, kept here');
    expect(saveWords({ state: 'clean' }, time)).toBe('');
  });
});
