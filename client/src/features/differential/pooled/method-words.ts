import type { Settings } from '@weighhouse/shared/contracts/cases';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { type Column, columnLabel } from '../model/columns';

const ofHundred = (share: number) => `${String(Math.round(share * 100))} of 100`;

/** How the numbers are put together, sentence by sentence; what was set for this panel among them. */
export function methodSentences(
  { tempering, coexistence }: Pick<PanelView, 'tempering' | 'coexistence'>,
  pairs: readonly string[],
): string[] {
  return [
    'Priors and likelihoods of all contributors are averaged by weight on the scale of log odds (logarithmic opinion pool); then every finding is counted one after the other.',
    tempering < 1
      ? `Every finding counts ${ofHundred(tempering)} of its full strength (tempering), because findings in one patient overlap more than anyone can list.`
      : 'Every finding counts in full (no tempering).',
    coexistence > 0
      ? `Candidates may coexist: of 100 patients like this, ${String(Math.round(coexistence * 100))} have two or more of them at once.`
      : 'One cause is assumed: the candidates exclude each other (coexistence 0).',
    pairs.length > 0 ? `Pairs: ${pairs.join('; ')}.` : 'No pairs of candidates are noted.',
  ];
}

/** "A Still with B Lymphoma 3 times as likely: why", for the pairs whose candidates are both in force. */
export function pairWords(together: Settings['together'], columns: readonly Column[]): string[] {
  return together.flatMap(({ a, b, times, reason }) => {
    const [one, other] = [a, b].map((id) => columns.find((column) => column.id === id));
    if (!one || !other) return [];
    const likely = times === 0 ? 'never together' : `together ${String(times)} times as likely`;
    return [`${columnLabel(one)} and ${columnLabel(other)} ${likely} (${reason})`];
  });
}
