import { useQuery } from '@tanstack/react-query';
import type { Report } from '@weighhouse/shared/contracts/reports';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { getContent } from '../api/get-content';

/** More characters than this make a page slow; the rest is in the download. */
const shown = 500_000;

/** Plain text, as it is. */
export function TextReader({ report }: { report: Report }) {
  const found = useQuery({
    queryKey: ['report-text', report.id],
    queryFn: async ({ signal }) => (await getContent(report.id, signal)).text(),
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
