import type { Differential } from '@weighhouse/shared/contracts/differential';
import { Link } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { Failure } from '../../../components/failure';
import { SealedMark } from '../../../components/sealed-mark';
import { SkeletonText } from '../../../components/skeleton';
import { useDifferential } from '../../differential/api/get-differential';
import { StandingList } from './standing-list';

/** Where the panel stands now, beside the plan that is written from it. */
export function StandingAside({ caseId }: { caseId: string }) {
  const { data, error, refetch } = useDifferential(caseId);
  return (
    <aside className="plan-aside" aria-label="Where the panel stands">
      <h3>Where the panel stands</h3>
      {error && !data && <Failure error={error} retry={() => void refetch()} />}
      {!error && !data && <SkeletonText lines={4} />}
      {data && <Now differential={data} />}
      <p className="small">
        <Link to="../differential">Open the differential</Link>
      </p>
      <Caution />
    </aside>
  );
}

function Now({ differential }: { differential: Differential }) {
  const { assessment, sealed, round, shownRound, candidates } = differential;
  const standing = assessment?.standing;
  return (
    <>
      {sealed && (
        <p className="small soft">
          <SealedMark>{`round ${String(round?.number ?? '')} is sealed`}</SealedMark> Nobody sees its pool
          before the chair unseals it.
        </p>
      )}
      {standing && shownRound && (
        <p className="small soft">
          {sealed ? 'As it stood after' : shownRound.live ? 'Live, in' : 'After'} round {shownRound.number}.
          {shownRound.notIn.length > 0 && ` Not in: ${shownRound.notIn.join(', ')}.`}
        </p>
      )}
      {standing ? (
        <StandingList label="Where the panel stands now" standing={namedStanding(candidates, standing)} />
      ) : (
        !sealed && <p className="small soft">Nothing is pooled yet. It begins when a round is unsealed.</p>
      )}
    </>
  );
}

/** The columns by name, none of these last, as assess() answers them. */
function namedStanding(candidates: Differential['candidates'], shares: readonly number[]) {
  const names = candidates.filter((one) => !one.retired).map((one) => one.name);
  return [...names, 'None of these'].map((name, place) => ({
    name,
    share: shares[place] ?? 0,
    none: place === names.length,
  }));
}
