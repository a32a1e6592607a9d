import '../components/summaries.css';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { SkeletonPage } from '../../../components/skeleton';
import { useTellList } from '../api/list-to-tell';
import { TellGroupRows } from '../components/tell-group-rows';
import { groupOf, tellGroups, tellTitle } from '../model/summary-words';

/** What waits for the liaison, ready to tell first. */
export default function Tell() {
  const { data, error, isPending, refetch } = useTellList();
  if (isPending) return <SkeletonPage />;
  if (!data)
    return (
      <div className="page">
        <Failure error={error} what="The list could not be loaded." retry={() => void refetch()} />
      </div>
    );
  const { items } = data;
  return (
    <div className="page">
      <PageTitle>{tellTitle(items)}</PageTitle>
      {items.length === 0 && (
        <EmptyState title="You are on no case yet">
          When a chair puts you on a team, the case stands here. You write its summary after the plan is
          signed.
        </EmptyState>
      )}
      {tellGroups.map(({ group, title, note }) => (
        <TellGroupRows
          key={group}
          title={title}
          note={note}
          items={items.filter((item) => groupOf(item) === group)}
          ready={group === 'ready'}
        />
      ))}
    </div>
  );
}
