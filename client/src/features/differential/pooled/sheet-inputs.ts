import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

type Contributor = PanelView['contributors'][number];

const letters = { seldom: 'r', sometimes: 's', often: 'o' } as const;

/** What somebody gave, out of 100 with the digits that it has; levels parted by strokes; a dash for a blank. */
export function givenWords(given: number | readonly number[] | null | undefined): string {
  if (given === null || given === undefined) return '–';
  if (typeof given === 'number') return String(Number((given * 100).toFixed(1)));
  return given.map(givenWords).join('/');
}

/** Everybody's numbers for one cell, in the order of the contributors. */
export const cellInputs = (contributors: readonly Contributor[], findingId: string, column: number): string =>
  contributors.map(({ likelihoods }) => givenWords(likelihoods[findingId]?.given[column])).join(' ');

export const priorInputs = (contributors: readonly Contributor[], column: number): string =>
  contributors.map(({ prior }) => givenWords(prior?.[column])).join(' ');

/** How often each contributor sees a row's picture: o often, s sometimes, r seldom, a dash where they left it blank. */
export const exposures = (contributors: readonly Contributor[], findingId: string): string =>
  contributors
    .map(({ likelihoods }) => {
      const row = likelihoods[findingId];
      return row ? letters[row.exposure] : '–';
    })
    .join(' ');

/** The pooled number of a cell as the inputs are given: P(present), or all levels. */
export function pooledWords({ pooledCells }: AssessmentView, findingId: string, column: number): string {
  const shares = pooledCells[findingId]?.[column];
  if (!shares) return '–';
  const shown = shares.length === 2 ? shares.slice(1) : shares;
  return shown.map((share) => short(naturalFrequency(share).outOf100)).join('/');
}

const short = (outOf100: number | 'under 1' | 'over 99') =>
  outOf100 === 'under 1' ? '<1' : outOf100 === 'over 99' ? '>99' : String(outOf100);
