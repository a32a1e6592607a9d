import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { listed } from '../../../lib/words';
import type { Column } from '../model/columns';

type Parts = Pick<AssessmentView, 'sets' | 'explains' | 'exact' | 'leftOut'>;

export interface SetSentence {
  members: readonly number[];
  /** "Adult-onset Still's disease alone", "Lymphoma and tuberculosis together", "None of these". */
  who: string;
  /** "61 of 100 like this" */
  howMany: string;
  share: number;
}

/** The most likely sets of candidates, each in words. */
export function setSentences({ sets }: Pick<Parts, 'sets'>, columns: readonly Column[]): SetSentence[] {
  return sets.map(({ members, p }) => ({
    members,
    who: setName(members, columns),
    howMany: `${naturalFrequency(p).words} like this`,
    share: p,
  }));
}

function setName(members: readonly number[], columns: readonly Column[]): string {
  const [first, ...others] = members.map((index) => columns[index]?.name ?? 'a candidate');
  if (first === undefined) return 'None of these';
  return others.length === 0 ? `${first} alone` : `${listed([first, ...others])} together`;
}

/** What is not among the sets that are listed: "Every other combination: 3 of 100 like this". */
export function restSentence({ sets }: Pick<Parts, 'sets'>): string | null {
  const rest = 1 - sets.reduce((sum, { p }) => sum + p, 0);
  return rest < 1e-9 ? null : `Every other combination: ${naturalFrequency(rest).words} like this.`;
}

/**
 * How one candidate makes another less needed, in words that need no term: "If Still's disease is there, lymphoma is
 * needed less: 24 falls to 11 of 100". What no whole number shows is not said.
 */
export function explainSentences(
  { explains }: Pick<Parts, 'explains'>,
  columns: readonly Column[],
): string[] {
  return explains.flatMap(({ if: given, then, from, to }) => {
    const [was, is] = [from, to].map((share) => String(naturalFrequency(share).outOf100));
    const there = columns[given]?.short;
    const less = columns[then]?.short;
    if (was === undefined || is === undefined || there === undefined || less === undefined || was === is)
      return [];
    return [`If ${there} is there, ${less} is needed less: ${was} falls to ${is} of 100.`];
  });
}

/** What was not counted where there are too many combinations to count all; null where all are. */
export function leftOutSentence({ exact, leftOut }: Pick<Parts, 'exact' | 'leftOut'>): string | null {
  if (exact) return null;
  const share =
    leftOut === null
      ? 'how much they would weigh before any finding cannot be said'
      : `before any finding they weigh ${naturalFrequency(leftOut).words}`;
  return `With so many candidates not every combination is counted. The largest ones are left out: ${share}.`;
}
