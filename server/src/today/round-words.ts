import { roundProgress } from '../cases/round-progress.js';
import type { TeamEntry } from '../cases/team-reader.js';
import type { CaseFile } from './own-case.js';

type Columns = Pick<CaseFile, 'roundNumber' | 'roundKind' | 'roundOpen' | 'roundHandedIn' | 'state'>;

/** How far a case is, in words that tell nobody's number. */
export function roundWords(file: Columns, team: readonly TeamEntry[]): string {
  if (file.state === 'submitted') return 'Submitted, no chair yet';
  if (file.state === 'returned') return 'Returned to the referrer with a question';
  const progress = roundProgress(file, team);
  if (!progress) return 'Accepted, no round yet';
  const { number, kind, open, handedIn, contributors } = progress;
  const round = `round ${String(number)}`;
  if (!open) return `${round} is over`;
  return `${round} is ${kind}, ${String(handedIn)} of ${String(contributors)} are in`;
}
