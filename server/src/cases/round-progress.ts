import type { RoundProgress } from '@weighhouse/shared/contracts/rounds';
import type { CaseFile } from './case-file.entity.js';
import type { TeamEntry } from './team-reader.js';

type RoundColumns = Pick<CaseFile, 'roundNumber' | 'roundKind' | 'roundOpen' | 'roundHandedIn'>;

/** The open or last round in figures that tell nobody's number; null before the first. */
export function roundProgress(file: RoundColumns, team: readonly TeamEntry[]): RoundProgress | null {
  if (file.roundNumber === null || file.roundKind === null) return null;
  return {
    number: file.roundNumber,
    kind: file.roundKind,
    open: file.roundOpen,
    handedIn: file.roundHandedIn,
    contributors: team.filter((entry) => entry.part === 'contributor').length,
  };
}
