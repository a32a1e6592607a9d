import { Button, Dialog, TextField } from '@radix-ui/themes';
import type { RoundKind } from '@weighhouse/shared/contracts/rounds';
import { type SyntheticEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { FieldGroup, FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api-error';
import { useFormat } from '../../../lib/use-format';
import { useOpenRound } from '../api/open-round';
import { useLedger } from '../ledger/ledger-context';

interface Props {
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

/** Opens a period of judging: sealed, or live. The first is sealed. */
export function OpenRoundDialog({ open, onOpenChange }: Props) {
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Content className="ledger-dialog" aria-describedby={undefined}>
        <OpenRoundForm
          onDone={() => {
            onOpenChange(false);
          }}
        />
      </Dialog.Content>
    </Dialog.Root>
  );
}

const kinds: { kind: RoundKind; label: string }[] = [
  { kind: 'sealed', label: 'Sealed: nobody sees anybody’s numbers, nor the pool, until you unseal it' },
  { kind: 'live', label: 'Live: every saved judgement moves the pool on everyone’s screen' },
];

function OpenRoundForm({ onDone }: { onDone: () => void }) {
  const { differential } = useLedger();
  const format = useFormat();
  const opening = useOpenRound(differential.caseId);
  const first = differential.round === null;
  const [kind, setKind] = useState<RoundKind | null>(first ? 'sealed' : null);
  const [deadline, setDeadline] = useState('');
  const faults = isApiError(opening.error) ? opening.error.fields : [];
  // What is missing on the case has no field here; a fault of a field stands beside it, once.
  const elsewhere = faults.filter((fault) => !['kind', 'deadline'].includes(fault.path));
  const besideFields = faults.length > 0 && elsewhere.length === 0;
  const submit = (event: SyntheticEvent) => {
    event.preventDefault();
    if (!kind) return;
    opening.mutate(
      { kind, deadline: deadline === '' ? null : format.fromField(deadline) },
      { onSuccess: onDone },
    );
  };
  return (
    <form onSubmit={submit}>
      <Dialog.Title size="4">{first ? 'Open the first round' : 'Open a round'}</Dialog.Title>
      <FieldGroup label="Kind" path="kind" faults={faults}>
        {kinds
          .filter((one) => !first || one.kind === 'sealed')
          .map((one) => (
            <label key={one.kind} className="check-line">
              <input
                type="radio"
                name="kind"
                checked={kind === one.kind}
                onChange={() => {
                  setKind(one.kind);
                }}
              />
              {one.label}
            </label>
          ))}
        {first && <p className="field-hint">The first round of a case is always sealed.</p>}
      </FieldGroup>
      <FormField
        label="Hand in by"
        path="deadline"
        faults={faults}
        optional
        hint={`In the time zone ${format.timeZone}.`}
      >
        {(control) => (
          <TextField.Root
            {...control}
            type="datetime-local"
            value={deadline}
            onChange={(event) => {
              setDeadline(event.target.value);
            }}
          />
        )}
      </FormField>
      {!besideFields && <FailureLine error={opening.error} />}
      {elsewhere.length > 0 && (
        <ul className="plain-list">
          {elsewhere.map((fault) => (
            <li key={fault.path + fault.message}>{fault.message}</li>
          ))}
        </ul>
      )}
      <div className="actions dialog-actions">
        <Button type="submit" disabled={!kind} loading={opening.isPending}>
          Open the round
        </Button>
        <Dialog.Close>
          <Button type="button" variant="outline">
            Cancel
          </Button>
        </Dialog.Close>
      </div>
    </form>
  );
}
