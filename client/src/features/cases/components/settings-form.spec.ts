import { describe, expect, it } from 'vitest';
import { formatIn } from '../../../lib/format';
import { changedSettings, parseTempering, typedSettings } from './settings-form';

const format = formatIn('UTC');
const known = { tempering: 0.6, quorum: 3, conferenceAt: '2026-12-10T14:00:30.000Z' };
const typed = { ...typedSettings(known, format), reason: 'More people joined' };

describe('the settings of a case', () => {
  it('sends only what changed', () => {
    expect(changedSettings(typed, known, format)).toEqual({
      change: { reason: 'More people joined' },
      faults: [],
    });
    expect(changedSettings({ ...typed, quorum: '4', tempering: '80' }, known, format).change).toEqual({
      reason: 'More people joined',
      quorum: 4,
      tempering: 0.8,
    });
    expect(
      changedSettings({ ...typed, conference: { choice: 'notYet', at: '' } }, known, format).change
        .conferenceAt,
    ).toBeNull();
  });

  it('names everything that is wrong at once', () => {
    const wrong = {
      tempering: '29',
      quorum: '1',
      conference: { choice: 'date' as const, at: '' },
      reason: ' ',
    };
    expect(changedSettings(wrong, known, format).faults.map(({ path }) => path)).toEqual([
      'tempering',
      'quorum',
      'conferenceAt',
      'reason',
    ]);
  });

  it.each([
    ['30', 0.3],
    ['100', 1],
    ['101', null],
    ['6', null],
    ['0.6', null],
    ['', null],
  ])('reads the tempering %s as %s', (text, share) => {
    expect(parseTempering(text)).toBe(share);
  });
});
