import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Format } from '../../../lib/format';
import type { ConferenceTyped } from './conference-field';

export function typedConference(at: string | null, format: Format): ConferenceTyped {
  return at === null ? { choice: 'notYet', at: '' } : { choice: 'date', at: format.toField(at) };
}

/** The date as the server takes it, null for "not yet", or what is wrong with it. */
export function readConference(
  typed: ConferenceTyped,
  format: Format,
): { at: string | null } | { fault: FieldFault } {
  const fault = (message: string) => ({ fault: { path: 'conferenceAt', message } });
  if (typed.choice === '') return fault('must be a date, or no date yet');
  if (typed.choice === 'notYet') return { at: null };
  const at = format.fromField(typed.at);
  return at === null ? fault('must be a date and a time') : { at };
}

/** A quorum as it is typed; null when it is not a whole number from 2 to 25. */
export function parseQuorum(typed: string): number | null {
  const quorum = /^\d{1,2}$/.test(typed.trim()) ? Number(typed) : 0;
  return quorum >= 2 && quorum <= 25 ? quorum : null;
}
