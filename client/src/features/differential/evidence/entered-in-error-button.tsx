import { Button } from '@radix-ui/themes';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useEnterInError } from '../../findings/api/enter-in-error';

export function EnteredInErrorButton({ caseId, finding }: { caseId: string; finding: Finding }) {
  const [open, setOpen] = useState(false);
  const mark = useEnterInError(caseId);
  return (
    <>
      <Button
        variant="outline"
        onClick={() => {
          setOpen(true);
        }}
      >
        Entered in error
      </Button>
      <ConfirmDialog
        open={open}
        onOpenChange={setOpen}
        title={`“${finding.title}” was entered in error`}
        verb="Strike it out"
        danger
        wordsLabel="What is wrong with it"
        onConfirm={({ words }) => mark.mutateAsync({ findingId: finding.id, words })}
      >
        It stays readable, struck out, and is counted nowhere. This cannot be taken back.
      </ConfirmDialog>
    </>
  );
}
