import { useQuery } from '@tanstack/react-query';
import type { Report } from '@weighhouse/shared/contracts/reports';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { errorFrom } from '../../../lib/api';
import { offlineError } from '../../../lib/api-error';
import { contentPath } from '../api/list-reports';

/** More characters than this make a page slow; the rest is in the download. */
const shown = 500_000;

async function getText(reportId: string, signal: AbortSignal): Promise<string> {
  const response = await fetch(contentPath(reportId), { signal }).catch((error: unknown) => {
    if (signal.aborted) throw error;
    throw offlineError();
  });
  const text = await response.text();
  if (!response.ok) throw errorFrom(response.status, text, null);
  return text;
}

/** Plain text, as it is. */
export function TextReader({ report }: { report: Report }) {
  const found = useQuery({
    queryKey: ['report-text', report.id],
    queryFn: ({ signal }) => getText(report.id, signal),
    staleTime: Infinity,
  });
  if (found.data === undefined)
    return found.isPending ? (
      <SkeletonText lines={10} />
    ) : (
      <Failure error={found.error} what="The text could not be loaded." retry={() => void found.refetch()} />
    );
  return (
    <>
      <div className="reader-frame" tabIndex={0} role="region" aria-label="Text">
        <pre className="reader-text">{found.data.slice(0, shown)}</pre>
      </div>
      {found.data.length > shown && (
        <p className="soft small">This is the beginning. The download has all of it.</p>
      )}
    </>
  );
}
