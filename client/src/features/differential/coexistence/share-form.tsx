import { Button, TextField } from '@radix-ui/themes';
import { type SyntheticEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { FormField } from '../../../components/form-field';
import { useChangeSettings } from '../api/change-settings';
import { useLedger } from '../ledger/ledger-context';
import { readCoexistence } from './pair-values';

/** Where the chair says how many patients have two or more of the candidates at once. */
export function ShareForm() {
  const { saved } = useLedger();
  const change = useChangeSettings(saved.caseId);
  const now = String(Math.round(saved.settings.coexistence * 1000) / 10);
  const [typed, setTyped] = useState<string | null>(null);
  const [reason, setReason] = useState('');
  const [tried, setTried] = useState(false);
  const read = readCoexistence(typed ?? now);
  const faults = [
    ...('fault' in read ? [{ path: 'coexistence', message: read.fault }] : []),
    ...(reason.trim() === '' ? [{ path: 'coexistence.reason', message: 'say why' }] : []),
  ];
  const submit = (event: SyntheticEvent) => {
    event.preventDefault();
    setTried(true);
    if (faults.length > 0 || 'fault' in read) return;
    change.mutate(
      { coexistence: read.share, reason: reason.trim() },
      {
        onSuccess: () => {
          setTyped(null);
          setReason('');
          setTried(false);
        },
      },
    );
  };
  const shown = tried ? faults : [];
  return (
    <form className="pair-form" noValidate onSubmit={submit}>
      <FormField
        label="Of 100 patients like this, how many have two or more of these at once?"
        path="coexistence"
        faults={shown}
        hint="0 reads the numbers as one cause for everybody. At most 50."
      >
        {(control) => (
          <input
            {...control}
            className="number-field figures"
            inputMode="decimal"
            maxLength={5}
            value={typed ?? now}
            onChange={(event) => {
              setTyped(event.target.value);
            }}
          />
        )}
      </FormField>
      <FormField label="Why" path="coexistence.reason" faults={shown}>
        {(control) => (
          <TextField.Root
            {...control}
            maxLength={4000}
            value={reason}
            onChange={(event) => {
              setReason(event.target.value);
            }}
          />
        )}
      </FormField>
      <FailureLine error={change.error} />
      <div className="actions">
        <Button type="submit" loading={change.isPending}>
          Save the share
        </Button>
        <span className="small soft" role="status">
          {change.isSuccess && typed === null ? 'Saved. The panel reads its numbers so.' : ''}
        </span>
      </div>
    </form>
  );
}
