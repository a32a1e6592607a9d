import type { Round } from '@weighhouse/shared/contracts/rounds';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useCloseRound } from '../api/close-round';
import { useLedger } from '../ledger/ledger-context';

interface Props {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  round: Round;
}

export function CloseRoundDialog({ open, onOpenChange, round }: Props) {
  const { differential } = useLedger();
  const close = useCloseRound(differential.caseId);
  const sealed = round.kind === 'sealed' && round.state === 'open';
  return (
    <ConfirmDialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Close round ${String(round.number)}`}
      verb={sealed ? 'Close it unopened' : 'Close the round'}
      danger={sealed}
      onConfirm={() => close.mutateAsync(round.id)}
    >
      Nobody can judge any more until you open another round.
      {sealed && ' It was not unsealed: closed like this, its numbers are never shown to anybody.'}
    </ConfirmDialog>
  );
}
