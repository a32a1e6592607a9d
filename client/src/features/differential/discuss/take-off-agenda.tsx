import { Button } from '@radix-ui/themes';
import type { AgendaItem } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useTakeOffAgenda } from '../api/change-agenda';
import { useLedger } from '../ledger/ledger-context';

/** Takes a row off the agenda, after a question: its note goes too. */
export function TakeOffAgenda({ finding, item }: { finding: Finding; item: AgendaItem }) {
  const { differential } = useLedger();
  const [open, setOpen] = useState(false);
  const takeOff = useTakeOffAgenda(differential.caseId, finding.id);
  return (
    <>
      <Button
        variant="outline"
        size="1"
        aria-label={`Take off the agenda: ${finding.title}`}
        onClick={() => {
          setOpen(true);
        }}
      >
        Take off
      </Button>
      <ConfirmDialog
        open={open}
        onOpenChange={setOpen}
        title={`“${finding.title}” leaves the agenda`}
        verb="Take it off"
        onConfirm={() => takeOff.mutateAsync(item.version)}
      >
        Its note goes with it: “{item.note}”
      </ConfirmDialog>
    </>
  );
}
