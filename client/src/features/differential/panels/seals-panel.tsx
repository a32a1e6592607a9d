import { Button } from '@radix-ui/themes';
import type { Seal } from '@weighhouse/shared/contracts/rounds';
import { useState } from 'react';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { useFormat } from '../../../lib/use-format';
import { counted } from '../../../lib/words';
import { useSeals } from '../api/list-seals';
import { useLedger } from '../ledger/ledger-context';
import { type CheckedSeal, checkSeals } from '../seals/check-seals';
import { readSeen } from '../seals/seen-digests';
import { Digest } from './round-panel';
import { SideHeading } from './side-panel';

/** Recomputes every seal of the case in this browser. */
export function SealsPanel() {
  const { differential } = useLedger();
  const seals = useSeals(differential.caseId);
  return (
    <>
      <SideHeading>Verify seals</SideHeading>
      <p className="side-about">
        A seal is the SHA-256 digest of 32 random bytes and the judgement as it was handed in. The digest was
        shown at hand-in, the bytes at unsealing; this browser computes the digest again and compares.
      </p>
      {seals.data && <Checked seals={seals.data.items} />}
      {seals.isPending && <SkeletonText lines={4} />}
      {seals.error && !seals.data && (
        <Failure
          error={seals.error}
          what="The seals could not be loaded."
          retry={() => void seals.refetch()}
        />
      )}
    </>
  );
}

function Checked({ seals }: { seals: Seal[] }) {
  const [checked, setChecked] = useState<CheckedSeal[] | null>(null);
  if (seals.length === 0) return <p className="soft">Nobody has handed in yet, so there is no seal.</p>;
  const verify = async () => {
    setChecked(await checkSeals(seals, readSeen()));
  };
  return (
    <>
      <Button onClick={() => void verify()}>Verify {counted(seals.length, 'seal')} now</Button>
      <p className="seal-result" role="status">
        {checked && resultWords(checked)}
      </p>
      <ul className="members">
        {(checked ?? seals.map((seal) => ({ seal, verdict: null, seen: null }))).map(
          ({ seal, verdict, seen }) => (
            <SealLine key={seal.roundId + seal.person.id} seal={seal} verdict={verdict} seen={seen} />
          ),
        )}
      </ul>
    </>
  );
}

function resultWords(checked: CheckedSeal[]): string {
  const bad = checked.filter(({ verdict, seen }) => verdict === 'broken' || seen === 'other').length;
  const open = checked.filter(({ verdict }) => verdict === 'closed').length;
  const held = checked.length - bad - open;
  const parts: string[] = [];
  if (bad > 0) parts.push(counted(bad, 'seal does not hold', 'seals do not hold'));
  if (held > 0) parts.push(counted(held, 'seal holds', 'seals hold'));
  if (open > 0) parts.push(counted(open, 'seal is still closed', 'seals are still closed'));
  return `${parts.join(', ')}.`;
}

type LineProps = { seal: Seal; verdict: CheckedSeal['verdict'] | null; seen: CheckedSeal['seen'] | null };

function SealLine({ seal, verdict, seen }: LineProps) {
  const format = useFormat();
  return (
    <li>
      <span>
        {seal.person.name}, round {seal.roundNumber}
      </span>
      <span className="small soft">handed in {format.moment(seal.handedInAt)}</span>
      {verdict !== null && (
        <span className={verdict === 'broken' || seen === 'other' ? 'late small' : 'small'}>
          {verdictWords[verdict]}
          {seen !== null && ` ${seenWords[seen]}`}
        </span>
      )}
      <Digest digest={seal.digest} />
    </li>
  );
}

const verdictWords = {
  holds: 'The seal holds: the judgement is the one that was handed in.',
  broken: 'The seal does not hold: the judgement is not the one that was sealed.',
  closed: 'Still sealed: there is nothing to recompute before the unsealing.',
};
const seenWords = {
  same: 'This browser saw the same digest at hand-in.',
  other: 'This browser saw another digest at hand-in.',
  never: 'This browser did not see the digest at hand-in.',
};
