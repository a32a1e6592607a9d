import '../components/trail.css';
import type { TrailEntry } from '@weighhouse/shared/contracts/trail';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { Pager } from '../../../components/pager';
import { SkeletonRows } from '../../../components/skeleton';
import { useFormat } from '../../../lib/use-format';
import { numberWord } from '../../../lib/words';
import { useCaseId } from '../../cases/api/get-case';
import { runsOf } from '../components/trail-runs';
import { trailPageSize, useTrail } from '../api/get-trail';

/** Who did what and when on this case, as far as this person may see it. */
export default function TrailPage() {
  const [search, setSearch] = useSearchParams();
  const page = Math.max(1, Number.parseInt(search.get('page') ?? '1', 10) || 1);
  const found = useTrail(useCaseId(), page);
  return (
    <section className="page" aria-labelledby="trail">
      <div className="section-head trail-head">
        <h2 id="trail">Who did what and when</h2>
        <span className="soft small">Nothing here is ever changed or removed.</span>
      </div>
      {found.data ? (
        <>
          {found.data.items.length === 0 ? (
            <EmptyState title="Nothing stands in the trail for you yet." />
          ) : (
            <Entries items={found.data.items} />
          )}
          <Pager
            page={page}
            size={trailPageSize}
            total={found.data.total}
            onPage={(next) => {
              setSearch(next === 1 ? {} : { page: String(next) });
            }}
          />
        </>
      ) : found.isPending ? (
        <SkeletonRows rows={8} />
      ) : (
        <Failure
          error={found.error}
          what="The trail could not be loaded."
          retry={() => void found.refetch()}
        />
      )}
    </section>
  );
}

function Entries({ items }: { items: TrailEntry[] }) {
  const format = useFormat();
  return (
    <ol className="trail-list">
      {runsOf(items).map(({ entry, times, since }) => (
        <li key={entry.id}>
          <time className="figures soft" dateTime={entry.at}>
            {format.moment(entry.at)}
          </time>
          <span>
            <b>{entry.who ?? 'The service'}</b> {entry.sentence}
            {times > 1 && (
              <span className="soft">
                , {numberWord(times)} times{since === entry.at ? '' : ` since ${format.moment(since)}`}
              </span>
            )}
          </span>
        </li>
      ))}
    </ol>
  );
}
