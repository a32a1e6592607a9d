import { Failure } from '../../../components/failure';
import { SkeletonRows } from '../../../components/skeleton';
import { useCaseId } from '../../cases/api/get-case';
import { useDifferential } from '../api/get-differential';
import { NextTestScreen } from '../next-test/next-test-screen';

/** What to find out next: the pending findings by what they would settle. */
export default function NextTestRoute() {
  const found = useDifferential(useCaseId());
  if (found.data) return <NextTestScreen differential={found.data} />;
  return (
    <div className="page">
      {found.isPending ? (
        <SkeletonRows rows={6} />
      ) : (
        <Failure
          error={found.error}
          what="The next tests could not be opened."
          retry={() => void found.refetch()}
        />
      )}
    </div>
  );
}
