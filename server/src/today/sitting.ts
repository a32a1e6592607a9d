import type { CaseState } from '@weighhouse/shared/contracts/cases';
import type { Today } from '@weighhouse/shared/contracts/today';
import type { TeamEntry } from '../cases/team-reader.js';
import { type CaseFile, isSealed, type OwnCase, seesCase } from './own-case.js';
import { roundWords } from './round-words.js';
import { dayIn, questionOf } from './today-item.js';

const underWay: readonly CaseState[] = ['submitted', 'returned', 'accepted', 'judging'];
const closed: readonly CaseState[] = ['concluded', 'outcomeKnown'];

/** The cases that a person sits on and that are under way. A part as liaison opens none. */
export const sitsOn = (own: readonly OwnCase[]): CaseFile[] =>
  own.filter((one) => seesCase(one) && underWay.includes(one.file.state)).map(({ file }) => file);

/** Where each stands; while a sealed round is open nobody is shown a leader. */
export function sitting(files: readonly CaseFile[], teams: ReadonlyMap<string, TeamEntry[]>): Today['cases'] {
  return files.map((file) => ({
    id: file.id,
    number: file.number,
    question: questionOf(file),
    detail: roundWords(file, teams.get(file.id) ?? []),
    leader: leaderOf(file),
    conferenceAt: file.conferenceAt?.toISOString() ?? null,
  }));
}

function leaderOf(file: CaseFile): Today['cases'][number]['leader'] {
  if (isSealed(file)) return 'sealed';
  const { leaderName: name, leaderShare: share } = file;
  return name === null || share === null ? null : { name, share };
}

/** The next date on one's cases, with every case that has it. */
export function nextConference(files: readonly CaseFile[], now: Date): Today['nextConference'] {
  const coming = files.flatMap(({ conferenceAt }) =>
    conferenceAt !== null && conferenceAt.getTime() > now.getTime() ? [conferenceAt.getTime()] : [],
  );
  if (coming.length === 0) return null;
  const at = Math.min(...coming);
  const cases = files
    .filter(({ conferenceAt }) => conferenceAt?.getTime() === at)
    .map((file) => ({ id: file.id, number: file.number, detail: questionOf(file) }));
  return { at: new Date(at).toISOString(), cases };
}

/** How many of one's cases were closed in this calendar month. */
export function closedThisMonth(own: readonly OwnCase[], now: Date, timeZone: string): number {
  const month = (moment: Date): string => dayIn(moment, timeZone).slice(0, 7);
  return own.filter(
    (one) =>
      seesCase(one) &&
      closed.includes(one.file.state) &&
      one.file.concludedAt !== null &&
      month(one.file.concludedAt) === month(now),
  ).length;
}
