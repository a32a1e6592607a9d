import type { Case, ChangeSettings } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Format } from '../../../lib/format';
import type { ConferenceTyped } from './conference-field';
import { parseQuorum, readConference, typedConference } from './conference-typed';

/** The settings as they are typed; tempering out of 100. */
export interface SettingsTyped {
  tempering: string;
  quorum: string;
  conference: ConferenceTyped;
  reason: string;
}

type Known = Pick<Case, 'tempering' | 'quorum' | 'conferenceAt'>;

export function typedSettings(of: Known, format: Format): SettingsTyped {
  return {
    tempering: String(Math.round(of.tempering * 100)),
    quorum: String(of.quorum),
    conference: typedConference(of.conferenceAt, format),
    reason: '',
  };
}

/** Out of 100, whole, from 30 to 100; null for anything else. */
export function parseTempering(typed: string): number | null {
  if (!/^\d{2,3}$/.test(typed.trim())) return null;
  const outOf100 = Number(typed);
  return outOf100 >= 30 && outOf100 <= 100 ? outOf100 / 100 : null;
}

/** What changed, for the server, with everything that is wrong. Nothing is sent that stayed the same. */
export function changedSettings(
  typed: SettingsTyped,
  of: Known,
  format: Format,
): { change: ChangeSettings; faults: FieldFault[] } {
  const faults: FieldFault[] = [];
  const change: ChangeSettings = { reason: typed.reason.trim() };
  const tempering = parseTempering(typed.tempering);
  const quorum = parseQuorum(typed.quorum);
  const conference = readConference(typed.conference, format);
  if (tempering === null)
    faults.push({ path: 'tempering', message: 'must be a whole number from 30 to 100' });
  else if (tempering !== of.tempering) change.tempering = tempering;
  if (quorum === null) faults.push({ path: 'quorum', message: 'must be a whole number from 2 to 25' });
  else if (quorum !== of.quorum) change.quorum = quorum;
  if ('fault' in conference) faults.push(conference.fault);
  else if (!sameMoment(conference.at, of.conferenceAt)) change.conferenceAt = conference.at;
  if (change.reason === '') faults.push({ path: 'reason', message: 'must not be empty' });
  return { change, faults };
}

/** A field has no seconds, so the same minute is the same moment. */
function sameMoment(one: string | null, other: string | null): boolean {
  return (one?.slice(0, 16) ?? null) === (other?.slice(0, 16) ?? null);
}
