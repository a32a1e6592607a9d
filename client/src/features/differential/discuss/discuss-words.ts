import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { shownWords } from '../model/cell-words';
import { type Column, columnLabel } from '../model/columns';
import { isTwoLevel } from '../model/finding-words';
import type { DiscussRow } from './discuss-rows';

const number = (share: number) => String(naturalFrequency(share).outOf100);

/** "Dr A: 8, Dr B: 35 of 100 would show this, on C Endocarditis." */
export function apartSentence({ finding, apart }: DiscussRow, columns: readonly Column[]): string | null {
  const column = apart && columns[apart.column];
  if (!apart || !column) return null;
  if (Math.abs(apart.high.p - apart.low.p) < 0.005)
    return `All say ${naturalFrequency(apart.low.p).words}, or nearly so.`;
  const level = finding.observed ?? (isTwoLevel(finding) ? 1 : null);
  // The gap of two levels is told in how many would show it, whatever was observed.
  const shown = level === null ? '' : ` ${shownWords(finding, isTwoLevel(finding) ? 1 : level)}`;
  return `${apart.low.name}: ${number(apart.low.p)}, ${apart.high.name}: ${number(apart.high.p)} of 100${shown}, on ${columnLabel(column)}.`;
}

/** What hangs on it: "Taking one person’s numbers moves A Still’s disease by up to 9 of 100." */
export function swingSentence(
  { swing, finding }: Pick<DiscussRow, 'swing' | 'finding'>,
  leader: Column,
): string | null {
  if (swing === null) return null;
  if (finding.observed === null) return 'Not known yet, so nothing hangs on it now.';
  const name = leader.none ? 'none of these' : columnLabel(leader);
  return swing < 0.005
    ? `Whose numbers are taken hardly moves ${name}.`
    : `Taking one person’s numbers instead of the pool moves ${name} by up to ${number(swing)} of 100.`;
}
