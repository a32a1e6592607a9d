import type { Differential } from '@weighhouse/shared/contracts/differential';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { counted, listed } from '../../../lib/words';

/** Where the panel stands on one column. */
export interface StandingView {
  share: number | null;
  range: { low: number; high: number } | null;
  before: number | null;
  ticks: number[];
  own: number | null;
  sealed: boolean;
}

export function standingView(differential: Differential, column: number): StandingView {
  const { assessment, before, mine, sealed } = differential;
  if (!assessment) {
    const own = mine?.standing?.[column] ?? null;
    return { share: null, range: null, before: null, ticks: [], own, sealed };
  }
  const alone = Object.entries(assessment.own).map(([key, shares]) => ({
    key,
    share: shares[column] ?? null,
  }));
  return {
    share: assessment.standing[column] ?? null,
    range: assessment.range[column] ?? null,
    before: before?.[column] ?? null,
    ticks: alone.flatMap(({ key, share }) => (key === mine?.key || share === null ? [] : [share])),
    own: alone.find(({ key }) => key === mine?.key)?.share ?? null,
    sealed: false,
  };
}

const number = (share: number) => String(naturalFrequency(share).outOf100);

/** The standing of a column as sentences, for whoever does not see the marks. */
export function standingSentence(view: StandingView): string {
  const parts: string[] = [];
  if (view.sealed) parts.push('Sealed until the chair unseals the round');
  else if (view.share === null) parts.push('Nothing judged yet');
  if (view.range) parts.push(`Range ${number(view.range.low)} to ${number(view.range.high)}`);
  if (view.before !== null) parts.push(`Before this round ${number(view.before)}`);
  if (view.own !== null) parts.push(`You alone ${naturalFrequency(view.own).words}`);
  return parts.length === 0 ? '' : `${parts.join('. ')}.`;
}

/** Whose numbers stand there, under the title of the standing row. */
export function standingLines(differential: Differential): string[] {
  const { assessment, sealed, shownRound, mine, round } = differential;
  if (!assessment) {
    if (sealed)
      return ['Sealed until the chair unseals the round.', ...(mine ? ['Diamond: you alone.'] : [])];
    return ['Nothing judged yet.'];
  }
  const people = Object.keys(assessment.own).length;
  const lines = [`Pooled from ${counted(people, 'contributor')}.`];
  if (differential.settings.coexistence > 0)
    lines.push('Each has its own share: a patient may have several, so they need not sum to 100.');
  if (shownRound && sealed)
    lines.push(
      `As round ${String(shownRound.number)} left it: round ${String(round?.number ?? 0)} is sealed.`,
    );
  if (shownRound && shownRound.notIn.length > 0) lines.push(`Not in: ${listed(shownRound.notIn)}.`);
  return lines;
}
