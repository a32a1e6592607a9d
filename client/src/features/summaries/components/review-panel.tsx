import { Button } from '@radix-ui/themes';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { FailureLine } from '../../../components/failure';
import { useApproveSummary, useReturnSummary } from '../api/review-summary';

/** The chair approves the text that is on the screen, or asks for changes. */
export function ReviewPanel({ summary }: { summary: Summary }) {
  const approve = useApproveSummary(summary.caseId);
  const sendBack = useReturnSummary(summary.caseId);
  const [asking, setAsking] = useState(false);
  return (
    <section className="summary-review no-print" aria-label="Approval">
      <p className="prose">
        Does the patient learn the right thing from this text? The liaison tells it as it stands here.
      </p>
      <FailureLine error={approve.error} />
      <div className="actions">
        <Button
          loading={approve.isPending}
          onClick={() => {
            approve.mutate(summary.version);
          }}
        >
          Approve the summary
        </Button>
        <Button
          variant="outline"
          onClick={() => {
            setAsking(true);
          }}
        >
          Ask for changes
        </Button>
      </div>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="What is to be changed?"
        verb="Ask for changes"
        wordsLabel="Words for the liaison"
        onConfirm={({ words }) => sendBack.mutateAsync(words.trim())}
      >
        The liaison reads this and hands the text in again. The patient does not see it.
      </ConfirmDialog>
    </section>
  );
}
