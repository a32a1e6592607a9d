import type { CaseListItem } from '@weighhouse/shared/contracts/cases';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { SealedMark } from './sealed-mark';

/** How far the leader of a case stands, or that nobody sees it yet. */
export function LeaderBar({
  leader,
  sealedWords = 'sealed: nobody sees the pool yet',
  quiet = false,
}: {
  leader: CaseListItem['leader'];
  sealedWords?: string;
  /** The leader's name stands beside it already, and an empty place says enough. */
  quiet?: boolean;
}) {
  if (leader === null) return quiet ? null : <span className="soft small">not judged yet</span>;
  if (leader === 'sealed') return <SealedMark>{sealedWords}</SealedMark>;
  const { percent } = naturalFrequency(leader.share);
  return (
    <span className="leader-bar">
      <span className="figures">{percent}</span>
      <span className="leader-track" aria-hidden="true">
        <span style={{ width: `${String(leader.share * 100)}%` }} />
      </span>
      {!quiet && <span className="aside-text">{leader.name}</span>}
    </span>
  );
}
