import { Button, Dialog } from '@radix-ui/themes';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { listed } from '../../../lib/words';
import { useUnsealRound } from '../api/unseal-round';
import { useLedger } from '../ledger/ledger-context';
import type { RoundCount } from '../model/round-words';

interface Props {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  round: Round;
  count: RoundCount;
  /** Why it cannot be unsealed yet. */
  hindrance: string | null;
}

/** Shows everybody the numbers at once. It cannot be taken back. */
export function UnsealDialog({ open, onOpenChange, round, count, hindrance }: Props) {
  const { differential } = useLedger();
  const unseal = useUnsealRound(differential.caseId);
  const missing = round.members
    .filter((member) => member.handedInAt === null)
    .map((member) => member.person.name);
  if (hindrance !== null)
    return (
      <Dialog.Root open={open} onOpenChange={onOpenChange}>
        <Dialog.Content className="ledger-dialog">
          <Dialog.Title size="4">Round {round.number} cannot be unsealed yet</Dialog.Title>
          <Dialog.Description size="2">
            {hindrance} Not in: {listed(missing)}.
          </Dialog.Description>
          <div className="actions dialog-actions">
            <Dialog.Close>
              <Button variant="outline">Back</Button>
            </Dialog.Close>
          </div>
        </Dialog.Content>
      </Dialog.Root>
    );
  const withReason = count.mayUnseal === 'withReason';
  return (
    <ConfirmDialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Unseal round ${String(round.number)} with ${String(count.in)} of ${String(count.of)} in`}
      verb="Unseal the round"
      {...(withReason ? { wordsLabel: `Why, below the quorum of ${String(count.quorum)}` } : {})}
      onConfirm={({ words }) =>
        unseal.mutateAsync({ roundId: round.id, ...(withReason ? { reason: words } : {}) })
      }
    >
      Everybody on the team sees all numbers at once. This cannot be taken back.
      {missing.length > 0 && ` Not in, and left out of this round: ${listed(missing)}.`}
    </ConfirmDialog>
  );
}
