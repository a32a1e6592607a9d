import './reports.css';
import { lazy, Suspense } from 'react';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { SkeletonRows, SkeletonText } from '../../../components/skeleton';
import { useReports } from '../api/list-reports';
import { ReportList } from './report-list';
import { UploadArea } from './upload-area';

const Reader = lazy(() => import('./reader'));

interface Props {
  caseId: string;
  /** Reports may be added now, by this person. */
  mayAdd: boolean;
}

/** Uploading, the list, and the report that the address names (`report`, `page`), read in the page. */
export function Reports({ caseId, mayAdd }: Props) {
  const found = useReports(caseId);
  const [search, setSearch] = useSearchParams();
  const openId = search.get('report');
  const open = found.data?.items.find((report) => report.id === openId);
  const page = Math.max(1, Number.parseInt(search.get('page') ?? '1', 10) || 1);

  const show = (change: Record<string, string | null>, replace = false) => {
    setSearch(
      (before) => {
        for (const [key, value] of Object.entries(change))
          if (value === null) before.delete(key);
          else before.set(key, value);
        return before;
      },
      { replace, preventScrollReset: true },
    );
  };

  return (
    <div className={`reports${open ? ' reports-reading' : ''}`}>
      <div className="reports-side">
        {mayAdd && <UploadArea caseId={caseId} />}
        {found.data ? (
          found.data.items.length > 0 ? (
            <ReportList
              caseId={caseId}
              reports={found.data.items}
              openId={openId}
              onOpen={(report) => {
                show({ report, page: null });
              }}
            />
          ) : (
            <EmptyState title="No report is here yet.">
              {mayAdd
                ? 'Upload letters, laboratory sheets and imaging reports; they are read here beside the evidence.'
                : 'The referrer can upload reports while the case is open.'}
            </EmptyState>
          )
        ) : found.isPending ? (
          <SkeletonRows rows={3} />
        ) : (
          <Failure
            error={found.error}
            what="The reports could not be loaded."
            retry={() => void found.refetch()}
          />
        )}
      </div>
      {open && (
        <Suspense fallback={<SkeletonText lines={10} />}>
          <Reader
            key={open.id}
            report={open}
            page={page}
            onPage={(next) => {
              show({ page: String(next) }, true);
            }}
            onClose={() => {
              show({ report: null, page: null });
            }}
          />
        </Suspense>
      )}
      {openId !== null && found.data && !open && (
        <EmptyState title="This report is not on this case any more." />
      )}
    </div>
  );
}
