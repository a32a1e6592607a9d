import type { Differential } from '@weighhouse/shared/contracts/differential';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { SealedMark } from '../../../components/sealed-mark';

interface Props {
  differential: Differential;
  /** How many findings are not known yet. */
  pending: number;
}

/** Why there is no ranking: sealed, nothing pending, or nothing judged. */
export function NothingToRank({ differential, pending }: Props) {
  const { abilities, assessment, caseId, sealed } = differential;
  const ledger = `/cases/${caseId}/differential`;
  if (sealed && !assessment)
    return (
      <Frame title="The round is sealed, so no test is ranked">
        <SealedMark /> What a test would settle depends on where the panel stands. While the round is sealed
        that is worked out for nobody. It appears here when the chair unseals the round.
      </Frame>
    );
  if (pending === 0)
    return (
      <Frame
        title="Nothing is waiting to be found out"
        action={
          abilities.includes('finding.add') ? (
            <Link to={`${ledger}?finding=new`}>Add a finding that is not known yet</Link>
          ) : null
        }
      >
        A test that could be done stands here once it is added as a finding with the state “not known yet”,
        with its cost, wait and burden.
      </Frame>
    );
  return (
    <Frame title="No test can be ranked yet">
      {assessment
        ? 'A test is ranked once somebody has judged how often each candidate would show each result.'
        : 'Nothing is judged yet. The ranking begins with the first unsealed judgements.'}
    </Frame>
  );
}

function Frame({
  title,
  children,
  action,
}: {
  title: string;
  children: React.ReactNode;
  action?: React.ReactNode;
}) {
  return (
    <>
      <h2 id="next-test-title" className="aside-text">
        Next test
      </h2>
      <EmptyState title={title} action={action}>
        {children}
      </EmptyState>
    </>
  );
}
