import type { Differential } from '@weighhouse/shared/contracts/differential';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';

/** One cell of the first row: the starting share of a candidate, before any finding. */
export interface PriorView {
  share: number | null;
  /** The share is one's own alone. */
  ownShare: boolean;
  ticks: number[];
  own: number | null;
  sealed: boolean;
}

export function priorView(differential: Differential, column: number): PriorView {
  const { assessment, mine, others, sealed } = differential;
  const own = mine?.prior && mine.priorInForce ? (mine.prior.outOf100[column] ?? null) : null;
  const ownShare = own === null ? null : own / 100;
  if (!assessment) return { share: ownShare, ownShare: ownShare !== null, ticks: [], own: null, sealed };
  const ticks = (others ?? []).flatMap((other) => {
    const given = other.prior && other.priorInForce ? other.prior.outOf100[column] : undefined;
    return given === undefined ? [] : [given / 100];
  });
  const share = assessment.priorGiven ? (assessment.pooledPrior[column] ?? null) : null;
  // What one gave meanwhile for an open sealed round is not what this earlier pool holds.
  return { share, ownShare: false, ticks, own: sealed ? null : ownShare, sealed: false };
}

export function priorSentence(view: PriorView): string {
  const words = view.share === null ? null : naturalFrequency(view.share).words;
  if (view.sealed)
    return `${words === null ? 'No share of yours.' : `You: ${words}.`} The others are sealed.`;
  if (words === null) return 'No share given yet.';
  const own = view.own === null ? '' : ` You: ${naturalFrequency(view.own).words}.`;
  return `${view.ownShare ? 'You: ' : ''}${words}.${own}`;
}
