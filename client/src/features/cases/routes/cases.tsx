import '../components/cases.css';
import { Button } from '@radix-ui/themes';
import { useCallback } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { Pager } from '../../../components/pager';
import { SkeletonRows } from '../../../components/skeleton';
import { counted } from '../../../lib/words';
import { useSignedIn } from '../../people/api/get-me';
import { useCases } from '../api/list-cases';
import { CaseFilter } from '../components/case-filter';
import { nextSort, queryOf, searchOf } from '../components/case-query';
import { CaseTable } from '../components/case-table';

/** The cases that this person may open; the address bar holds what is shown. */
export default function CasesPage() {
  const [search, setSearch] = useSearchParams();
  const query = queryOf(search);
  const found = useCases(query);
  const refers = useSignedIn().roles.includes('referrer');
  const change = useCallback(
    (changed: Record<string, string>) => {
      setSearch(
        (before) =>
          searchOf(queryOf(new URLSearchParams({ ...Object.fromEntries(before), page: '1', ...changed }))),
        {
          replace: 'q' in changed,
        },
      );
    },
    [setSearch],
  );
  const narrowed = query.q !== undefined || query.state !== undefined;
  const total = found.data?.total;
  return (
    <div className="page cases-page">
      <PageTitle
        actions={
          refers && (
            <Button asChild>
              <Link to="/cases/new">New referral</Link>
            </Button>
          )
        }
      >
        {total === undefined
          ? 'Cases'
          : narrowed
            ? `${counted(total, 'case')} of yours ${total === 1 ? 'fits' : 'fit'}`
            : `${counted(total, 'case')} ${total === 1 ? 'is' : 'are'} open to you`}
      </PageTitle>
      <CaseFilter query={query} onChange={change} />
      {found.data ? (
        found.data.items.length > 0 ? (
          <>
            <CaseTable
              items={found.data.items}
              sort={query.sort}
              onSort={(column) => {
                change({ sort: nextSort(query.sort, column) });
              }}
            />
            <Pager
              page={query.page}
              size={query.size}
              total={found.data.total}
              onPage={(page) => {
                change({ page: String(page) });
              }}
            />
          </>
        ) : (
          <Nothing narrowed={narrowed} refers={refers} />
        )
      ) : found.isPending ? (
        <SkeletonRows rows={8} />
      ) : (
        <Failure
          error={found.error}
          what="The cases could not be loaded."
          retry={() => void found.refetch()}
        />
      )}
    </div>
  );
}

function Nothing({ narrowed, refers }: { narrowed: boolean; refers: boolean }) {
  if (narrowed)
    return (
      <EmptyState
        title="No case fits the search and the state."
        action={<Link to="/cases">Show all cases</Link>}
      >
        Search by the case’s number or by words of its question.
      </EmptyState>
    );
  return (
    <EmptyState
      title="No case is open to you yet."
      action={refers && <Link to="/cases/new">Write a referral</Link>}
    >
      {refers
        ? 'A case begins with a referral: one question about one patient.'
        : 'A case stands here as soon as a chair puts you on its team.'}
    </EmptyState>
  );
}
