import { describe, expect, it } from 'vitest';
import { checkContact, type ContactDraft, emptyContact } from './contact-draft';

const now = '2026-12-10T15:00:00.000Z';
const fromField = (text: string) => (text === '' ? null : `${text}:00.000Z`);
const check = (change: Partial<ContactDraft>, telling = false) =>
  checkContact({ ...emptyContact, ...change }, telling, now, fromField);
const paths = (change: Partial<ContactDraft>, telling = false) =>
  check(change, telling).faults.map((fault) => fault.path);

describe('checkContact', () => {
  it('names every part that is missing at once', () => {
    expect(paths({})).toEqual(['at', 'how', 'reached']);
    expect(paths({}, true)).toEqual(['at', 'how', 'understood']);
  });

  it('takes an attempt that reached nobody, without what only a talk can tell', () => {
    const { contact, faults } = check({
      at: '2026-12-10T14:00',
      how: 'telephone',
      reached: 'no',
      understood: 'yes',
      questions: 'left over from before',
      notes: 'No answer',
    });
    expect(faults).toEqual([]);
    expect(contact).toEqual({
      at: '2026-12-10T14:00:00.000Z',
      how: 'telephone',
      reached: false,
      understood: null,
      questions: '',
      notes: 'No answer',
    });
  });

  it('asks how far it was understood whenever the patient was reached', () => {
    expect(paths({ at: '2026-12-10T14:00', how: 'video', reached: 'yes' })).toEqual(['understood']);
    expect(check({ at: '2026-12-10T14:00', how: 'video', understood: 'partly' }, true).contact).toMatchObject(
      {
        reached: true,
        understood: 'partly',
      },
    );
  });

  it('refuses a moment that has not been yet', () => {
    expect(paths({ at: '2026-12-10T15:01', how: 'letter', reached: 'no' })).toEqual(['at']);
    expect(paths({ at: '2026-12-10T15:00', how: 'letter', reached: 'no' })).toEqual([]);
  });

  it('passes on what the contract refuses', () => {
    const long = 'x'.repeat(4001);
    expect(paths({ at: '2026-12-10T14:00', how: 'letter', reached: 'no', notes: long })).toEqual(['notes']);
  });
});
