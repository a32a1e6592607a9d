import { describe, expect, it } from 'vitest';
import { formatIn } from '../../../lib/format';
import { parseQuorum, readConference, typedConference } from './conference-typed';

const format = formatIn('Europe/Helsinki');

describe('the date of the conference', () => {
  it('is a choice that has to be made', () => {
    expect(readConference({ choice: '', at: '' }, format)).toHaveProperty('fault.path', 'conferenceAt');
    expect(readConference({ choice: 'notYet', at: '2026-12-10T14:00' }, format)).toEqual({ at: null });
    expect(readConference({ choice: 'date', at: '' }, format)).toHaveProperty('fault.message');
  });

  it('is typed on the person’s own clock', () => {
    const typed = typedConference('2026-12-10T12:00:00.000Z', format);
    expect(typed).toEqual({ choice: 'date', at: '2026-12-10T14:00' });
    expect(readConference(typed, format)).toEqual({ at: '2026-12-10T12:00:00.000Z' });
  });
});

describe('parseQuorum', () => {
  it.each([
    ['3', 3],
    ['25', 25],
    ['1', null],
    ['26', null],
    ['2.5', null],
    ['', null],
  ])('reads %s as %s', (typed, quorum) => {
    expect(parseQuorum(typed)).toBe(quorum);
  });
});
