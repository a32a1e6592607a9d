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
      verb="Close the round"
      onConfirm={() => close.mutateAsync(round.id)}
    >
      Nobody can judge any more until you open another round.
      {sealed && ' It is still sealed: closed like this, its numbers stay sealed.'}
    </ConfirmDialog>
  );
}
