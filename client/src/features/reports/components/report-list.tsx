import { Button } from '@radix-ui/themes';
import { type Report, reportKinds } from '@weighhouse/shared/contracts/reports';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useFormat } from '../../../lib/use-format';
import { sizeWords } from '../../../lib/words';
import { useRemoveReport } from '../api/remove-report';

interface Props {
  caseId: string;
  reports: Report[];
  openId: string | null;
  onOpen: (reportId: string) => void;
}

const kindOf = ({ mediaType }: Report) =>
  reportKinds.find((kind) => kind.mediaType === mediaType)?.label ?? mediaType;

/** The reports of a case; each is read in the page. */
export function ReportList({ caseId, reports, openId, onOpen }: Props) {
  const format = useFormat();
  const remove = useRemoveReport(caseId);
  const [removing, setRemoving] = useState<Report | null>(null);
  return (
    <>
      <ul className="report-list">
        {reports.map((report) => (
          <li key={report.id} className={report.id === openId ? 'report-open' : ''}>
            <button
              type="button"
              className="report-name"
              aria-current={report.id === openId ? 'true' : undefined}
              onClick={() => {
                onOpen(report.id);
              }}
            >
              {report.fileName}
            </button>
            <p className="soft small">
              {kindOf(report)}, {sizeWords(report.sizeBytes)}. {report.uploadedBy},{' '}
              {format.moment(report.uploadedAt)}.
            </p>
            {report.canRemove && (
              <Button
                type="button"
                size="1"
                variant="outline"
                color="gray"
                highContrast
                aria-label={`Remove: ${report.fileName}`}
                onClick={() => {
                  setRemoving(report);
                }}
              >
                Remove
              </Button>
            )}
          </li>
        ))}
      </ul>
      <ConfirmDialog
        open={removing !== null}
        onOpenChange={(open) => {
          if (!open) setRemoving(null);
        }}
        title={`Remove ${removing?.fileName ?? ''}?`}
        verb="Remove the report"
        danger
        onConfirm={() => (removing ? remove.mutateAsync(removing.id) : Promise.resolve())}
      >
        It is taken off the case. Findings that name it keep its name.
      </ConfirmDialog>
    </>
  );
}
